namespace RangeReduce.Patterns.Tables;

/// <summary>What stands over the samples: where they begin, how they are written, the headings and the metadata.</summary>
internal sealed record TableHead
{
    /// <summary>Gets how fields and decimals are written.</summary>
    public required Dialect Dialect { get; init; }

    /// <summary>Gets the headings as text; empty where the table has none.</summary>
    public required IReadOnlyList<string> Headings { get; init; }

    /// <summary>Gets the columns (in characters, from 1) that the headings stand in.</summary>
    public required IReadOnlyList<int> HeadingColumns { get; init; }

    /// <summary>Gets the line of the headings; 0 where there are none.</summary>
    public int HeadingLine { get; init; }

    /// <summary>Gets the headings as they stand in the file, to know a repeated heading by.</summary>
    public string HeadingText { get; init; } = string.Empty;

    /// <summary>Gets the number of fields of the first row of samples.</summary>
    public required int FieldCount { get; init; }

    /// <summary>Gets the line of the first row of samples.</summary>
    public required int DataLine { get; init; }

    /// <summary>Gets the offset of the first row of samples in the head.</summary>
    public required int DataStart { get; init; }

    /// <summary>Gets the metadata; keys in lower case.</summary>
    public required Dictionary<string, string> Metadata { get; init; }

    /// <summary>Gets the number of lines over the headings that say nothing in the form of a key and a value.</summary>
    public int TitleLines { get; init; }
}
