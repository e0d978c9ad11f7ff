using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>Measured against simulated: the difference of every figure that both sides have.</summary>
public static class SimulationComparison
{
    /// <summary>Adds a deviation for every measured figure that has a simulated counterpart.</summary>
    /// <remarks>
    /// The join runs over the keys that say what a figure is about. Where a figure was found (the frequency of a resonance, the direction of a peak,
    /// the edges of a band) is part of its finding, not a key. A width that the data cut off is a lower bound and has no deviation.
    /// </remarks>
    public static void Add(FigureTable table)
    {
        ArgumentNullException.ThrowIfNull(table);
        var simulated = table.Figures
            .Where(figure => figure is { Source: DataSource.Simulated, Method: null, OtherState: null, Open: null } && double.IsFinite(figure.Value))
            .GroupBy(Key.Of)
            .ToDictionary(group => group.Key, group => group.First());
        var measured = table.Figures.Where(figure => figure is { Source: DataSource.Measured, Method: null, OtherState: null, Open: null } && double.IsFinite(figure.Value)).ToArray();
        foreach (var figure in measured)
        {
            if (simulated.TryGetValue(Key.Of(figure), out var counterpart))
            {
                table.Add(figure with
                {
                    Quantity = QuantityCatalogue.Deviation,
                    Of = figure.Quantity.Id,
                    Value = Difference(figure, counterpart),
                    Source = null,
                    LowHz = null,
                    HighHz = null,
                    Uncertainty = OfDeviation(figure),
                    Origin = new([.. figure.Origin.Inputs, .. counterpart.Origin.Inputs], figure.Origin.Corrections, "measured less simulated"),
                });
            }
        }
    }

    // A simulation states no uncertainty: a deviation has that of the measured figure, about zero like the deviation itself.
    private static Uncertainty OfDeviation(Figure measured) => measured.Uncertainty with { Low = null, High = null };

    private static double Difference(Figure measured, Figure simulated)
    {
        var difference = measured.Value - simulated.Value;

        // An axis of an ellipse turned by 180 degrees is the same axis; a direction turned by 360 degrees is the same direction.
        var turn = measured.Quantity == QuantityCatalogue.TiltAngle ? 180.0 : measured.Quantity == QuantityCatalogue.PeakDirection ? 360.0 : 0.0;
        return turn == 0.0 ? difference : Math.IEEERemainder(difference, turn);
    }

    private sealed record Key(
        string Quantity,
        string? State,
        double? FrequencyHz,
        double? PhiDeg,
        double? ThetaDeg,
        FigurePlace At,
        FieldComponent Component,
        double? Threshold,
        int? Rank,
        bool? Realized,
        bool? BackLobe)
    {
        public static Key Of(Figure figure) => new(
            figure.Quantity.Id,
            figure.State,
            figure.At == FigurePlace.Resonance ? null : figure.FrequencyHz,
            figure.PhiDeg,
            figure.ThetaDeg,
            figure.At,
            figure.Component,
            figure.Threshold,
            figure.Quantity == QuantityCatalogue.SidelobeLevel ? null : figure.Rank,
            figure.Realized,
            figure.BackLobe);
    }
}
