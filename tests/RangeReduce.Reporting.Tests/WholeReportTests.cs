namespace RangeReduce.Reporting.Tests;

public sealed class WholeReportTests
{
    [Fact]
    public void Report_of_three_states_comes_out_whole_and_small()
    {
        // Set the variable to a folder to look at the report with one's own eyes.
        var wanted = Environment.GetEnvironmentVariable("RANGEREDUCE_LOOK");
        var folder = wanted ?? Directory.CreateTempSubdirectory("report").FullName;
        var model = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options);
        using (var pdf = File.Create(Path.Combine(folder, "report.pdf")))
        using (var html = File.Create(Path.Combine(folder, "report.html")))
        {
            PdfReportWriter.Write(model, pdf);
            HtmlReportWriter.Write(model, html);
            Assert.InRange(pdf.Length, 100_000, 2_000_000);
            Assert.InRange(html.Length, 100_000, 2_000_000);
        }

        var names = PlotImageWriter.WritePng(model, Path.Combine(folder, "plots"));
        Assert.Equal(model.Plots.Count(), names.Count);
        Assert.InRange(names.Sum(name => new FileInfo(Path.Combine(folder, "plots", name)).Length), 500_000, 5_000_000);
        if (wanted is null)
        {
            Directory.Delete(folder, recursive: true);
        }
    }
}
