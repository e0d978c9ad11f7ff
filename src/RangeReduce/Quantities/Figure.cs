namespace RangeReduce.Quantities;

/// <summary>One row of the table of results: a quantity, its value, and the keys that say where it applies.</summary>
/// <remarks>Keys that do not apply are null (or None). Frequencies are in hertz, angles in degrees.</remarks>
public sealed record Figure
{
    /// <summary>Gets the id that is unique within a table (<c>f1</c>, <c>f2</c>, ...); empty until a table has taken the figure.</summary>
    public string Id { get; init; } = string.Empty;

    /// <summary>Gets the quantity.</summary>
    public required Quantity Quantity { get; init; }

    /// <summary>Gets the value in the unit of the quantity; NaN for a hand, and where there is no finite value (see <see cref="Why"/>).</summary>
    public double Value { get; init; } = double.NaN;

    /// <summary>Gives the unit of <see cref="Value"/>: that of the quantity, or for a deviation that of the quantity that it is of.</summary>
    public string Unit => Quantity == QuantityCatalogue.Deviation && Of is not null && QuantityCatalogue.TryGet(Of, out var of) ? of.Unit : Quantity.Unit;

    /// <summary>Gets the hand, for the quantity <c>hand</c> only.</summary>
    public Hand? Hand { get; init; }

    /// <summary>Gets why the value is not a finite number; null where it is.</summary>
    public string? Why { get; init; }

    /// <summary>Gets the configuration state.</summary>
    public string? State { get; init; }

    /// <summary>Gets the state that <see cref="State"/> is compared with.</summary>
    public string? OtherState { get; init; }

    /// <summary>Gets the source of the data; null for a comparison of two sources.</summary>
    public DataSource? Source { get; init; }

    /// <summary>Gets the frequency in hertz.</summary>
    public double? FrequencyHz { get; init; }

    /// <summary>Gets the lower band edge in hertz.</summary>
    public double? LowHz { get; init; }

    /// <summary>Gets the upper band edge in hertz.</summary>
    public double? HighHz { get; init; }

    /// <summary>Gets the fixed phi of a theta cut in degrees.</summary>
    public double? PhiDeg { get; init; }

    /// <summary>Gets the fixed theta of a phi cut in degrees.</summary>
    public double? ThetaDeg { get; init; }

    /// <summary>Gets the angle along the cut in degrees.</summary>
    public double? DirectionDeg { get; init; }

    /// <summary>Gets the kind of place.</summary>
    public FigurePlace At { get; init; }

    /// <summary>Gets the field component.</summary>
    public FieldComponent Component { get; init; }

    /// <summary>Gets the threshold that a band or width was taken at, in the unit of the thresholded quantity.</summary>
    public double? Threshold { get; init; }

    /// <summary>Gets the rank, 1 is first.</summary>
    public int? Rank { get; init; }

    /// <summary>Gets at which end a band or width is cut off by the data: <c>low</c>, <c>high</c> or <c>both</c>; null where both edges were seen.</summary>
    public string? Open { get; init; }

    /// <summary>Gets the method, where a quantity can be had by more than one.</summary>
    public string? Method { get; init; }

    /// <summary>Gets the id of the quantity that a deviation or agreement is about.</summary>
    public string? Of { get; init; }

    /// <summary>Gets the grade of an agreement in words.</summary>
    public string? Grade { get; init; }

    /// <summary>Gets whether a gain has the mismatch in it; null where that makes no sense.</summary>
    public bool? Realized { get; init; }

    /// <summary>Gets whether a lobe lies beyond 90 degrees from the peak.</summary>
    public bool? BackLobe { get; init; }

    /// <summary>Gets the uncertainty.</summary>
    public Uncertainty Uncertainty { get; init; } = Uncertainty.None;

    /// <summary>Gets what made the figure.</summary>
    public FigureOrigin Origin { get; init; } = FigureOrigin.None;
}
