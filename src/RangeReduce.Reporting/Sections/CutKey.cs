using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Sections;

/// <summary>Names one cut of a state at one frequency.</summary>
/// <param name="State">Configuration state.</param>
/// <param name="FrequencyHz">Frequency in hertz.</param>
/// <param name="PhiDeg">Fixed phi in degrees; null for a phi cut.</param>
/// <param name="ThetaDeg">Fixed theta in degrees; null for a theta cut.</param>
internal sealed record CutKey(string State, double FrequencyHz, double? PhiDeg, double? ThetaDeg)
{
    /// <summary>Gets the fixed angle in words, such as "φ = 45°".</summary>
    public string Text => Words.Cut(PhiDeg, ThetaDeg);

    /// <summary>Gets a part of a file name that names the cut.</summary>
    public string FilePart => PhiDeg is { } phi ? $"phi{NumberText.Fixed(phi, 0).Replace(NumberText.Minus, 'm')}" : ThetaDeg is { } theta ? $"theta{NumberText.Fixed(theta, 0).Replace(NumberText.Minus, 'm')}" : "cut";

    /// <summary>Gets the title of an axis along the cut.</summary>
    public string AngleTitle => PhiDeg is null && ThetaDeg is not null ? "Azimuth φ (°)" : "Angle θ (°)";

    /// <summary>Gives whether a trace belongs to the cut.</summary>
    public bool Holds(Trace trace) => ReportContext.Same(trace.FrequencyHz, FrequencyHz) && Nullable.Equals(trace.PhiDeg, PhiDeg) && Nullable.Equals(trace.ThetaDeg, ThetaDeg);

    /// <summary>Gives whether a figure belongs to the cut.</summary>
    public bool Holds(Figure figure) => ReportContext.Same(figure.FrequencyHz, FrequencyHz) && Nullable.Equals(figure.PhiDeg, PhiDeg) && Nullable.Equals(figure.ThetaDeg, ThetaDeg);

    /// <summary>Gives the cuts of a state at the frequency at which its pattern is shown, by their fixed angle.</summary>
    public static IReadOnlyList<CutKey> Of(ReportContext context, string state) => context.FrequencyOf(state).CutHz is not { } cut ? [] :
        [.. new[] { QuantityCatalogue.Gain, QuantityCatalogue.Level, QuantityCatalogue.AxialRatio }
            .SelectMany(quantity => context.Traces(quantity, state))
            .Where(trace => trace.Axis == TraceAxis.Angle && ReportContext.Same(trace.FrequencyHz, cut))
            .Select(trace => new CutKey(state, cut, trace.PhiDeg, trace.ThetaDeg)).Distinct()
            .OrderBy(key => key.ThetaDeg ?? double.NegativeInfinity).ThenBy(key => key.PhiDeg ?? double.NegativeInfinity)];
}
