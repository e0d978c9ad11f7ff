namespace RangeReduce.Reporting.Results;

/// <summary>Writes a folder whole or not at all: it is built under another name beside its place and renamed when it is complete.</summary>
public static class OutputFolder
{
    /// <summary>Builds a folder.</summary>
    /// <param name="folder">Where it is to stand in the end.</param>
    /// <param name="overwrite">Whether a folder that stands there may be replaced; it must then be one of ours (it holds our results.json) or empty.</param>
    /// <param name="build">Fills the folder whose path it is given.</param>
    /// <exception cref="IOException">Something stands there and may not be replaced, or the disk failed.</exception>
    /// <exception cref="UnauthorizedAccessException">The place may not be written.</exception>
    public static void Build(string folder, bool overwrite, Action<string> build)
    {
        ArgumentNullException.ThrowIfNull(build);
        var place = Path.TrimEndingDirectorySeparator(Path.GetFullPath(folder));
        CheckPlace(place, overwrite);
        var parent = Path.GetDirectoryName(place) ?? throw new IOException($"The report cannot be written to {folder}: it is the root of the file system.");
        Directory.CreateDirectory(parent);
        var unfinished = Path.Combine(parent, $".{Path.GetFileName(place)}.unfinished-{Environment.ProcessId}");
        RemoveTree(unfinished);
        try
        {
            Directory.CreateDirectory(unfinished);
            build(unfinished);
            Replace(place, unfinished);
        }
        catch
        {
            RemoveTree(unfinished);
            throw;
        }
    }

    /// <summary>Tells whether the folder may be written, before the work is done.</summary>
    /// <exception cref="IOException">Something stands there and may not be replaced.</exception>
    public static void CheckPlace(string folder, bool overwrite)
    {
        if (File.Exists(folder))
        {
            throw new IOException($"{folder} is a file. Choose another folder with --out.");
        }

        if (!Directory.Exists(folder) || !Directory.EnumerateFileSystemEntries(folder).Any())
        {
            return;
        }

        if (!overwrite)
        {
            throw new IOException($"{folder} exists. Give --force to replace it, or another folder with --out.");
        }

        // --force replaces a report, not a folder of something else.
        if (!HoldsReport(folder))
        {
            throw new IOException($"{folder} exists and holds no report (there is no results.json of this program in it), so --force does not replace it. Choose another folder with --out.");
        }
    }

    // Results begin with their format; another program's results.json does not.
    private static bool HoldsReport(string folder)
    {
        var results = Path.Combine(folder, "results.json");
        if (!File.Exists(results))
        {
            return false;
        }

        using var reader = new StreamReader(results);
        var head = new char[256];
        var read = reader.ReadBlock(head);
        return head.AsSpan(0, read).Contains(ResultsJsonWriter.Format, StringComparison.Ordinal);
    }

    private static void Replace(string place, string finished)
    {
        if (!Directory.Exists(place))
        {
            Directory.Move(finished, place);
            return;
        }

        // The old folder steps aside first and goes only when the new one stands.
        var old = $"{finished}-old";
        Directory.Move(place, old);
        try
        {
            Directory.Move(finished, place);
        }
        catch
        {
            Directory.Move(old, place);
            throw;
        }

        RemoveTree(old);
    }

    private static void RemoveTree(string folder)
    {
        if (Directory.Exists(folder))
        {
            Directory.Delete(folder, recursive: true);
        }
    }
}
