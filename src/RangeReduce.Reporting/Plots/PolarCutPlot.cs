using System.Globalization;

using OxyPlot;

using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Plots;

/// <summary>A cut in polar form: 0 degrees at the top, angles growing to the right, a ring every 10 dB labelled once.</summary>
internal static class PolarCutPlot
{
    private const double RingStepDb = 10.0;
    private const double LabelAngleDeg = 165.0;

    /// <summary>Makes the plot.</summary>
    /// <param name="curves">Curves with the angle in degrees as abscissa and the level in decibels as ordinate.</param>
    /// <param name="legend">Entries of the legend.</param>
    /// <param name="floorDb">Level at the centre; lower levels lie there too.</param>
    /// <param name="topDb">Level at the outer ring.</param>
    public static PlotModel Make(IReadOnlyList<PlotCurve> curves, IReadOnlyList<LegendEntry> legend, double floorDb, double topDb)
    {
        var plot = RoundFrame.New(1.2, 1.15);
        var rings = (int)Math.Round((topDb - floorDb) / RingStepDb);
        for (var ring = 1; ring <= rings; ring++)
        {
            RoundFrame.AddCircle(plot, 0.0, 0.0, (double)ring / rings, ring == rings ? PlotPalette.Frame : PlotPalette.Grid, ring == rings ? 0.8 : 0.5);
        }

        for (var angle = 0; angle < 360; angle += 30)
        {
            var (x, y) = At(angle, 1.0);
            RoundFrame.AddLine(plot, [0.0, x], [0.0, y], PlotPalette.Grid, 0.5);
            var shown = angle > 180 ? angle - 360 : angle;
            RoundFrame.AddLabel(plot, 1.13 * x, 1.075 * y, NumberText.Fixed(shown, 0) + "°", PlotPalette.Ink);
        }

        PlotFrame.AddCurves(plot, [.. curves.Select(curve => OnPaper(curve, floorDb, topDb))]);
        for (var ring = 1; ring <= rings; ring++)
        {
            var (x, y) = At(LabelAngleDeg, (double)ring / rings);
            RoundFrame.AddLabel(plot, x, y, NumberText.Fixed(floorDb + (ring * RingStepDb), 0), PlotPalette.Quiet, onGround: true);
        }

        PlotFrame.AddLegend(plot, legend);
        return plot;
    }

    /// <summary>Gives the outer ring and the centre for a highest level: full tens, four rings.</summary>
    public static (double FloorDb, double TopDb) Rings(double mostDb)
    {
        var top = double.IsFinite(mostDb) ? Math.Ceiling(mostDb / RingStepDb) * RingStepDb : 0.0;
        return (top - (4.0 * RingStepDb), top);
    }

    /// <summary>Describes the rings for a caption.</summary>
    public static string RingText(double floorDb, double topDb, string unit) => string.Create(
        CultureInfo.InvariantCulture,
        $"Rings every {UnitText.Join("10", "dB")}, the outer one at {UnitText.Join(NumberText.Fixed(topDb, 0), unit)}; levels below {UnitText.Join(NumberText.Fixed(floorDb, 0), unit)} lie at the centre.");

    private static PlotCurve OnPaper(PlotCurve curve, double floorDb, double topDb)
    {
        var (x, y) = (new double[curve.X.Length], new double[curve.X.Length]);
        for (var at = 0; at < x.Length; at++)
        {
            var radius = Math.Max(0.0, (curve.Y[at] - floorDb) / (topDb - floorDb));
            (x[at], y[at]) = double.IsFinite(radius) ? At(curve.X[at], radius) : (double.NaN, double.NaN);
        }

        return curve with { X = x, Y = y };
    }

    private static (double X, double Y) At(double angleDeg, double radius)
    {
        var (sin, cos) = Math.SinCos(double.DegreesToRadians(angleDeg));
        return (radius * sin, radius * cos);
    }
}
