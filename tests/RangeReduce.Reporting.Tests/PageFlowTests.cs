using RangeReduce.Reporting.Pdf;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Tests;

public sealed class PageFlowTests
{
    private static readonly PageGeometry Page = PageGeometry.Of(PaperSize.A4);

    [Theory]
    [InlineData(PaperSize.A4)]
    [InlineData(PaperSize.Letter)]
    public void Nothing_of_the_report_reaches_beyond_the_text_of_a_page_or_over_its_neighbour(PaperSize paper)
    {
        var model = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options with { Paper = paper });
        var page = PageGeometry.Of(paper);
        foreach (var placed in PageFlow.Arrange(new BlockPieces(page.TextWidth, new StateStyles(model.States)).Of(model), page))
        {
            Assert.True(placed[0].Top >= PageGeometry.Top);
            Assert.True(placed[^1].Bottom <= page.Bottom + 0.1f);
            Assert.All(placed.Zip(placed.Skip(1)), pair => Assert.True(pair.First.Bottom <= pair.Second.Top + 0.01f));
            Assert.False(placed[^1].Piece.KeepWithNext, "a heading or an introduction stands alone at the end of a page");
        }
    }

    [Fact]
    public void Head_of_a_table_is_repeated_on_each_page_that_it_reaches()
    {
        var head = new Brick(20f) { KeepWithNext = true };
        var rows = Enumerable.Range(0, 100).Select(_ => new Brick(18f) { Head = head });
        var pages = PageFlow.Arrange([head, .. rows], Page);
        Assert.Equal(3, pages.Count);
        Assert.All(pages, page => Assert.Same(head, page[0].Piece));
        Assert.Equal(100, pages.Sum(page => page.Count - 1));
    }

    [Fact]
    public void Heading_moves_to_the_next_page_with_what_it_heads()
    {
        var (filler, heading, body) = (new Brick(Page.Bottom - PageGeometry.Top - 40f), new Brick(20f) { KeepWithNext = true }, new Brick(30f));
        var pages = PageFlow.Arrange([filler, heading, body], Page);
        Assert.Equal(2, pages.Count);
        Assert.Same(heading, pages[1][0].Piece);
    }

    [Fact]
    public void Piece_higher_than_a_page_still_comes_out_once() => Assert.Equal(2, PageFlow.Arrange([new Brick(10f), new Brick(2000f)], Page).Sum(page => page.Count));

    private sealed class Brick(float height) : FlowPiece
    {
        public override float Height => height;

        public override void Draw(PageBrush brush, float x, float y)
        {
        }
    }
}
