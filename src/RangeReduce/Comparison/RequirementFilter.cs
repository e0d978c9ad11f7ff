using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>Picks the rows of the table that a requirement is about.</summary>
internal static class RequirementFilter
{
    /// <summary>Frequencies in hertz that differ by no more are the same: files give them with few decimals of a gigahertz.</summary>
    public const double SameFrequencyHz = 0.5;

    private static readonly Quantity[] WithDirection =
    [
        QuantityCatalogue.Gain, QuantityCatalogue.Level, QuantityCatalogue.AxialRatio, QuantityCatalogue.Hand, QuantityCatalogue.CrossPolarRatio,
    ];

    /// <summary>Gives the measured figures that the requirement is about.</summary>
    public static Figure[] Figures(Requirement requirement, FigureTable table)
    {
        var quantity = requirement.Quantity;
        Figure[] found =
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
                && (quantity != QuantityCatalogue.TiltAngle || figure.At == FigurePlace.Axis)
                && (figure.Rank is null or 1)),
        ];

        // A width without component is that of all the power where there is one.
        var ofAllPower = requirement.Component == FieldComponent.None && quantity == QuantityCatalogue.HalfPowerBeamwidth
            ? Array.FindAll(found, figure => figure.Component == FieldComponent.None)
            : [];
        return ofAllPower.Length > 0 ? ofAllPower : found;
    }

    /// <summary>Gives the measured curve over frequency that answers a requirement over a band; null where figures have to.</summary>
    public static Trace? Trace(Requirement requirement, FigureTable table) => requirement.State is null
        ? null
        : table.Traces.FirstOrDefault(trace =>
            trace.Quantity == requirement.Quantity
            && trace is { Axis: TraceAxis.Frequency, Source: DataSource.Measured, Method: null }
            && Matches(requirement.State, trace.State)
            && (requirement.Component == FieldComponent.None ? DefaultComponent(requirement.Quantity, trace.Component) : trace.Component == requirement.Component));

    /// <summary>Gives the measured curves along the angle of theta cuts that answer a requirement over a cone about the axis.</summary>
    public static Trace[] TracesAlongAngle(Requirement requirement, FigureTable table) =>
    [
        .. table.Traces.Where(trace =>
            trace.Quantity == requirement.Quantity
            && trace is { Axis: TraceAxis.Angle, Source: DataSource.Measured, Method: null, ThetaDeg: null }
            && Matches(requirement.State, trace.State)
            && (requirement.Component == FieldComponent.None ? DefaultComponent(requirement.Quantity, trace.Component) : trace.Component == requirement.Component)
            && (requirement is not { BandLowHz: { } low, BandHighHz: { } high } || (trace.FrequencyHz >= low - SameFrequencyHz && trace.FrequencyHz <= high + SameFrequencyHz))),
    ];

    /// <summary>Gives the measured figures over a cone that answer a requirement over that cone.</summary>
    public static Figure[] ConeFigures(Requirement requirement, FigureTable table, double coneDeg) =>
    [
        .. table.Figures.Where(figure =>
            figure.Quantity == requirement.Quantity
            && figure is { At: FigurePlace.Cone, Source: DataSource.Measured }
            && string.Equals(figure.Method, Reduction.Cuts.ConeReducer.MethodOf(coneDeg), StringComparison.Ordinal)
            && double.IsFinite(figure.Value)
            && Matches(requirement.State, figure.State)
            && (requirement.Component == FieldComponent.None || figure.Component == requirement.Component)
            && InBand(requirement, figure)),
    ];

    private static bool Matches(string? wanted, string? state) => wanted is null || string.Equals(wanted, state, StringComparison.Ordinal);

    // Without a component a gain is that of all the power; for other quantities any row will do.
    private static bool DefaultComponent(Quantity quantity, FieldComponent component) =>
        (quantity != QuantityCatalogue.Gain && quantity != QuantityCatalogue.Level) || component == FieldComponent.Total;

    private static bool InBand(Requirement requirement, Figure figure) =>
        requirement is not { BandLowHz: { } low, BandHighHz: { } high }
        || figure.FrequencyHz is not { } hertz
        || (hertz >= low - SameFrequencyHz && hertz <= high + SameFrequencyHz);
}
