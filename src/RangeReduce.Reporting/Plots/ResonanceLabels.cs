using OxyPlot;
using OxyPlot.Annotations;

namespace RangeReduce.Reporting.Plots;

/// <summary>Marks resonances on the return-loss curves and keeps their labels apart.</summary>
internal static class ResonanceLabels
{
    // About the width of "1.612 GHz" over the width of the frame.
    private const double LabelShare = 0.13;

    private const double LineHeight = 9.0;

    /// <summary>Adds a mark and a label for each resonance. Labels of resonances near each other stand below the deepest of them, left and right.</summary>
    public static void Add(PlotModel plot, IReadOnlyList<ResonanceMark> marks, StateStyles styles)
    {
        var near = LabelShare * (plot.Axes[0].Maximum - plot.Axes[0].Minimum);
        var group = new List<ResonanceMark>();
        foreach (var mark in marks.OrderBy(mark => mark.X))
        {
            if (group.Count > 0 && mark.X - group[^1].X >= near)
            {
                AddGroup(plot, group, styles);
                group.Clear();
            }

            group.Add(mark);
        }

        AddGroup(plot, group, styles);
    }

    private static void AddGroup(PlotModel plot, List<ResonanceMark> group, StateStyles styles)
    {
        for (var at = 0; at < group.Count; at++)
        {
            var mark = group[at];
            plot.Annotations.Add(new PointAnnotation
            {
                X = mark.X,
                Y = mark.Y,
                Shape = MarkerType.Circle,
                Size = 2.6,
                Fill = PlotPalette.Paper,
                Stroke = styles.ColorOf(mark.State),
                StrokeThickness = 1.0,
                XAxisKey = PlotFrame.XKey,
                YAxisKey = PlotFrame.YKey,
            });
            var side = group.Count == 1 ? HorizontalAlignment.Center : at % 2 == 0 ? HorizontalAlignment.Right : HorizontalAlignment.Left;
            plot.Annotations.Add(Label(mark, group.Max(other => other.Y), side, at / 2, styles.ColorOf(mark.State)));
        }
    }

    // The axis grows downward, and offsets turn over with it: a negative one goes down. Alignments do not. A shallow dip lies among flat curves: its label goes well below them.
    private static TextAnnotation Label(ResonanceMark mark, double deepest, HorizontalAlignment side, int line, OxyColor color) => new()
    {
        Text = mark.Label,
        TextPosition = new DataPoint(mark.X, deepest),
        Offset = new ScreenVector(side switch { HorizontalAlignment.Left => 2, HorizontalAlignment.Right => -2, _ => 0 }, (deepest < 8.0 ? -7 : -3) - (line * LineHeight)),
        TextHorizontalAlignment = side,
        TextVerticalAlignment = VerticalAlignment.Top,
        FontSize = PlotFrame.FontSize - 0.5,
        TextColor = color,
        StrokeThickness = 0,
        XAxisKey = PlotFrame.XKey,
        YAxisKey = PlotFrame.YKey,
    };
}
