using OxyPlot;

using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Plots;

using SkiaSharp;

namespace RangeReduce.Reporting;

/// <summary>Writes each plot as a PNG picture of 16 cm width at 300 dots an inch.</summary>
public static class PlotImageWriter
{
    /// <summary>Width of a picture in points: 16 cm.</summary>
    internal const float WidthPt = 160f / 25.4f * 72f;

    private const float DotsPerInch = 300f;
    private const float PixelsAPoint = DotsPerInch / 72f;

    /// <summary>Writes all plots of a report into a folder, which is made where it is not there.</summary>
    /// <param name="model">The report.</param>
    /// <param name="folder">The folder.</param>
    /// <returns>File names with ending, in the order of the report.</returns>
    /// <exception cref="IOException">A file cannot be written.</exception>
    public static IReadOnlyList<string> WritePng(ReportModel model, string folder)
    {
        ArgumentNullException.ThrowIfNull(model);
        Directory.CreateDirectory(folder);
        var plots = model.Plots.ToArray();
        var names = Array.ConvertAll(plots, plot => plot.FileName + ".png");
        Parallel.For(0, plots.Length, at => File.WriteAllBytes(Path.Combine(folder, names[at]), Draw(plots[at])));
        return names;
    }

    /// <summary>Draws one plot as PNG.</summary>
    internal static byte[] Draw(PlotFigure figure)
    {
        var height = (float)(WidthPt * figure.Aspect);
        using var surface = SKSurface.Create(new SKImageInfo((int)MathF.Round(WidthPt * PixelsAPoint), (int)MathF.Round(height * PixelsAPoint), SKColorType.Rgba8888, SKAlphaType.Opaque));
        surface.Canvas.Clear(SKColors.White);
        using var context = new EmbeddedFontContext(surface.Canvas, PixelsAPoint, vector: false);
        IPlotModel plot = figure.Make();
        plot.Update(true);
        plot.Render(context, new OxyRect(0, 0, WidthPt, height));

        using var pixels = surface.PeekPixels();
        return PictureEncoder.Encode(pixels.GetPixelSpan(), pixels.Width, pixels.Height, pixels.RowBytes, DotsPerInch);
    }
}
