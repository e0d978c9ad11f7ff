namespace RangeReduce.Runs.Description;

/// <summary>One file as it was understood.</summary>
/// <param name="Input">The file with its kind, state, source and the reason for them.</param>
/// <param name="Use">What became of it.</param>
public sealed record FileDescription(InputFile Input, FileUse Use)
{
    /// <summary>Gets the sweep; null where it holds none.</summary>
    public SweepDescription? Sweep { get; init; }

    /// <summary>Gets the cuts.</summary>
    public IReadOnlyList<CutDescription> Cuts { get; init; } = [];

    /// <summary>Gets the gain table; null where it holds none.</summary>
    public GainTableDescription? GainTable { get; init; }

    /// <summary>Gets the columns as understood, in order; empty for files that are no tables.</summary>
    public IReadOnlyList<ColumnDescription> Columns { get; init; } = [];
}
