using OxyPlot;

namespace RangeReduce.Reporting.Plots;

/// <summary>An entry of a legend.</summary>
/// <param name="Text">Its text.</param>
/// <param name="Color">Colour of the sample.</param>
/// <param name="Marker">Marker on the sample.</param>
/// <param name="Dashed">Whether the sample is dashed.</param>
/// <param name="State">The configuration state that the entry is about; null for none.</param>
internal sealed record LegendEntry(string Text, OxyColor Color, MarkerType Marker = MarkerType.None, bool Dashed = false, string? State = null)
{
    /// <summary>The two entries that explain the line styles.</summary>
    public static readonly IReadOnlyList<LegendEntry> Sources = [new("measured", PlotPalette.Quiet), new("simulated", PlotPalette.Quiet, Dashed: true)];

    /// <summary>Gives an entry a state in the curves, and the line styles where there are both kinds.</summary>
    public static IReadOnlyList<LegendEntry> ForStates(IReadOnlyList<PlotCurve> curves, StateStyles styles)
    {
        var entries = curves.Select(curve => curve.State).OfType<string>().Distinct(StringComparer.Ordinal)
            .Select(state => new LegendEntry(state, styles.ColorOf(state), styles.MarkerOf(state), State: state)).ToList();
        AddSources(entries, curves);
        return entries;
    }

    /// <summary>Adds the line styles where some curves are dashed.</summary>
    public static void AddSources(List<LegendEntry> entries, IReadOnlyList<PlotCurve> curves)
    {
        if (curves.Any(curve => curve.Dashed))
        {
            entries.AddRange(curves.All(curve => curve.Dashed) ? Sources.Skip(1) : Sources);
        }
    }
}
