using OxyPlot;

using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

using SkiaSharp;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Draws text, lines, marks, plots and links onto one page.</summary>
internal sealed class PageBrush(SKCanvas canvas, IReadOnlySet<string> anchors) : IDisposable
{
    private readonly SKPaint _paint = new() { IsAntialias = true };

    /// <summary>Draws a line of text.</summary>
    /// <param name="line">The line.</param>
    /// <param name="size">Size of the letters.</param>
    /// <param name="x">Left end.</param>
    /// <param name="baseline">Baseline.</param>
    public void DrawLine(TextLine line, float size, float x, float baseline)
    {
        foreach (var word in line.Words)
        {
            DrawText(word.Text, TextWrapper.FaceOf(word.Span), TextWrapper.SizeOf(word.Span, size), x + word.X, baseline, ColorOf(word.Span));
            if (word.Span.LinkTo is { } anchor && anchors.Contains(anchor))
            {
                Link(anchor, new SKRect(x + word.X, baseline - (size * TextMeter.Ascent), x + word.X + word.Width, baseline + (size * TextMeter.Descent)));
            }
        }
    }

    /// <summary>Draws a string.</summary>
    public void DrawText(string text, TextFace face, float size, float x, float baseline, OxyColor color)
    {
        using var font = TextMeter.Font(face, size);
        _paint.Style = SKPaintStyle.Fill;
        _paint.Color = Convert(color);
        canvas.DrawText(text, x, baseline, SKTextAlign.Left, font, _paint);
    }

    /// <summary>Draws a straight line.</summary>
    public void DrawRule(float x0, float x1, float y, float thickness, OxyColor color)
    {
        _paint.Style = SKPaintStyle.Stroke;
        _paint.StrokeWidth = thickness;
        _paint.Color = Convert(color);
        canvas.DrawLine(x0, y, x1, y, _paint);
    }

    /// <summary>Draws the mark of a state: its marker in its colour.</summary>
    public void DrawMark(MarkerType marker, OxyColor color, float x, float y, float radius)
    {
        _paint.Style = SKPaintStyle.Fill;
        _paint.Color = Convert(color);
        using var path = new SKPath();
        switch (marker)
        {
            case MarkerType.Square:
                path.AddRect(new SKRect(x - radius, y - radius, x + radius, y + radius));
                break;
            case MarkerType.Triangle:
                path.AddPoly([new(x - (1.15f * radius), y + radius), new(x + (1.15f * radius), y + radius), new(x, y - (1.15f * radius))], true);
                break;
            case MarkerType.Diamond:
                path.AddPoly([new(x - (1.25f * radius), y), new(x, y - (1.25f * radius)), new(x + (1.25f * radius), y), new(x, y + (1.25f * radius))], true);
                break;
            default:
                path.AddCircle(x, y, radius);
                break;
        }

        canvas.DrawPath(path, _paint);
    }

    /// <summary>Draws a plot as vectors.</summary>
    public void DrawPlot(PlotFigure figure, float x, float y, float width, float height)
    {
        canvas.Save();
        canvas.Translate(x, y);
        using (var context = new EmbeddedFontContext(canvas, 1f, vector: true))
        {
            IPlotModel plot = figure.Make();
            plot.Update(true);
            plot.Render(context, new OxyRect(0, 0, width, height));
        }

        canvas.Restore();
    }

    /// <summary>Makes a place that links lead to.</summary>
    public void Anchor(string name, float x, float y)
    {
        using var data = canvas.DrawNamedDestinationAnnotation(new SKPoint(x, y), name);
    }

    /// <summary>Makes a rectangle that leads to a place.</summary>
    public void Link(string name, SKRect area)
    {
        using var data = canvas.DrawLinkDestinationAnnotation(area, name);
    }

    /// <summary>Lets go of the paint.</summary>
    public void Dispose() => _paint.Dispose();

    private static SKColor Convert(OxyColor color) => new(color.R, color.G, color.B, color.A);

    private static OxyColor ColorOf(TextSpan span) => span.Tone switch
    {
        TextTone.Quiet => PlotPalette.Quiet,
        TextTone.Good => OxyColor.FromRgb(0x1B, 0x6B, 0x3A),
        TextTone.Doubt => OxyColor.FromRgb(0x8A, 0x5A, 0x00),
        TextTone.Bad => OxyColor.FromRgb(0xA3, 0x1D, 0x1D),
        _ => PlotPalette.Ink,
    };
}
