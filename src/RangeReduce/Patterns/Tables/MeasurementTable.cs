using RangeReduce.Diagnostics;
using RangeReduce.Networks;

namespace RangeReduce.Patterns.Tables;

/// <summary>What one text table holds: pattern cuts, a reflection sweep or the gain of a standard, and how its columns were understood.</summary>
public sealed record MeasurementTable
{
    /// <summary>Gets the cuts, by rising fixed angle; empty where the table is no pattern table.</summary>
    public IReadOnlyList<RawCut> Cuts { get; init; } = [];

    /// <summary>Gets the reflection sweep of one port; null where the table is none.</summary>
    public NetworkSweep? Sweep { get; init; }

    /// <summary>Gets the gain table; null where the table is none.</summary>
    public GainTable? Gain { get; init; }

    /// <summary>Gets what each column was taken for, in the order of the file.</summary>
    public required IReadOnlyList<ColumnMeaning> Columns { get; init; }

    /// <summary>Gets the <c>key: value</c> lines over the heading; keys are in lower case.</summary>
    public required IReadOnlyDictionary<string, string> Metadata { get; init; }

    /// <summary>Gets what is doubtful or worth knowing about the reading.</summary>
    public required IReadOnlyList<Remark> Remarks { get; init; }
}
