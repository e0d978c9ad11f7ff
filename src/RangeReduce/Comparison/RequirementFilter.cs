using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>Picks the rows of the table that a requirement is about.</summary>
internal static class RequirementFilter
{
    private static readonly Quantity[] WithDirection =
    [
        QuantityCatalogue.Gain, QuantityCatalogue.Level, QuantityCatalogue.AxialRatio, QuantityCatalogue.Hand, QuantityCatalogue.CrossPolarRatio,
    ];

    /// <summary>Gives the measured figures that the requirement is about.</summary>
    public static Figure[] Figures(Requirement requirement, FigureTable table)
    {
        var quantity = requirement.Quantity;
        return
        [
            .. table.Figures.Where(figure =>
                figure.Quantity == quantity
                && (figure.Source is null or DataSource.Measured)
                && figure.Method is null
                && Matches(requirement.State, figure.State)
                && Matches(requirement.OtherState, figure.OtherState)
                && (requirement.Component == FieldComponent.None ? DefaultComponent(quantity, figure.Component) : figure.Component == requirement.Component)
                && InBand(requirement, figure)
                && (!WithDirection.Contains(quantity) || figure is { At: FigurePlace.Axis, PhiDeg: null, ThetaDeg: null })
                && (figure.Rank is null or 1)),
        ];
    }

    /// <summary>Gives the measured curve over frequency that answers a requirement over a band; null where figures have to.</summary>
    public static Trace? Trace(Requirement requirement, FigureTable table) => requirement.State is null
        ? null
        : table.Traces.FirstOrDefault(trace =>
            trace.Quantity == requirement.Quantity
            && trace is { Axis: TraceAxis.Frequency, Source: DataSource.Measured, Method: null }
            && Matches(requirement.State, trace.State)
            && (requirement.Component == FieldComponent.None ? DefaultComponent(requirement.Quantity, trace.Component) : trace.Component == requirement.Component));

    private static bool Matches(string? wanted, string? state) => wanted is null || string.Equals(wanted, state, StringComparison.Ordinal);

    // Without a component a gain is that of all the power; for other quantities any row will do.
    private static bool DefaultComponent(Quantity quantity, FieldComponent component) =>
        (quantity != QuantityCatalogue.Gain && quantity != QuantityCatalogue.Level) || component == FieldComponent.Total;

    private static bool InBand(Requirement requirement, Figure figure) =>
        requirement is not { BandLowHz: { } low, BandHighHz: { } high }
        || figure.FrequencyHz is not { } hertz
        || (hertz >= low - 0.5 && hertz <= high + 0.5);
}
