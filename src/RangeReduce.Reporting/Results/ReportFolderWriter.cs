namespace RangeReduce.Reporting.Results;

/// <summary>Writes everything that a reduction gives into one folder, whole or not at all.</summary>
public static class ReportFolderWriter
{
    /// <summary>Writes the folder.</summary>
    /// <param name="reduced">The reduced run.</param>
    /// <param name="stamp">Time and version.</param>
    /// <param name="folder">Where the folder is to stand.</param>
    /// <param name="overwrite">Whether a report that stands there may be replaced.</param>
    /// <exception cref="IOException">Something stands there and may not be replaced, or the disk failed.</exception>
    /// <exception cref="UnauthorizedAccessException">The place may not be written.</exception>
    public static void Write(ReducedRun reduced, ReportStamp stamp, string folder, bool overwrite) => OutputFolder.Build(folder, overwrite, target =>
    {
        Write(Path.Combine(target, "results.json"), stream => ResultsJsonWriter.Write(reduced, stamp, stream));
        Write(Path.Combine(target, "figures.csv"), stream => FiguresCsvWriter.Write(reduced.Table, stream));
        TraceCsvWriter.Write(reduced.Table, Directory.CreateDirectory(Path.Combine(target, "traces")).FullName);
    });

    private static void Write(string path, Action<Stream> write)
    {
        using var stream = new FileStream(path, FileMode.CreateNew, FileAccess.ReadWrite, FileShare.None, 1 << 16);
        write(stream);
    }
}
