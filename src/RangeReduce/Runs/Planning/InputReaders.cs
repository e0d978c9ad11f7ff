using RangeReduce.Diagnostics;
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

        var looksLikeTable = !DocumentEndings.Contains(ending, StringComparer.OrdinalIgnoreCase) && TableReader.LooksLikeTable(head);
        return looksLikeTable ? KindOfTable(path, head) : TableEndings.Contains(ending, StringComparer.OrdinalIgnoreCase) ? InputKind.Cut : InputKind.Other;
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

    // The headings tell; where they do not, the reading will say why, and until then a table counts as cuts.
    private static InputKind KindOfTable(string path, ReadOnlySpan<byte> head)
    {
        try
        {
            var remarks = new List<Remark>();
            var input = TableInput.Open(new MemoryStream(head.ToArray(), writable: false), path, remarks);
            if (TableHeadFinder.Find(input.Head, isWhole: true, new Dictionary<string, string>(StringComparer.Ordinal), out _) is not { } found)
            {
                return InputKind.Cut;
            }

            return TablePlanner.Plan(new(path, found, new(), remarks)).Content switch
            {
                TableContent.Sweep => InputKind.Sweep,
                TableContent.Gain => InputKind.GainTable,
                _ => InputKind.Cut,
            };
        }
        catch (MeasurementDataException)
        {
            return InputKind.Cut;
        }
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
