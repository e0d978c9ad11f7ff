using OxyPlot;
using OxyPlot.Annotations;

namespace RangeReduce.Reporting.Plots;

/// <summary>Curves in a plain rectangular frame: VSWR, rectangular cuts, axial ratio and tilt along a cut, and every quantity over frequency.</summary>
internal static class CurvePlot
{
    /// <summary>Makes the plot.</summary>
    /// <param name="curves">The curves.</param>
    /// <param name="legend">Entries of the legend.</param>
    /// <param name="xTitle">Title of the abscissa.</param>
    /// <param name="x">Scale of the abscissa.</param>
    /// <param name="yTitle">Title of the ordinate.</param>
    /// <param name="y">Scale of the ordinate; what lies beyond is not drawn.</param>
    /// <param name="limit">A limit to be drawn as a line; null for none.</param>
    /// <param name="limitText">What the limit is.</param>
    public static PlotModel Make(IReadOnlyList<PlotCurve> curves, IReadOnlyList<LegendEntry> legend, string xTitle, AxisScale x, string yTitle, AxisScale y, double? limit = null, string limitText = "")
    {
        var plot = PlotFrame.New();
        plot.Axes.Add(PlotFrame.Abscissa(xTitle, x));
        plot.Axes.Add(PlotFrame.Ordinate(yTitle, y));
        if (limit is { } value && value > y.Minimum && value < y.Maximum)
        {
            plot.Annotations.Add(ReturnLossPlot.Limit(value, PlotFrame.YKey));
            plot.Annotations.Add(new TextAnnotation
            {
                Text = limitText,
                TextPosition = new DataPoint(x.Maximum, value),
                Offset = new ScreenVector(-3, -1),
                TextHorizontalAlignment = HorizontalAlignment.Right,
                TextVerticalAlignment = VerticalAlignment.Bottom,
                FontSize = PlotFrame.FontSize - 0.5,
                TextColor = PlotPalette.Limit,
                StrokeThickness = 0,
                XAxisKey = PlotFrame.XKey,
                YAxisKey = PlotFrame.YKey,
            });
        }

        PlotFrame.AddCurves(plot, curves);
        PlotFrame.AddLegend(plot, legend);
        return plot;
    }

    /// <summary>Gives the scale of an angle axis: ticks at 30 degrees or a handy multiple.</summary>
    public static AxisScale Angles(double leastDeg, double mostDeg, bool wide)
    {
        var span = mostDeg - leastDeg;
        var step = span > 200.0 ? (wide ? 30.0 : 60.0) : span > 100.0 ? (wide ? 15.0 : 30.0) : AxisScale.Within(leastDeg, mostDeg, 6).Step;
        return new(leastDeg, mostDeg, step);
    }

    /// <summary>Gives the scale of a level axis: from the ten above the highest level down by a fixed span.</summary>
    public static AxisScale Levels(double mostDb, double spanDb)
    {
        var top = double.IsFinite(mostDb) ? Math.Ceiling((mostDb + 0.5) / 5.0) * 5.0 : 0.0;
        return new(top - spanDb, top, 10.0);
    }
}
