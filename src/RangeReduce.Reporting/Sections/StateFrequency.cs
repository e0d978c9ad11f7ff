using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Sections;

/// <summary>The frequency at which a state's pattern is shown.</summary>
/// <param name="CutHz">The frequency of the cuts in hertz; null where the state has none.</param>
/// <param name="ResonanceHz">The deepest resonance in hertz; null where there is none.</param>
internal sealed record StateFrequency(double? CutHz, double? ResonanceHz)
{
    /// <summary>Gives the frequency as text, with how it was chosen.</summary>
    public string Text => (CutHz, ResonanceHz) switch
    {
        ({ } cut, { } resonance) => $"{FrequencyText.WithUnit(cut)}, the frequency of the cuts nearest to the deepest resonance at {FrequencyText.Label(resonance)}",
        ({ } cut, null) => $"{FrequencyText.WithUnit(cut)}, the middle frequency of the cuts, since no resonance was found",
        _ => "no frequency, since there are no cuts",
    };

    /// <summary>Chooses the frequency of a state: that of its cuts nearest to its deepest measured resonance, else the middle one.</summary>
    public static StateFrequency Choose(ReportContext context, string state)
    {
        var resonance = context.Find(QuantityCatalogue.ResonanceFrequency, state, figure => (figure.Rank ?? 1) == 1 && double.IsFinite(figure.Value))?.Value;
        var traces = context.Traces(QuantityCatalogue.Gain, state).Concat(context.Traces(QuantityCatalogue.Level, state)).Concat(context.Traces(QuantityCatalogue.AxialRatio, state))
            .Where(trace => trace.Axis == TraceAxis.Angle && trace.FrequencyHz is not null).ToList();
        var measured = traces.FindAll(trace => trace.Source == DataSource.Measured);
        var cuts = (measured.Count > 0 ? measured : traces).Select(trace => trace.FrequencyHz!.Value).Distinct().Order().ToList();
        double? cut = cuts.Count == 0 ? null : resonance is { } wanted ? cuts.MinBy(value => Math.Abs(value - wanted)) : cuts[cuts.Count / 2];
        return new(cut, resonance);
    }
}
