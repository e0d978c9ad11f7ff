using OxyPlot;
using OxyPlot.Annotations;

namespace RangeReduce.Reporting.Plots;

/// <summary>Marks resonances on the return-loss curves and keeps their labels apart.</summary>
internal static class ResonanceLabels
{
    // About the width of "1.612 GHz" over the width of the frame.
    private const double LabelShare = 0.13;

    /// <summary>Adds a mark and a label for each resonance.</summary>
    public static void Add(PlotModel plot, IReadOnlyList<ResonanceMark> marks, StateStyles styles)
    {
        var span = plot.Axes[0].Maximum - plot.Axes[0].Minimum;
        var ordered = marks.OrderBy(mark => mark.X).ToList();
        for (var at = 0; at < ordered.Count; at++)
        {
            var nearBefore = at > 0 && ordered[at].X - ordered[at - 1].X < LabelShare * span;
            var nearAfter = at + 1 < ordered.Count && ordered[at + 1].X - ordered[at].X < LabelShare * span;
            var side = (nearBefore, nearAfter) switch
            {
                (false, true) => HorizontalAlignment.Right,
                (true, false) => HorizontalAlignment.Left,
                _ => HorizontalAlignment.Center,
            };
            AddOne(plot, ordered[at], side, styles.ColorOf(ordered[at].State));
        }
    }

    // The axis grows downward, and offsets and alignments turn over with it: up means down here.
    private static void AddOne(PlotModel plot, ResonanceMark mark, HorizontalAlignment side, OxyColor color)
    {
        plot.Annotations.Add(new PointAnnotation
        {
            X = mark.X,
            Y = mark.Y,
            Shape = MarkerType.Circle,
            Size = 2.6,
            Fill = PlotPalette.Paper,
            Stroke = color,
            StrokeThickness = 1.0,
            XAxisKey = PlotFrame.XKey,
            YAxisKey = PlotFrame.YKey,
        });
        plot.Annotations.Add(new TextAnnotation
        {
            Text = mark.Label,
            TextPosition = new DataPoint(mark.X, mark.Y),
            Offset = side switch
            {
                HorizontalAlignment.Left => new ScreenVector(1, -5),
                HorizontalAlignment.Right => new ScreenVector(-1, -5),
                // A shallow dip lies among flat curves: its label goes well below them.
                _ => new ScreenVector(0, mark.Y < 8.0 ? -13 : -5),
            },
            TextHorizontalAlignment = side,
            TextVerticalAlignment = VerticalAlignment.Bottom,
            FontSize = PlotFrame.FontSize - 0.5,
            TextColor = PlotPalette.Ink,
            StrokeThickness = 0,
            XAxisKey = PlotFrame.XKey,
            YAxisKey = PlotFrame.YKey,
        });
    }
}
