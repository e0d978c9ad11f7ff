using OxyPlot;

using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Axial ratio and tilt along the cuts of a state, all cuts in one frame.</summary>
internal static class CutPolarizationPlots
{
    private const double MostDb = 20.0;

    private static readonly (OxyColor Color, MarkerType Marker)[] CutStyles =
    [
        (PlotPalette.Ink, MarkerType.Circle),
        (PlotPalette.States[0], MarkerType.Square),
        (PlotPalette.States[1], MarkerType.Triangle),
        (PlotPalette.States[2], MarkerType.Diamond),
    ];

    /// <summary>Makes the row of plots; null where neither quantity has a trace.</summary>
    public static PlotRowBlock? Row(ReportContext context, IReadOnlyList<CutKey> cuts, string name)
    {
        var plots = new List<PlotFigure>();
        if (Curves(context, QuantityCatalogue.AxialRatio, cuts, out var ratioLegend, out var source) is { Count: > 0 } ratios)
        {
            var (_, most) = PlotCurve.Range(ratios);
            var scale = new AxisScale(0.0, Math.Min(MostDb, AxisScale.Outward(0.0, Math.Max(6.0, most), 4).Maximum), most > 12.0 ? 5.0 : 2.0);
            var cut = most > scale.Maximum ? $" Values above {UnitText.Join(NumberText.Fixed(scale.Maximum, 0), "dB")} are not drawn." : string.Empty;
            plots.Add(Plot(cuts[0], name, "axial-ratio", $"Axial ratio along the cuts, {source}, with the {UnitText.Join("3", "dB")} line.{cut}", QuantityCatalogue.AxialRatio, ratios, ratioLegend, scale, 3.0));
        }

        if (Curves(context, QuantityCatalogue.TiltAngle, cuts, out var tiltLegend, out source) is { Count: > 0 } tilts)
        {
            plots.Add(Plot(cuts[0], name, "tilt", $"Tilt angle along the cuts, {source}, from the theta towards the phi direction; it turns over at ±90°.", QuantityCatalogue.TiltAngle, [.. tilts.Select(Unwrapped)], tiltLegend, new AxisScale(-90.0, 90.0, 30.0), null));
        }

        return plots.Count == 0 ? null : new(plots);
    }

    private static PlotFigure Plot(CutKey cut, string name, string kind, string caption, Quantity quantity, IReadOnlyList<PlotCurve> curves, IReadOnlyList<LegendEntry> legend, AxisScale scale, double? limit)
    {
        var (least, last) = (curves.Min(curve => curve.X[0]), curves.Max(curve => curve.X[^1]));
        var unit = UnitText.Of(quantity);
        return new()
        {
            FileName = $"pattern-{name}-{kind}",
            Kind = $"{quantity.Name} along the cut",
            Caption = caption,
            AlternativeText = $"{Words.Capital(quantity.Name)} of state {cut.State} along its cuts at {FrequencyText.WithUnit(cut.FrequencyHz)}.",
            WidthShare = 0.5,
            Aspect = 0.74,
            Readout = new(cut.PhiDeg is null ? "φ" : "θ", "°", 1, unit, 1),
            Make = () => CurvePlot.Make(curves, legend, cut.AngleTitle, CurvePlot.Angles(least, last, wide: false), PlotFrame.Title(quantity.Name, unit), scale, limit, limit is null ? string.Empty : UnitText.Join("3", "dB")),
        };
    }

    private static List<PlotCurve> Curves(ReportContext context, Quantity quantity, IReadOnlyList<CutKey> cuts, out IReadOnlyList<LegendEntry> legend, out string source)
    {
        var (curves, entries) = (new List<PlotCurve>(), new List<LegendEntry>());
        var wanted = cuts.Any(cut => CurveSource.AlongCut(context, quantity, cut, DataSource.Measured, FieldComponent.None) is not null) ? DataSource.Measured : DataSource.Simulated;
        source = Words.Of(wanted);
        for (var at = 0; at < cuts.Count; at++)
        {
            if (CurveSource.AlongCut(context, quantity, cuts[at], wanted, FieldComponent.None) is { } trace && Array.Exists(trace.Y, double.IsFinite))
            {
                var (color, marker) = CutStyles[at % CutStyles.Length];
                curves.Add(new(cuts[at].Text, trace.X, trace.Y) { Color = color, Marker = marker, Dashed = wanted == DataSource.Simulated });
                entries.Add(new(cuts[at].Text, color, marker, wanted == DataSource.Simulated));
            }
        }

        legend = entries;
        return curves;
    }

    // A tilt that passes 90 degrees goes on at -90: the line is broken there instead of crossing the frame.
    private static PlotCurve Unwrapped(PlotCurve curve)
    {
        var (x, y) = (new List<double>(), new List<double>());
        for (var at = 0; at < curve.X.Length; at++)
        {
            if (at > 0 && Math.Abs(curve.Y[at] - curve.Y[at - 1]) > 90.0)
            {
                x.Add(curve.X[at]);
                y.Add(double.NaN);
            }

            x.Add(curve.X[at]);
            y.Add(curve.Y[at]);
        }

        return curve with { X = [.. x], Y = [.. y] };
    }
}
