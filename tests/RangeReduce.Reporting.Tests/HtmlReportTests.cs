using System.Globalization;
using System.Text;
using System.Xml;
using System.Xml.Linq;

using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Tests;

public sealed class HtmlReportTests
{
    private static readonly ReducedRun Reduced = SyntheticRun.Make();
    private static readonly ReportModel Model = ReportModelBuilder.Build(Reduced, SyntheticRun.Options);
    private static readonly string Html = Write(Model);
    private static readonly XDocument Document = Parse(Html);

    [Fact]
    public void File_asks_the_network_for_nothing()
    {
        Assert.DoesNotContain("http://", Html, StringComparison.OrdinalIgnoreCase);
        Assert.DoesNotContain("https://", Html, StringComparison.OrdinalIgnoreCase);
        Assert.DoesNotContain(Document.Descendants(), element => element.Name.LocalName is "link" or "iframe" or "object" or "img");
        Assert.DoesNotContain(Document.Descendants().Attributes(), attribute => attribute.Name.LocalName is "src");
        Assert.Contains("default-src 'none'", Html, StringComparison.Ordinal);
    }

    [Fact]
    public void Each_plot_has_an_alternative_text_and_a_caption()
    {
        var figures = Document.Descendants("figure").ToList();
        Assert.Equal(Model.Plots.Count(), figures.Count);
        Assert.All(figures, figure =>
        {
            Assert.True(figure.Descendants("svg").Single().Attribute("aria-label")!.Value.Length > 30);
            Assert.True(figure.Element("figcaption")!.Value.Length > 10);
        });
    }

    [Fact]
    public void Anchors_are_unique_and_every_link_has_its_anchor()
    {
        var ids = Document.Descendants().Attributes("id").Select(attribute => attribute.Value).ToList();
        Assert.Equal(ids.Count, ids.Distinct(StringComparer.Ordinal).Count());
        var links = Document.Descendants("a").Select(link => link.Attribute("href")!.Value).ToList();
        Assert.True(links.Count > 50);
        Assert.All(links, link => Assert.Contains(link[1..], ids, StringComparer.Ordinal));
    }

    [Fact]
    public void Headings_go_down_by_one_level_at_a_time()
    {
        var levels = Document.Descendants().Where(element => element.Name.LocalName is "h1" or "h2" or "h3").Select(element => element.Name.LocalName[1] - '0').ToList();
        Assert.Equal(1, levels[0]);
        Assert.All(levels.Zip(levels.Skip(1)), pair => Assert.True(pair.Second <= pair.First + 1));
        Assert.Equal("en", Document.Root!.Attribute("lang")!.Value);
    }

    [Fact]
    public void Values_under_the_pointer_are_those_of_the_table()
    {
        // Does what the script does: turns points of the drawn curve back into values by the scales that the plot carries.
        var svg = Document.Descendants("svg").First(element => element.Attribute("aria-label")?.Value.StartsWith("Return loss over", StringComparison.Ordinal) == true);
        var (x, y) = (Numbers(svg.Attribute("data-x")!.Value), Numbers(svg.Attribute("data-y")!.Value));
        var points = svg.Descendants("g").First(group => group.Attribute("data-name")?.Value is "right, measured").Descendants("polyline")
            .SelectMany(line => line.Attribute("points")!.Value.Split(' ')).Select(pair => Array.ConvertAll(pair.Split(','), text => double.Parse(text, CultureInfo.InvariantCulture))).ToList();
        var trace = Reduced.Table.TracesOf(QuantityCatalogue.ReturnLoss).First(known => known.State is "right" && known.Source == DataSource.Measured);
        Assert.True(points.Count > 200);
        foreach (var point in points)
        {
            var frequency = Value(x, point[0]) * 1e9;
            var at = (int)Math.Round((frequency - trace.X[0]) / 2.5e6);
            Assert.Equal(trace.Y[at], Value(y, point[1]), 0.05);
        }
    }

    [Fact]
    public void States_can_be_told_apart_by_a_script()
    {
        var states = Document.Descendants("g").Attributes("data-state").Select(attribute => attribute.Value).Distinct(StringComparer.Ordinal);
        Assert.Equal(["left", "right", "stowed"], states.Order(StringComparer.Ordinal), StringComparer.Ordinal);
    }

    [Fact]
    public void Same_model_gives_the_same_bytes() => Assert.Equal(Html, Write(ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options)));

    [Fact]
    public void Text_of_the_user_is_escaped()
    {
        var run = Reduced with { Run = Reduced.Run with { Information = Reduced.Run.Information with { Name = "A <b> & \"c\"", Notes = "<script>x</script>" } } };
        var document = Parse(Write(ReportModelBuilder.Build(run, SyntheticRun.Options)));
        Assert.Equal("A <b> & \"c\"", document.Descendants("h1").Single().Value);
        Assert.Single(document.Descendants("script"));
    }

    private static double[] Numbers(string text) => Array.ConvertAll(text.Split(' '), part => double.Parse(part, CultureInfo.InvariantCulture));

    private static double Value(double[] scale, double pixel) => scale[2] + ((pixel - scale[0]) / (scale[1] - scale[0]) * (scale[3] - scale[2]));

    private static string Write(ReportModel model)
    {
        using var stream = new MemoryStream();
        HtmlReportWriter.Write(model, stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static XDocument Parse(string html)
    {
        using var reader = XmlReader.Create(new StringReader(html), new XmlReaderSettings { DtdProcessing = DtdProcessing.Ignore });
        return XDocument.Load(reader);
    }
}
