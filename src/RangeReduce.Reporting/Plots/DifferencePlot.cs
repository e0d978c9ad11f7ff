using OxyPlot;
using OxyPlot.Axes;

namespace RangeReduce.Reporting.Plots;

/// <summary>Measured over simulated in one frame, with the difference in a strip of its own below.</summary>
internal static class DifferencePlot
{
    private const string DifferenceKey = "difference";
    private const double Strip = 0.26;

    /// <summary>Makes the plot.</summary>
    /// <param name="curves">The measured and the simulated curve.</param>
    /// <param name="difference">Measured minus simulated.</param>
    /// <param name="xTitle">Title of the abscissa.</param>
    /// <param name="x">Its scale.</param>
    /// <param name="yTitle">Title of the upper ordinate.</param>
    /// <param name="y">Its scale.</param>
    /// <param name="downward">Whether the upper ordinate grows downward.</param>
    public static PlotModel Make(IReadOnlyList<PlotCurve> curves, PlotCurve difference, string xTitle, AxisScale x, string yTitle, AxisScale y, bool downward)
    {
        var plot = PlotFrame.New();
        var upper = PlotFrame.Ordinate(yTitle, y);
        (upper.StartPosition, upper.EndPosition) = downward ? (1.0, Strip + 0.07) : (Strip + 0.07, 1.0);
        var reach = Reach(difference);
        var lower = PlotFrame.Axis(DifferenceKey, AxisPosition.Left, "Δ (dB)", new AxisScale(-reach, reach, reach));
        (lower.StartPosition, lower.EndPosition) = (0.0, Strip);
        plot.Axes.Add(PlotFrame.Abscissa(xTitle, x));
        plot.Axes.Add(upper);
        plot.Axes.Add(lower);
        PlotFrame.AddCurves(plot, curves);
        PlotFrame.AddCurves(plot, [difference with { Name = string.Empty, Color = PlotPalette.Quiet, Marker = MarkerType.None, Thickness = 1.0 }], DifferenceKey);
        PlotFrame.AddLegend(plot, LegendEntry.Sources);
        return plot;
    }

    /// <summary>Gives the half height of the strip: round, and wide enough for nine tenths of the differences.</summary>
    public static double Reach(PlotCurve difference)
    {
        var sizes = difference.Y.Where(double.IsFinite).Select(Math.Abs).Order().ToList();
        var most = sizes.Count == 0 ? 1.0 : sizes[(int)(0.9 * (sizes.Count - 1))];
        return most switch
        {
            <= 1.0 => 1.0,
            <= 2.0 => 2.0,
            <= 5.0 => 5.0,
            <= 10.0 => 10.0,
            _ => 20.0,
        };
    }
}
