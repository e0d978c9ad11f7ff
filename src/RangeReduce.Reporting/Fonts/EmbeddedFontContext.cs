using OxyPlot;
using OxyPlot.SkiaSharp;

using SkiaSharp;

namespace RangeReduce.Reporting.Fonts;

/// <summary>Draws plots whose text uses the typefaces inside this assembly, never the machine's: owns the text and hands the shapes on.</summary>
/// <remarks>The stock context looks text up among the machine's fonts and draws none where there are none.</remarks>
internal sealed class EmbeddedFontContext : IRenderContext, IDisposable
{
    private readonly SkiaRenderContext _shapes;
    private readonly SKPaint _ink = new() { IsAntialias = true };

    /// <summary>Draws onto a canvas.</summary>
    /// <param name="canvas">The canvas.</param>
    /// <param name="scale">Device units a plot unit; a plot unit is a point.</param>
    /// <param name="vector">Whether the canvas writes vectors rather than pixels.</param>
    public EmbeddedFontContext(SKCanvas canvas, float scale, bool vector) => _shapes = new SkiaRenderContext
    {
        SkCanvas = canvas,
        DpiScale = scale,
        RenderTarget = vector ? RenderTarget.VectorGraphic : RenderTarget.PixelGraphic,
        UseTextShaping = false,
    };

    /// <inheritdoc/>
    public bool RendersToScreen => false;

    /// <inheritdoc/>
    public int ClipCount => _shapes.ClipCount;

    /// <inheritdoc/>
    public OxySize MeasureText(string? text, string? fontFamily = null, double fontSize = 10, double fontWeight = 500) => PlotText.Measure(text, fontSize, fontWeight);

    /// <inheritdoc/>
    public void DrawText(ScreenPoint p, string? text, OxyColor fill, string? fontFamily = null, double fontSize = 10, double fontWeight = 400, double rotation = 0, HorizontalAlignment horizontalAlignment = HorizontalAlignment.Left, VerticalAlignment verticalAlignment = VerticalAlignment.Top, OxySize? maxSize = null)
    {
        if (string.IsNullOrEmpty(text) || fill.IsInvisible())
        {
            return;
        }

        var scale = _shapes.DpiScale;
        using var font = TextMeter.Font(PlotText.FaceOf(fontWeight), (float)fontSize * scale);
        _ink.Color = new SKColor(fill.R, fill.G, fill.B, fill.A);
        var canvas = _shapes.SkCanvas;
        canvas.Save();
        canvas.Translate((float)p.X * scale, (float)p.Y * scale);
        canvas.RotateDegrees((float)rotation);
        foreach (var (line, dx, dy) in PlotText.Lines(text, fontSize, fontWeight, horizontalAlignment, verticalAlignment))
        {
            canvas.DrawText(line, (float)dx * scale, (float)dy * scale, SKTextAlign.Left, font, _ink);
        }

        canvas.Restore();
    }

    /// <inheritdoc/>
    public void DrawEllipse(OxyRect extents, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode) =>
        _shapes.DrawEllipse(extents, fill, stroke, thickness, edgeRenderingMode);

    /// <inheritdoc/>
    public void DrawEllipses(IList<OxyRect> extents, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode) =>
        _shapes.DrawEllipses(extents, fill, stroke, thickness, edgeRenderingMode);

    /// <inheritdoc/>
    public void DrawLine(IList<ScreenPoint> points, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[]? dashArray = null, LineJoin lineJoin = LineJoin.Miter) =>
        _shapes.DrawLine(points, stroke, thickness, edgeRenderingMode, Dashes(dashArray), lineJoin);

    /// <inheritdoc/>
    public void DrawLineSegments(IList<ScreenPoint> points, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[]? dashArray = null, LineJoin lineJoin = LineJoin.Miter) =>
        _shapes.DrawLineSegments(points, stroke, thickness, edgeRenderingMode, Dashes(dashArray), lineJoin);

    /// <inheritdoc/>
    public void DrawPolygon(IList<ScreenPoint> points, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[]? dashArray = null, LineJoin lineJoin = LineJoin.Miter) =>
        _shapes.DrawPolygon(points, fill, stroke, thickness, edgeRenderingMode, Dashes(dashArray), lineJoin);

    /// <inheritdoc/>
    public void DrawPolygons(IList<IList<ScreenPoint>> polygons, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[]? dashArray = null, LineJoin lineJoin = LineJoin.Miter) =>
        _shapes.DrawPolygons(polygons, fill, stroke, thickness, edgeRenderingMode, Dashes(dashArray), lineJoin);

    /// <inheritdoc/>
    public void DrawRectangle(OxyRect rectangle, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode) =>
        _shapes.DrawRectangle(rectangle, fill, stroke, thickness, edgeRenderingMode);

    /// <inheritdoc/>
    public void DrawRectangles(IList<OxyRect> rectangles, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode) =>
        _shapes.DrawRectangles(rectangles, fill, stroke, thickness, edgeRenderingMode);

    /// <inheritdoc/>
    public void DrawImage(OxyImage source, double srcX, double srcY, double srcWidth, double srcHeight, double destX, double destY, double destWidth, double destHeight, double opacity, bool interpolate) =>
        _shapes.DrawImage(source, srcX, srcY, srcWidth, srcHeight, destX, destY, destWidth, destHeight, opacity, interpolate);

    /// <inheritdoc/>
    public void SetToolTip(string text) => _shapes.SetToolTip(text);

    /// <inheritdoc/>
    public void CleanUp() => _shapes.CleanUp();

    /// <inheritdoc/>
    public void PushClip(OxyRect clippingRectangle) => _shapes.PushClip(clippingRectangle);

    /// <inheritdoc/>
    public void PopClip() => _shapes.PopClip();

    /// <summary>Lets go of the native objects.</summary>
    public void Dispose()
    {
        _ink.Dispose();
        _shapes.Dispose();
    }

    // The stock context scales dashes twice, by the thickness in device units and by the scale: one of them is taken out here.
    private double[]? Dashes(double[]? dashArray)
    {
        var scale = _shapes.DpiScale;
        return dashArray is null || scale == 1f ? dashArray : Array.ConvertAll(dashArray, dash => dash / scale);
    }
}
