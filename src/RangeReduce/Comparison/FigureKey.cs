using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>What a figure is about, apart from whose data it was made of: two figures with the same key can be laid side by side.</summary>
/// <remarks>Where a figure was found (the frequency of a resonance, the direction of a peak, the edges of a band) is part of its finding, not a key.</remarks>
public sealed record FigureKey
{
    /// <summary>Gets the id of the quantity.</summary>
    public required string Quantity { get; init; }

    /// <summary>Gets the configuration state.</summary>
    public string? State { get; init; }

    /// <summary>Gets the other state of a comparison.</summary>
    public string? OtherState { get; init; }

    /// <summary>Gets the frequency in hertz; null for figures of a resonance.</summary>
    public double? FrequencyHz { get; init; }

    /// <summary>Gets the fixed phi of the cut in degrees.</summary>
    public double? PhiDeg { get; init; }

    /// <summary>Gets the fixed theta of the cut in degrees.</summary>
    public double? ThetaDeg { get; init; }

    /// <summary>Gets the kind of place.</summary>
    public FigurePlace At { get; init; }

    /// <summary>Gets the field component.</summary>
    public FieldComponent Component { get; init; }

    /// <summary>Gets the threshold.</summary>
    public double? Threshold { get; init; }

    /// <summary>Gets the rank; null for lobes, which are told apart by <see cref="BackLobe"/>.</summary>
    public int? Rank { get; init; }

    /// <summary>Gets whether a gain has the mismatch in it.</summary>
    public bool? Realized { get; init; }

    /// <summary>Gets whether a lobe lies behind.</summary>
    public bool? BackLobe { get; init; }

    /// <summary>Gets the method.</summary>
    public string? Method { get; init; }

    /// <summary>Takes the key of a figure.</summary>
    public static FigureKey Of(Figure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        return new()
        {
            Quantity = figure.Quantity.Id,
            State = figure.State,
            OtherState = figure.OtherState,
            FrequencyHz = figure.At == FigurePlace.Resonance ? null : figure.FrequencyHz,
            PhiDeg = figure.PhiDeg,
            ThetaDeg = figure.ThetaDeg,
            At = figure.At,
            Component = figure.Component,
            Threshold = figure.Threshold,
            Rank = figure.Quantity == QuantityCatalogue.SidelobeLevel ? null : figure.Rank,
            Realized = figure.Realized,
            BackLobe = figure.BackLobe,
            Method = figure.Method,
        };
    }

    /// <summary>Gives the difference of two values of one quantity: an axis of an ellipse turned by 180 degrees is the same axis, a direction turned by 360 degrees the same direction.</summary>
    public static double Difference(Quantity quantity, double value, double other)
    {
        var turn = quantity == QuantityCatalogue.TiltAngle ? 180.0 : quantity == QuantityCatalogue.PeakDirection ? 360.0 : 0.0;
        return turn == 0.0 ? value - other : Math.IEEERemainder(value - other, turn);
    }
}
