using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Pdf;
using RangeReduce.Reporting.Plots;

using SkiaSharp;

namespace RangeReduce.Reporting;

/// <summary>Sets a report as PDF: vector plots, selectable text, links, bookmarks, "page x of y" on each page.</summary>
/// <remarks>The same model gives the same bytes.</remarks>
public static class PdfReportWriter
{
    /// <summary>Writes a report.</summary>
    /// <param name="model">The report.</param>
    /// <param name="target">Where the PDF goes; it is left open.</param>
    public static void Write(ReportModel model, Stream target)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(target);
        var geometry = PageGeometry.Of(model.Options.Paper);
        var styles = new StateStyles(model.States);
        var pages = PageFlow.Arrange(new BlockPieces(geometry.TextWidth, styles).Of(model), geometry);
        var bookmarks = pages.SelectMany(page => page).Select(placed => placed.Piece.Bookmark).OfType<Bookmark>().ToList();
        target.Write(PdfOutline.Append(Draw(model, geometry, pages), bookmarks, "en"));
    }

    private static byte[] Draw(ReportModel model, PageGeometry geometry, IReadOnlyList<IReadOnlyList<PlacedPiece>> pages)
    {
        var anchors = pages.SelectMany(page => page).Select(placed => placed.Piece.Anchor).OfType<string>().ToHashSet(StringComparer.Ordinal);
        var made = model.Options.Made.UtcDateTime;
        var metadata = new SKDocumentPdfMetadata
        {
            Title = model.Title,
            Subject = "Antenna measurement report",
            Creator = $"rangereduce {model.Options.Version}",
            Producer = $"rangereduce {model.Options.Version}",
            Creation = made,
            Modified = made,
            RasterDpi = 300f,
            EncodingQuality = 101,
        };
        using var buffer = new MemoryStream();
        using (var document = SKDocument.CreatePdf(buffer, metadata))
        {
            for (var at = 0; at < pages.Count; at++)
            {
                using var canvas = document.BeginPage(geometry.Width, geometry.Height);
                using var brush = new PageBrush(canvas, anchors);
                DrawFurniture(brush, model, geometry, at + 1, pages.Count);
                foreach (var placed in pages[at])
                {
                    // A repeated head is no second place to go to.
                    if (placed.Piece.Anchor is { } anchor)
                    {
                        brush.Anchor(anchor, PageGeometry.Side, placed.Top - 6f);
                    }

                    placed.Piece.Draw(brush, PageGeometry.Side, placed.Top);
                }

                document.EndPage();
            }

            document.Close();
        }

        return buffer.ToArray();
    }

    private static void DrawFurniture(PageBrush brush, ReportModel model, PageGeometry geometry, int page, int pages)
    {
        const float Size = 7.2f;
        var right = geometry.Width - PageGeometry.Side;
        var head = Shorten(model.Title, Size, geometry.TextWidth * 0.75f);
        var count = $"page {NumberText.Fixed(page, 0)} of {NumberText.Fixed(pages, 0)}";
        if (page > 1)
        {
            brush.DrawText(head, TextFace.Bold, Size, PageGeometry.Side, 40f, PlotPalette.Quiet);
            brush.DrawRule(PageGeometry.Side, right, 46f, 0.4f, PlotPalette.Frame);
        }

        var foot = geometry.Height - 34f;
        brush.DrawText(model.MadeText, TextFace.Regular, Size, PageGeometry.Side, foot, PlotPalette.Quiet);
        brush.DrawText(count, TextFace.Regular, Size, right - TextMeter.Width(count, TextFace.Regular, Size), foot, PlotPalette.Quiet);
    }

    private static string Shorten(string text, float size, float width)
    {
        var shown = text;
        while (shown.Length > 1 && TextMeter.Width(shown, TextFace.Bold, size) > width)
        {
            shown = shown[..^2] + "…";
        }

        return shown;
    }
}
