using OxyPlot;
using OxyPlot.Annotations;

using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Plots;

/// <summary>The reflection coefficient in its complex plane, with the circles of constant resistance and of constant reactance.</summary>
internal static class ReflectionPlanePlot
{
    private static readonly double[] Normalized = [0.2, 0.5, 1.0, 2.0, 5.0];

    /// <summary>Makes the plot.</summary>
    /// <param name="curves">Curves with the real part as abscissa and the imaginary part as ordinate.</param>
    /// <param name="legend">Entries of the legend.</param>
    /// <param name="marks">Resonances.</param>
    /// <param name="styles">Styles of the states.</param>
    public static PlotModel Make(IReadOnlyList<PlotCurve> curves, IReadOnlyList<LegendEntry> legend, IReadOnlyList<ResonanceMark> marks, StateStyles styles)
    {
        var plot = RoundFrame.New(1.14, 1.1);
        foreach (var value in Normalized)
        {
            // r = const is a circle about r/(1+r) of radius 1/(1+r); x = const one about (1, 1/x) of radius 1/x, of which the part inside |Γ| = 1 counts.
            RoundFrame.AddCircle(plot, value / (1.0 + value), 0.0, 1.0 / (1.0 + value), PlotPalette.Grid, 0.5);
            AddReactance(plot, value);
            AddReactance(plot, -value);
        }

        RoundFrame.AddLine(plot, [-1.0, 1.0], [0.0, 0.0], PlotPalette.Grid, 0.5);
        RoundFrame.AddCircle(plot, 0.0, 0.0, 1.0, PlotPalette.Frame, 0.8);
        PlotFrame.AddCurves(plot, curves);
        foreach (var value in Normalized)
        {
            RoundFrame.AddLabel(plot, (value - 1.0) / (value + 1.0), -0.035, NumberText.Trimmed(value, 1), PlotPalette.Quiet);
        }

        foreach (var mark in marks)
        {
            plot.Annotations.Add(new PointAnnotation { X = mark.X, Y = mark.Y, Shape = MarkerType.Circle, Size = 3.2, Fill = PlotPalette.Paper, Stroke = styles.ColorOf(mark.State), StrokeThickness = 1.2, XAxisKey = PlotFrame.XKey, YAxisKey = PlotFrame.YKey });
        }

        PlotFrame.AddLegend(plot, legend);
        return plot;
    }

    private static void AddReactance(PlotModel plot, double reactance)
    {
        const int Points = 60;
        var (x, y) = (new double[Points + 1], new double[Points + 1]);
        for (var at = 0; at <= Points; at++)
        {
            // Γ = (z − 1)/(z + 1) with z = r + jx, r from 0 to infinity as tan² of an even angle.
            var tangent = Math.Tan(at * 0.5 * Math.PI / Points);
            var resistance = Math.Min(1e9, tangent * tangent);
            var gamma = (new System.Numerics.Complex(resistance, reactance) - 1.0) / (new System.Numerics.Complex(resistance, reactance) + 1.0);
            (x[at], y[at]) = (gamma.Real, gamma.Imaginary);
        }

        RoundFrame.AddLine(plot, x, y, PlotPalette.Grid, 0.5);
        RoundFrame.AddLabel(plot, 1.075 * x[0], 1.055 * y[0], NumberText.Trimmed(reactance, 1), PlotPalette.Quiet);
    }
}
