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
            .GroupBy(FigureKey.Of)
            .ToDictionary(group => group.Key, group => group.First());
        var measured = table.Figures.Where(figure => figure is { Source: DataSource.Measured, Method: null, OtherState: null, Open: null } && double.IsFinite(figure.Value)).ToArray();
        foreach (var figure in measured)
        {
            if (simulated.TryGetValue(FigureKey.Of(figure), out var counterpart))
            {
                table.Add(figure with
                {
                    Quantity = QuantityCatalogue.Deviation,
                    Of = figure.Quantity.Id,
                    Value = FigureKey.Difference(figure.Quantity, figure.Value, counterpart.Value),
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
}
