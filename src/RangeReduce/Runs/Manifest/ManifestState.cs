using RangeReduce.Quantities;

namespace RangeReduce.Runs.Manifest;

/// <summary>One <c>[[state]]</c> table.</summary>
public sealed record ManifestState
{
    /// <summary>Gets the name.</summary>
    public required string Name { get; init; }

    /// <summary>Gets the hand that the state is meant to have.</summary>
    public Hand? IntendedHand { get; init; }

    /// <summary>Gets the hand that the state is known to have beyond doubt.</summary>
    public Hand? KnownHand { get; init; }

    /// <summary>Gets the patterns of the measured sweeps.</summary>
    public IReadOnlyList<GlobPattern> Sweeps { get; init; } = [];

    /// <summary>Gets the patterns of the measured cuts.</summary>
    public IReadOnlyList<GlobPattern> Cuts { get; init; } = [];

    /// <summary>Gets the patterns of the simulated sweeps.</summary>
    public IReadOnlyList<GlobPattern> SimulatedSweeps { get; init; } = [];

    /// <summary>Gets the patterns of the simulated cuts.</summary>
    public IReadOnlyList<GlobPattern> SimulatedCuts { get; init; } = [];

    /// <summary>Gets the line of the table in the manifest.</summary>
    public int Line { get; init; }
}
