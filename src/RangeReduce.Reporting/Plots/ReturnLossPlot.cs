using OxyPlot;
using OxyPlot.Annotations;
using OxyPlot.Axes;

namespace RangeReduce.Reporting.Plots;

/// <summary>Return loss over frequency. It grows downward, so that a resonance looks like the dip that it is; bands lie as bars below.</summary>
internal static class ReturnLossPlot
{
    private const string BandKey = "bands";
    private const double RowShare = 0.062;

    /// <summary>Makes the plot.</summary>
    /// <param name="curves">Curves over frequency.</param>
    /// <param name="frequency">Unit of the abscissae.</param>
    /// <param name="threshold">Threshold of the bands in decibels; null where there are none.</param>
    /// <param name="bands">Bands in the order of the states.</param>
    /// <param name="marks">Resonances.</param>
    /// <param name="styles">Styles of the states.</param>
    public static PlotModel Make(IReadOnlyList<PlotCurve> curves, FrequencyUnit frequency, double? threshold, IReadOnlyList<BandBar> bands, IReadOnlyList<ResonanceMark> marks, StateStyles styles)
    {
        var plot = PlotFrame.New();
        var rows = bands.Select(band => band.State).Distinct(StringComparer.Ordinal).ToList();
        var (least, most) = PlotCurve.Range(curves);
        var scale = AxisScale.Outward(Math.Min(0.0, least), Math.Max(20.0, most + 3.0), 5);
        var strip = rows.Count == 0 ? 0.0 : (rows.Count * RowShare) + 0.02;

        var ordinate = PlotFrame.Ordinate("Return loss (dB)", scale);
        (ordinate.StartPosition, ordinate.EndPosition) = (1.0, strip);
        plot.Axes.Add(PlotFrame.Abscissa(frequency.Title, AxisScale.Within(curves.Min(curve => curve.X[0]), curves.Max(curve => curve.X[^1]), 8)));
        plot.Axes.Add(ordinate);
        if (threshold is { } limit)
        {
            plot.Annotations.Add(Limit(limit, PlotFrame.YKey));
        }

        PlotFrame.AddCurves(plot, curves);
        PlotFrame.AddLegend(plot, LegendEntry.ForStates(curves, styles));
        AddBands(plot, bands, rows, strip, styles);
        ResonanceLabels.Add(plot, marks, styles);
        return plot;
    }

    /// <summary>Makes a thin dashed line at a limit.</summary>
    public static LineAnnotation Limit(double value, string yKey) => new()
    {
        Type = LineAnnotationType.Horizontal,
        Y = value,
        Color = PlotPalette.Limit,
        StrokeThickness = 0.8,
        LineStyle = LineStyle.Solid,
        XAxisKey = PlotFrame.XKey,
        YAxisKey = yKey,
        Layer = AnnotationLayer.BelowSeries,
    };

    private static void AddBands(PlotModel plot, IReadOnlyList<BandBar> bands, List<string> rows, double strip, StateStyles styles)
    {
        if (rows.Count == 0)
        {
            return;
        }

        var axis = PlotFrame.Axis(BandKey, AxisPosition.Left, string.Empty, new AxisScale(0.0, rows.Count + 0.3, 100.0));
        (axis.StartPosition, axis.EndPosition) = (strip, 0.0);
        (axis.LabelFormatter, axis.TickStyle, axis.MajorGridlineStyle) = (_ => string.Empty, TickStyle.None, LineStyle.None);
        plot.Axes.Add(axis);
        plot.Annotations.Add(new LineAnnotation { Type = LineAnnotationType.Horizontal, Y = 0.0, Color = PlotPalette.Frame, StrokeThickness = 0.6, LineStyle = LineStyle.Solid, XAxisKey = PlotFrame.XKey, YAxisKey = BandKey });
        foreach (var band in bands)
        {
            var row = rows.IndexOf(band.State);
            plot.Annotations.Add(Bar(band, row, styles.ColorOf(band.State)));
        }

        var middle = 0.5 * (plot.Axes[0].Minimum + plot.Axes[0].Maximum);
        for (var row = 0; row < rows.Count; row++)
        {
            var own = bands.Where(band => string.Equals(band.State, rows[row], StringComparison.Ordinal)).ToList();
            var first = own.Find(band => !band.Simulated) ?? own[0];
            var toTheRight = 0.5 * (first.Low + first.High) < middle;
            plot.Annotations.Add(new TextAnnotation
            {
                Text = first.Label,
                TextPosition = new DataPoint(toTheRight ? own.Max(band => band.High) : own.Min(band => band.Low), row + 0.65),
                TextHorizontalAlignment = toTheRight ? HorizontalAlignment.Left : HorizontalAlignment.Right,
                TextVerticalAlignment = VerticalAlignment.Middle,
                Offset = new ScreenVector(toTheRight ? 4 : -4, 0),
                FontSize = PlotFrame.FontSize - 0.5,
                TextColor = PlotPalette.Ink,
                StrokeThickness = 0,
                XAxisKey = PlotFrame.XKey,
                YAxisKey = BandKey,
            });
        }
    }

    // A measured band is a full bar, a simulated one a thin outline below it.
    private static RectangleAnnotation Bar(BandBar band, int row, OxyColor color) => new()
    {
        MinimumX = band.Low,
        MaximumX = band.High,
        MinimumY = row + (band.Simulated ? 0.78 : 0.36),
        MaximumY = row + (band.Simulated ? 1.0 : 0.74),
        Fill = band.Simulated ? OxyColors.Transparent : color,
        Stroke = color,
        StrokeThickness = 0.7,
        XAxisKey = PlotFrame.XKey,
        YAxisKey = BandKey,
    };
}
