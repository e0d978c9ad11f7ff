using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 3: the cuts of each state.</summary>
internal static class PatternSection
{
    private const int MostCuts = 4;

    /// <summary>Makes the section; null where the run has no cuts.</summary>
    public static ReportSection? Build(ReportContext context, FileNames names)
    {
        var blocks = new List<ReportBlock>();
        foreach (var state in context.States)
        {
            var cuts = CutKey.Of(context, state);
            if (cuts.Count == 0)
            {
                continue;
            }

            blocks.Add(new HeadingBlock("pattern-" + names.Of(state), $"State {state}") { State = state });
            var more = cuts.Count > MostCuts ? $" The first {NumberText.Fixed(MostCuts, 0)} of {NumberText.Fixed(cuts.Count, 0)} cuts are drawn; the others are among the traces." : string.Empty;
            blocks.Add(new ParagraphBlock($"Shown at {context.FrequencyOf(state).Text}.{more}") { KeepWithNext = true });
            var shown = cuts.Take(MostCuts).ToList();
            var quantity = context.LevelQuantity(state);
            blocks.AddRange(shown.Select(cut => CutRow(context, quantity, cut, names.Of(state))).OfType<PlotRowBlock>());
            if (CutPolarizationPlots.Row(context, shown, names.Of(state)) is { } row)
            {
                blocks.Add(row);
            }

            blocks.Add(CutTable.Make(context, cuts, quantity));
        }

        return blocks.Count == 0 ? null : new("pattern", "Pattern", blocks);
    }

    private static PlotRowBlock? CutRow(ReportContext context, Quantity quantity, CutKey cut, string name)
    {
        var curves = CurveSource.CoAndCross(context, quantity, cut, out var legend);
        if (curves.Count == 0)
        {
            return null;
        }

        var unit = UnitOf(context, quantity, cut);
        var (_, most) = PlotCurve.Range(curves);
        var (floor, top) = PolarCutPlot.Rings(most);
        var levels = CurvePlot.Levels(most, 40.0);
        var (least, last) = (curves.Min(curve => curve.X[0]), curves.Max(curve => curve.X[^1]));
        var title = PlotFrame.Title(quantity.Name, unit);
        var what = $"{Words.Capital(quantity.Name)} of state {cut.State} along the cut {cut.Text} at {FrequencyText.WithUnit(cut.FrequencyHz)}";
        var below = curves.SelectMany(curve => curve.Y).Any(value => value < levels.Minimum) ? $" Levels below {UnitText.Join(NumberText.Fixed(levels.Minimum, 0), unit)} are not drawn." : string.Empty;
        return new(
        [
            new PlotFigure
            {
                FileName = $"pattern-{name}-{cut.FilePart}-polar",
                Kind = "polar cut",
                Caption = $"{cut.Text}. {PolarCutPlot.RingText(floor, top, unit)}",
                AlternativeText = $"{what}, in polar form. {Peak(context, quantity, cut)}",
                WidthShare = 0.38,
                Aspect = 0.98,
                Readout = new(cut.PhiDeg is null ? "φ" : "θ", "°", 1, unit, 1) { PolarFloor = floor, PolarTop = top },
                Make = () => PolarCutPlot.Make(curves, legend, floor, top),
            },
            new PlotFigure
            {
                FileName = $"pattern-{name}-{cut.FilePart}",
                Kind = "rectangular cut",
                Caption = $"{cut.Text}, the same data over angle.{below}",
                AlternativeText = $"{what}, over angle. {Peak(context, quantity, cut)}",
                WidthShare = 0.62,
                Aspect = 0.6,
                Readout = new(cut.PhiDeg is null ? "φ" : "θ", "°", 1, unit, 1),
                Make = () => CurvePlot.Make(curves, legend, cut.AngleTitle, CurvePlot.Angles(least, last, wide: false), title, levels),
            },
        ]);
    }

    /// <summary>Gives the unit of a level plot: dBic where the components are circular.</summary>
    internal static string UnitOf(ReportContext context, Quantity quantity, CutKey cut)
    {
        var circular = context.CoCross(cut.State) is not null || CurveSource.AlongCut(context, quantity, cut, DataSource.Measured, FieldComponent.Right) is not null;
        return UnitText.Of(quantity, circular ? FieldComponent.Right : FieldComponent.None);
    }

    private static string Peak(ReportContext context, Quantity quantity, CutKey cut)
    {
        var peak = context.Figures(quantity, cut.State).FirstOrDefault(figure => figure.At == FigurePlace.Peak && figure.Source == DataSource.Measured && cut.Holds(figure));
        if (peak is null)
        {
            return string.Empty;
        }

        var component = Words.Of(peak.Component);
        var direction = peak.DirectionDeg is { } angle ? $" at {NumberText.Trimmed(angle, 1)}°" : string.Empty;
        return $"Maximum {(component.Length == 0 ? string.Empty : component + " ")}{FigureText.WithUnit(peak)}{direction}.";
    }
}
