using OxyPlot;
using OxyPlot.Series;

namespace RangeReduce.Reporting.Plots;

/// <summary>A line that carries a few markers at even distances, so that a grey print still tells the curves apart.</summary>
internal sealed class MarkedSeries : LineSeries
{
    private const double Spacing = 52.0;

    /// <summary>Makes a line.</summary>
    /// <param name="name">Name for the reading under the pointer; null where there is none.</param>
    /// <param name="state">Configuration state; null for none.</param>
    /// <param name="shift">Share of the marker distance by which the first marker is moved, so that curves that lie on each other show theirs in turn.</param>
    public MarkedSeries(string? name, string? state, double shift)
    {
        (CurveName, State, Shift) = (name, state, shift);
        (RenderInLegend, LineJoin, MinimumSegmentLength) = (false, LineJoin.Round, 0.4);
    }

    /// <summary>Gets the name for the reading under the pointer.</summary>
    public string? CurveName { get; }

    /// <summary>Gets the configuration state.</summary>
    public string? State { get; }

    /// <summary>Gets the marker that is set at even distances.</summary>
    public MarkerType SparseMarker { get; init; } = MarkerType.None;

    private double Shift { get; }

    /// <summary>Makes the line of a curve.</summary>
    public static MarkedSeries Of(PlotCurve curve, double shift)
    {
        var series = new MarkedSeries(curve.Name, curve.State, shift)
        {
            Color = curve.Color,
            StrokeThickness = curve.Thickness,
            Dashes = curve.Dashed ? [4.0, 2.5] : null!,
            SparseMarker = curve.Marker,
        };
        for (var at = 0; at < curve.X.Length; at++)
        {
            series.Points.Add(new DataPoint(curve.X[at], curve.Y[at]));
        }

        return series;
    }

    /// <inheritdoc/>
    public override void Render(IRenderContext rc)
    {
        var markup = rc as IPlotMarkup;
        markup?.BeginCurve(CurveName, State);
        base.Render(rc);
        if (SparseMarker != MarkerType.None)
        {
            DrawSparseMarkers(rc);
        }

        markup?.EndCurve();
    }

    /// <inheritdoc/>
    public override void RenderLegend(IRenderContext rc, OxyRect legendBox)
    {
        var markup = rc as IPlotMarkup;
        markup?.BeginCurve(null, State);
        var middle = 0.5 * (legendBox.Top + legendBox.Bottom);
        rc.DrawLine([new(legendBox.Left, middle), new(legendBox.Right, middle)], ActualColor, StrokeThickness, EdgeRenderingMode.PreferGeometricAccuracy, Dashes, LineJoin.Round);
        if (SparseMarker != MarkerType.None)
        {
            DrawMarker(rc, new(0.5 * (legendBox.Left + legendBox.Right), middle));
        }

        markup?.EndCurve();
    }

    private void DrawSparseMarkers(IRenderContext rc)
    {
        var area = PlotModel.PlotArea;
        using var clip = rc.AutoResetClip(area);
        var due = Spacing * (0.3 + Shift);
        var walked = 0.0;
        ScreenPoint? before = null;
        foreach (var point in Points)
        {
            if (!double.IsFinite(point.Y))
            {
                before = null;
                continue;
            }

            var here = this.Transform(point);
            walked += before is { } last ? Math.Min(here.DistanceTo(last), Spacing) : 0.0;
            before = here;
            if (walked >= due && here.Y >= area.Top && here.Y <= area.Bottom)
            {
                DrawMarker(rc, here);
                due = walked + Spacing;
            }
        }
    }

    private void DrawMarker(IRenderContext rc, ScreenPoint at)
    {
        // A dashed curve has hollow markers.
        var fill = Dashes is null ? ActualColor : PlotPalette.Paper;
        var size = SparseMarker == MarkerType.Triangle ? 2.6 : 2.2;
        rc.DrawMarker(at, SparseMarker, null, size, fill, ActualColor, 0.8, EdgeRenderingMode.PreferGeometricAccuracy);
    }
}
