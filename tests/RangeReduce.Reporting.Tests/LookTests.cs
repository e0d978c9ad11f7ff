namespace RangeReduce.Reporting.Tests;

public sealed class LookTests(Xunit.Abstractions.ITestOutputHelper output)
{
    [Fact]
    public void Whole_report_is_written_to_a_folder_for_the_eye()
    {
        // Set the variable to a folder to look at the report; without it the report only has to come out whole.
        var wanted = Environment.GetEnvironmentVariable("RANGEREDUCE_LOOK");
        var folder = wanted ?? Directory.CreateTempSubdirectory("report").FullName;
        var watch = System.Diagnostics.Stopwatch.StartNew();
        for (var turn = 0; turn < 3; turn++)
        {
            watch.Restart();
            var model = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options);
            var built = watch.ElapsedMilliseconds;
            using (var pdf = File.Create(Path.Combine(folder, "report.pdf")))
            {
                PdfReportWriter.Write(model, pdf);
            }

            var pdfDone = watch.ElapsedMilliseconds;
            using (var html = File.Create(Path.Combine(folder, "report.html")))
            {
                HtmlReportWriter.Write(model, html);
            }

            var set = watch.ElapsedMilliseconds;
            var names = PlotImageWriter.WritePng(model, Path.Combine(folder, "plots"));
            output.WriteLine($"build {built} ms, pdf {pdfDone - built} ms, html {set - pdfDone} ms, {names.Count} png {watch.ElapsedMilliseconds - set} ms, processor {System.Diagnostics.Process.GetCurrentProcess().TotalProcessorTime.TotalMilliseconds:F0} ms");
            Assert.All(names, name => Assert.True(new FileInfo(Path.Combine(folder, "plots", name)).Length > 2000));
        }
    }
}
