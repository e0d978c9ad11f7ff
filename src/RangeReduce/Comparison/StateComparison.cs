using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>States side by side: for each hand on the axis, which state has more of it and by how much.</summary>
public static class StateComparison
{
    private const string ContrastFormula = "level of the hand on the axis in the one state less its level in the other";
    private const string ReductionFormula = "1 − 10^(−contrast/10) as a share of power";

    /// <summary>Adds switching contrast and reduction for every pair of states to the table that they are read from.</summary>
    public static void Add(FigureTable table)
    {
        ArgumentNullException.ThrowIfNull(table);

        // The rows without a cut are the mean over all cuts through the axis: one a state, hand, frequency and source.
        var rows = table.Figures
            .Where(figure => (figure.Quantity == QuantityCatalogue.Gain || figure.Quantity == QuantityCatalogue.Level)
                && figure is { At: FigurePlace.Axis, PhiDeg: null, ThetaDeg: null, Method: null, Component: FieldComponent.Right or FieldComponent.Left }
                && double.IsFinite(figure.Value))
            .ToArray();
        var pairs =
            from one in rows
            join other in rows
                on (one.Quantity.Id, one.Source, one.FrequencyHz, one.Component, one.Realized) equals (other.Quantity.Id, other.Source, other.FrequencyHz, other.Component, other.Realized)
            where string.CompareOrdinal(one.State, other.State) < 0
            select one.Value >= other.Value ? (More: one, Less: other) : (More: other, Less: one);
        foreach (var (more, less) in pairs.ToArray())
        {
            var contrast = new Figure
            {
                Quantity = QuantityCatalogue.SwitchingContrast,
                Value = more.Value - less.Value,
                State = more.State,
                OtherState = less.State,
                Source = more.Source,
                FrequencyHz = more.FrequencyHz,
                At = FigurePlace.Axis,
                Component = more.Component,
                Uncertainty = DifferenceUncertainty.OfSameRun(more, less),
                Origin = new([.. more.Origin.Inputs.Concat(less.Origin.Inputs).Distinct(StringComparer.Ordinal)], more.Origin.Corrections, ContrastFormula),
            };
            table.Add(contrast);
            table.Add(contrast with
            {
                Quantity = QuantityCatalogue.SwitchingReduction,
                Value = 100.0 * (1.0 - Math.Pow(10.0, -contrast.Value / 10.0)),
                Uncertainty = OfReduction(contrast),
                Origin = contrast.Origin with { Formula = ReductionFormula },
            });
        }
    }

    /// <summary>Carries the uncertainty of a contrast over: the ends of its interval are turned into percent one by one, since the map is bent.</summary>
    private static Uncertainty OfReduction(Figure contrast)
    {
        var expanded = contrast.Uncertainty.Expanded;
        if (!double.IsFinite(expanded))
        {
            return Uncertainty.None;
        }

        var (low, high) = (Percent(contrast.Value - expanded), Percent(contrast.Value + expanded));
        return new(0.5 * (high - low), double.NaN, contrast.Uncertainty.Budget) { Low = low, High = high };

        static double Percent(double contrastDb) => 100.0 * (1.0 - Math.Pow(10.0, -contrastDb / 10.0));
    }
}
