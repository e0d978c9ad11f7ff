using System.Globalization;
using System.Net;
using System.Text;

using OxyPlot;

using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Html;

/// <summary>Draws a plot as SVG elements: real text, curves in groups of their own, colours as classes that a style sheet can change.</summary>
/// <param name="prefix">Begins the ids of the plot, unique in the document.</param>
internal sealed class SvgPlotContext(string prefix) : ClippingRenderContext, IPlotMarkup
{
    private readonly StringBuilder _svg = new();
    private int _clips;

    /// <summary>Gives the elements drawn so far.</summary>
    public override string ToString() => _svg.ToString();

    /// <inheritdoc/>
    public void BeginCurve(string? name, string? state)
    {
        _svg.Append("<g class=\"curve\"");
        AppendAttribute("data-name", name);
        AppendAttribute("data-state", state);
        _svg.Append('>');
    }

    /// <inheritdoc/>
    public void EndCurve() => _svg.Append("</g>");

    /// <inheritdoc/>
    public override void DrawLine(IList<ScreenPoint> points, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[]? dashArray, LineJoin lineJoin)
    {
        if (points.Count < 2 || stroke.IsInvisible())
        {
            return;
        }

        _svg.Append("<polyline points=\"");
        AppendPoints(points);
        _svg.Append("\" fill=\"none\"");
        AppendStroke(stroke, thickness, dashArray);
        _svg.Append("/>\n");
    }

    /// <inheritdoc/>
    public override void DrawPolygon(IList<ScreenPoint> points, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[]? dashArray, LineJoin lineJoin)
    {
        _svg.Append("<polygon points=\"");
        AppendPoints(points);
        _svg.Append('"');
        AppendPaint(fill, stroke, thickness, dashArray);
    }

    /// <inheritdoc/>
    public override void DrawRectangle(OxyRect rectangle, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode)
    {
        _svg.Append(CultureInfo.InvariantCulture, $"<rect x=\"{rectangle.Left:0.##}\" y=\"{rectangle.Top:0.##}\" width=\"{rectangle.Width:0.##}\" height=\"{rectangle.Height:0.##}\"");
        AppendPaint(fill, stroke, thickness, null);
    }

    /// <inheritdoc/>
    public override void DrawEllipse(OxyRect extents, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode)
    {
        _svg.Append(CultureInfo.InvariantCulture, $"<ellipse cx=\"{extents.Center.X:0.##}\" cy=\"{extents.Center.Y:0.##}\" rx=\"{0.5 * extents.Width:0.##}\" ry=\"{0.5 * extents.Height:0.##}\"");
        AppendPaint(fill, stroke, thickness, null);
    }

    /// <inheritdoc/>
    public override void DrawText(ScreenPoint p, string text, OxyColor fill, string? fontFamily, double fontSize, double fontWeight, double rotation, HorizontalAlignment horizontalAlignment, VerticalAlignment verticalAlignment, OxySize? maxSize)
    {
        if (string.IsNullOrEmpty(text) || fill.IsInvisible())
        {
            return;
        }

        foreach (var (line, dx, dy) in PlotText.Lines(text, fontSize, fontWeight, horizontalAlignment, verticalAlignment))
        {
            // The anchor of SVG keeps the alignment where a browser sets the text in another face.
            var anchor = horizontalAlignment switch { HorizontalAlignment.Center => " text-anchor=\"middle\"", HorizontalAlignment.Right => " text-anchor=\"end\"", _ => string.Empty };
            var (x, y) = (anchor.Length == 0 ? dx : 0.0, dy);
            _svg.Append(rotation == 0.0
                ? string.Create(CultureInfo.InvariantCulture, $"<text x=\"{p.X + x:0.##}\" y=\"{p.Y + y:0.##}\"")
                : string.Create(CultureInfo.InvariantCulture, $"<text transform=\"translate({p.X:0.##} {p.Y:0.##}) rotate({rotation:0.##})\" x=\"{x:0.##}\" y=\"{y:0.##}\""));
            _svg.Append(CultureInfo.InvariantCulture, $"{anchor} font-size=\"{fontSize:0.##}\"");
            AppendColor("fill", fill);
            AppendClass(Class("f", fill));
            _svg.Append('>').Append(WebUtility.HtmlEncode(line)).Append("</text>\n");
        }
    }

    /// <inheritdoc/>
    public override OxySize MeasureText(string text, string? fontFamily, double fontSize, double fontWeight) => PlotText.Measure(text, fontSize, fontWeight);

    /// <inheritdoc/>
    protected override void SetClip(OxyRect clippingRectangle)
    {
        var id = string.Create(CultureInfo.InvariantCulture, $"{prefix}-c{++_clips}");
        _svg.Append(CultureInfo.InvariantCulture, $"<clipPath id=\"{id}\"><rect x=\"{clippingRectangle.Left:0.##}\" y=\"{clippingRectangle.Top:0.##}\" width=\"{clippingRectangle.Width:0.##}\" height=\"{clippingRectangle.Height:0.##}\"/></clipPath><g clip-path=\"url(#{id})\">");
    }

    /// <inheritdoc/>
    protected override void ResetClip() => _svg.Append("</g>\n");

    private static string? Class(string kind, OxyColor color) => PlotPalette.RoleOf(color) is { } role ? $"{kind}-{role}" : null;

    private static bool IsShown(OxyColor color) => !color.IsInvisible() && !color.IsUndefined();

    private void AppendPaint(OxyColor fill, OxyColor stroke, double thickness, double[]? dashArray)
    {
        if (IsShown(fill))
        {
            AppendColor("fill", fill);
        }
        else
        {
            _svg.Append(" fill=\"none\"");
        }

        if (IsShown(stroke) && thickness > 0.0)
        {
            AppendStroke(stroke, thickness, dashArray, IsShown(fill) ? Class("f", fill) : null);
        }
        else
        {
            AppendClass(IsShown(fill) ? Class("f", fill) : null);
        }

        _svg.Append("/>\n");
    }

    private void AppendStroke(OxyColor stroke, double thickness, double[]? dashArray, string? otherClass = null)
    {
        AppendColor("stroke", stroke);
        _svg.Append(CultureInfo.InvariantCulture, $" stroke-width=\"{thickness:0.##}\"");
        if (dashArray is { Length: > 0 })
        {
            // Dashes are counted in line widths.
            _svg.Append(" stroke-dasharray=\"").AppendJoin(' ', dashArray.Select(dash => (dash * thickness).ToString("0.##", CultureInfo.InvariantCulture))).Append('"');
        }

        AppendClass(otherClass, Class("s", stroke));
    }

    private void AppendColor(string attribute, OxyColor color)
    {
        _svg.Append(CultureInfo.InvariantCulture, $" {attribute}=\"#{color.R:X2}{color.G:X2}{color.B:X2}\"");
        if (color.A < 255)
        {
            _svg.Append(CultureInfo.InvariantCulture, $" {attribute}-opacity=\"{color.A / 255.0:0.##}\"");
        }
    }

    private void AppendClass(params string?[] classes)
    {
        var names = classes.OfType<string>().ToList();
        if (names.Count > 0)
        {
            _svg.Append(" class=\"").AppendJoin(' ', names).Append('"');
        }
    }

    private void AppendAttribute(string name, string? value)
    {
        if (!string.IsNullOrEmpty(value))
        {
            _svg.Append(' ').Append(name).Append("=\"").Append(WebUtility.HtmlEncode(value)).Append('"');
        }
    }

    private void AppendPoints(IList<ScreenPoint> points)
    {
        for (var at = 0; at < points.Count; at++)
        {
            _svg.Append(CultureInfo.InvariantCulture, $"{(at == 0 ? string.Empty : " ")}{points[at].X:0.##},{points[at].Y:0.##}");
        }
    }
}
