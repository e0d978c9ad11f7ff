namespace RangeReduce.Patterns.Tables;

/// <summary>How a table is to be read: which column is what.</summary>
internal sealed record TablePlan
{
    /// <summary>Gets what the table holds.</summary>
    public required TableContent Content { get; init; }

    /// <summary>Gets the three keys by slot.</summary>
    public required TableKey[] Keys { get; init; }

    /// <summary>Gets the columns of samples.</summary>
    public required IReadOnlyList<ValueColumn> Values { get; init; }

    /// <summary>Gets the headings of all columns.</summary>
    public required IReadOnlyList<Heading> Headings { get; init; }

    /// <summary>Gets the meanings of all columns.</summary>
    public required IReadOnlyList<ColumnMeaning> Meanings { get; init; }

    /// <summary>Gets what 0 dB means.</summary>
    public LevelReference Reference { get; init; }
}
