using System.Text;

using UglyToad.PdfPig;
using UglyToad.PdfPig.Outline;

namespace RangeReduce.Reporting.Tests;

public sealed class PdfReportTests
{
    private static readonly ReportModel Model = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options);
    private static readonly byte[] Pdf = Write(Model);

    [Fact]
    public void Each_page_says_which_it_is_and_how_many_there_are()
    {
        using var document = PdfDocument.Open(Pdf);
        Assert.All(document.GetPages(), page => Assert.Contains($"page {page.Number} of {document.NumberOfPages}", page.Text, StringComparison.Ordinal));
    }

    [Fact]
    public void Bookmarks_name_the_sections_and_lead_to_their_pages()
    {
        using var document = PdfDocument.Open(Pdf);
        Assert.True(document.TryGetBookmarks(out var bookmarks));
        Assert.Equal(Model.Sections.Select((section, at) => $"{at + 1}\u00A0 {section.Title}"), bookmarks.Roots.Select(root => root.Title), StringComparer.Ordinal);
        foreach (var root in bookmarks.Roots.Cast<DocumentBookmarkNode>())
        {
            Assert.Contains(root.Title.Split(' ', 2)[1], document.GetPage(root.PageNumber).Text, StringComparison.Ordinal);
        }

        Assert.Contains(bookmarks.GetNodes(), node => node.Level == 1 && node.Title is "State left");
    }

    [Fact]
    public void Numbers_of_the_model_can_be_read_back()
    {
        using var document = PdfDocument.Open(Pdf);
        var text = string.Concat(document.GetPages().Select(page => page.Text));
        var cells = Model.Sections.SelectMany(section => section.Blocks).OfType<Model.TableBlock>().Where(table => table.Rows.Count > 0)
            .SelectMany(table => table.Rows).SelectMany(row => row.Cells).Select(cell => cell.Plain).Where(cell => cell.Contains('±', StringComparison.Ordinal)).ToList();
        Assert.True(cells.Count > 40);
        Assert.All(cells, cell => Assert.Contains(cell, text, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_letter_is_set_in_a_face_that_the_file_carries()
    {
        using var document = PdfDocument.Open(Pdf);
        var faces = document.GetPages().SelectMany(page => page.Letters).Select(letter => letter.FontName!.Split('+')[^1]).ToHashSet(StringComparer.Ordinal);
        Assert.Equal(["DejaVuSans", "DejaVuSans-Bold", "DejaVuSansMono"], faces.Order(StringComparer.Ordinal), StringComparer.Ordinal);
        Assert.Equal(3, Count("/FontFile2 "));
    }

    [Fact]
    public void Language_page_mode_and_title_are_stated()
    {
        using var document = PdfDocument.Open(Pdf);
        Assert.Equal(Model.Title, document.Information.Title);
        Assert.Equal(1, Count("/Lang (en)"));
        Assert.Equal(1, Count("/PageMode /UseOutlines"));
    }

    [Fact]
    public void Plots_are_vectors_and_not_pictures()
    {
        using var document = PdfDocument.Open(Pdf);
        Assert.All(document.GetPages(), page => Assert.Empty(page.GetImages()));
        Assert.True(document.GetPage(2).Paths.Count > 20);
    }

    [Fact]
    public void Same_model_gives_the_same_bytes_and_another_date_changes_little()
    {
        Assert.Equal(Pdf, Write(ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options)));
        var later = Write(ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options with { Made = SyntheticRun.Options.Made.AddDays(1) }));
        Assert.NotEqual(Pdf, later);
        Assert.InRange(later.Length, Pdf.Length - 200, Pdf.Length + 200);
    }

    [Theory]
    [InlineData(PaperSize.A4, 595, 842)]
    [InlineData(PaperSize.Letter, 612, 792)]
    public void Paper_has_the_size_asked_for(PaperSize paper, int width, int height)
    {
        using var document = PdfDocument.Open(Write(ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options with { Paper = paper })));
        Assert.Equal((width, height), ((int)Math.Round(document.GetPage(1).Width), (int)Math.Round(document.GetPage(1).Height)));
    }

    private static int Count(string needle) => Encoding.Latin1.GetString(Pdf).Split(needle).Length - 1;

    private static byte[] Write(ReportModel model)
    {
        using var stream = new MemoryStream();
        PdfReportWriter.Write(model, stream);
        return stream.ToArray();
    }
}
