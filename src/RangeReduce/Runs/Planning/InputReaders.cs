using RangeReduce.Networks.Touchstone;
using RangeReduce.Patterns.Tables;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>The readers of the house: Touchstone and tables.</summary>
internal sealed class InputReaders : IInputReaders
{
    /// <summary>All readers.</summary>
    public static readonly IInputReaders All = new InputReaders();

    // A file of these endings that is no table is an error worth saying; any other ending needs the look of one.
    private static readonly string[] TableEndings = [".csv", ".tsv"];

    // Numbers in rows are common in these too, but nobody writes measurements in them.
    private static readonly string[] DocumentEndings = [".md", ".toml", ".json", ".html", ".nec", ".log", ".py", ".cs"];

    /// <inheritdoc/>
    public InputKind Recognise(string path, ReadOnlySpan<byte> head)
    {
        var ending = Path.GetExtension(path);
        if (IsTouchstoneEnding(ending) || TouchstoneReader.LooksLikeTouchstone(head))
        {
            return InputKind.Sweep;
        }

        return TableEndings.Contains(ending, StringComparer.OrdinalIgnoreCase) || (!DocumentEndings.Contains(ending, StringComparer.OrdinalIgnoreCase) && TableReader.LooksLikeTable(head)) ? InputKind.Cut : InputKind.Other;
    }

    /// <inheritdoc/>
    public InputContent Read(string fullPath, string displayPath, IReadOnlyList<ManifestColumn> columns)
    {
        if (IsTouchstoneEnding(Path.GetExtension(displayPath)) || LooksLikeTouchstone(fullPath))
        {
            var file = TouchstoneReader.Read(fullPath, displayPath);
            return new() { Sweep = file.Sweep, Remarks = file.Remarks };
        }

        var meanings = columns.GroupBy(column => column.Heading, StringComparer.OrdinalIgnoreCase).ToDictionary(group => group.Key, group => group.First().Meaning, StringComparer.OrdinalIgnoreCase);
        var table = TableReader.Read(fullPath, displayPath, new() { Columns = meanings });
        return new()
        {
            Sweep = table.Sweep,
            Cuts = table.Cuts,
            GainTable = table.Gain is { } gain ? (gain.FrequencyHz, gain.GainDbi) : null,
            Columns = [.. table.Columns.Select(column => new ColumnDescription(column.Heading, column.Unit.Length == 0 ? column.Meaning : $"{column.Meaning} ({column.Unit})"))],
            Remarks = table.Remarks,
        };
    }

    private static bool IsTouchstoneEnding(string ending) =>
        ending.Equals(".ts", StringComparison.OrdinalIgnoreCase)
        || (ending.Length > 3 && ending[1] is 's' or 'S' && ending[^1] is 'p' or 'P' && ending[2..^1].All(char.IsAsciiDigit));

    private static bool LooksLikeTouchstone(string fullPath)
    {
        Span<byte> head = stackalloc byte[4096];
        using var stream = new FileStream(fullPath, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 0);
        return TouchstoneReader.LooksLikeTouchstone(head[..stream.ReadAtLeast(head, head.Length, throwOnEndOfStream: false)]);
    }
}
