using OxyPlot;
using OxyPlot.Annotations;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace RangeReduce.Reporting.Plots;

/// <summary>A frame for round plots: equal scales, no visible axes, circles and spokes drawn as lines.</summary>
internal static class RoundFrame
{
    /// <summary>Makes an empty plot that shows at least the given half widths about the origin.</summary>
    public static PlotModel New(double halfWidth, double halfHeight)
    {
        var plot = PlotFrame.New();
        plot.PlotType = PlotType.Cartesian;
        plot.PlotAreaBorderThickness = new OxyThickness(0);
        plot.Padding = new OxyThickness(1, 1, 1, 1);
        plot.Axes.Add(Hidden(PlotFrame.XKey, AxisPosition.Bottom, halfWidth));
        plot.Axes.Add(Hidden(PlotFrame.YKey, AxisPosition.Left, halfHeight));
        return plot;
    }

    /// <summary>Adds a circle below the curves.</summary>
    public static void AddCircle(PlotModel plot, double x, double y, double radius, OxyColor color, double thickness) =>
        plot.Annotations.Add(new EllipseAnnotation
        {
            X = x,
            Y = y,
            Width = 2.0 * radius,
            Height = 2.0 * radius,
            Fill = OxyColors.Transparent,
            Stroke = color,
            StrokeThickness = thickness,
            Layer = AnnotationLayer.BelowSeries,
            XAxisKey = PlotFrame.XKey,
            YAxisKey = PlotFrame.YKey,
        });

    /// <summary>Adds a line of the grid.</summary>
    public static void AddLine(PlotModel plot, double[] x, double[] y, OxyColor color, double thickness)
    {
        var line = new LineSeries { Color = color, StrokeThickness = thickness, RenderInLegend = false, XAxisKey = PlotFrame.XKey, YAxisKey = PlotFrame.YKey, MinimumSegmentLength = 0.4 };
        for (var at = 0; at < x.Length; at++)
        {
            line.Points.Add(new DataPoint(x[at], y[at]));
        }

        plot.Series.Add(line);
    }

    /// <summary>Adds a label centred on a point.</summary>
    public static void AddLabel(PlotModel plot, double x, double y, string text, OxyColor color, bool onGround = false) =>
        plot.Annotations.Add(new TextAnnotation
        {
            Text = text,
            TextPosition = new DataPoint(x, y),
            TextHorizontalAlignment = HorizontalAlignment.Center,
            TextVerticalAlignment = VerticalAlignment.Middle,
            FontSize = PlotFrame.FontSize - 0.5,
            TextColor = color,
            Background = onGround ? PlotPalette.Paper : OxyColors.Undefined,
            Padding = new OxyThickness(1, 0, 1, 0),
            StrokeThickness = 0,
            XAxisKey = PlotFrame.XKey,
            YAxisKey = PlotFrame.YKey,
        });

    private static LinearAxis Hidden(string key, AxisPosition position, double half) => new()
    {
        Key = key,
        Position = position,
        Minimum = -half,
        Maximum = half,
        IsAxisVisible = false,
    };
}
