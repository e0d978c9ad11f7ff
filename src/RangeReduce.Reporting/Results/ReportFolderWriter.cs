using System.Diagnostics;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes everything that a reduction gives into one folder, whole or not at all.</summary>
public static class ReportFolderWriter
{
    /// <summary>Writes the folder.</summary>
    /// <param name="reduced">The reduced run.</param>
    /// <param name="stamp">Time and version.</param>
    /// <param name="paper">Paper of the PDF.</param>
    /// <param name="folder">Where the folder is to stand.</param>
    /// <param name="overwrite">Whether a report that stands there may be replaced.</param>
    /// <param name="took">Told each part and the seconds that it took, from several threads; may be null.</param>
    /// <param name="cancellationToken">Stops the work between two steps; nothing is left behind then.</param>
    /// <exception cref="IOException">Something stands there and may not be replaced, or the disk failed.</exception>
    /// <exception cref="UnauthorizedAccessException">The place may not be written.</exception>
    /// <exception cref="OperationCanceledException">The work was stopped.</exception>
    public static void Write(ReducedRun reduced, ReportStamp stamp, PaperSize paper, string folder, bool overwrite, Action<string, double>? took = null, CancellationToken cancellationToken = default)
    {
        ArgumentNullException.ThrowIfNull(stamp);
        OutputFolder.Build(folder, overwrite, target =>
        {
            var model = Timed("report model", () => ReportModelBuilder.Build(reduced, new() { Made = stamp.At, Version = stamp.Version, Paper = paper }));
            var plots = Directory.CreateDirectory(Path.Combine(target, "plots")).FullName;
            var traces = Directory.CreateDirectory(Path.Combine(target, "traces")).FullName;

            // None of the writers needs another: each core takes the next one.
            Parallel.Invoke(
                new ParallelOptions { CancellationToken = cancellationToken },
                () => Timed("plots", () => PlotImageWriter.WritePng(model, plots)),
                () => WriteFile("report.pdf", stream => PdfReportWriter.Write(model, stream)),
                () => WriteFile("report.html", stream => HtmlReportWriter.Write(model, stream)),
                () => WriteFile("results.json", stream => ResultsJsonWriter.Write(reduced, stamp, stream)),
                () => WriteFile("figures.csv", stream => FiguresCsvWriter.Write(reduced.Table, stream)),
                () => Timed("traces", () => TraceCsvWriter.Write(reduced.Table, traces)));
            cancellationToken.ThrowIfCancellationRequested();

            void WriteFile(string name, Action<Stream> write) => Timed(name, () =>
            {
                cancellationToken.ThrowIfCancellationRequested();
                using var stream = new FileStream(Path.Combine(target, name), FileMode.CreateNew, FileAccess.ReadWrite, FileShare.None, 1 << 16);
                write(stream);
                return true;
            });

            T Timed<T>(string part, Func<T> work)
            {
                var start = Stopwatch.GetTimestamp();
                var result = work();
                took?.Invoke(part, Stopwatch.GetElapsedTime(start).TotalSeconds);
                return result;
            }
        });
    }
}
