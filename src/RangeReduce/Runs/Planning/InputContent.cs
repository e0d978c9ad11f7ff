using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Patterns;

namespace RangeReduce.Runs.Planning;

/// <summary>What one data file held: a sweep, cuts, or a gain table.</summary>
internal sealed record InputContent
{
    /// <summary>Gets the sweep.</summary>
    public NetworkSweep? Sweep { get; init; }

    /// <summary>Gets the cuts.</summary>
    public IReadOnlyList<RawCut> Cuts { get; init; } = [];

    /// <summary>Gets frequencies in hertz and gains in dBi of a gain table.</summary>
    public (double[] FrequencyHz, double[] GainDbi)? GainTable { get; init; }

    /// <summary>Gets the columns as they were understood.</summary>
    public IReadOnlyList<ColumnDescription> Columns { get; init; } = [];

    /// <summary>Gets what the reader remarked.</summary>
    public IReadOnlyList<Remark> Remarks { get; init; } = [];

    /// <summary>Gets the kind that this content makes of a file.</summary>
    public InputKind Kind => Sweep is not null ? InputKind.Sweep : GainTable is not null ? InputKind.GainTable : InputKind.Cut;
}
