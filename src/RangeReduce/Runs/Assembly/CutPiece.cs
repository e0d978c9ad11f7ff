using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Runs.Assembly;

/// <summary>One cut out of one file, already in components, before pieces are joined.</summary>
/// <param name="InputIds">Ids of the files it comes from, in order.</param>
/// <param name="Path">Path of the first of them.</param>
/// <param name="State">State; null for the gain standard.</param>
/// <param name="Source">Measured or simulated.</param>
/// <param name="Cut">The samples.</param>
internal sealed record CutPiece(IReadOnlyList<string> InputIds, string Path, string? State, DataSource Source, PatternCut Cut)
{
    /// <summary>Gets what pieces must have in common to be about the same thing.</summary>
    public (string? State, DataSource Source, CutAxis Axis, double FixedDeg, PolarizationBasis Basis, LevelReference Reference) Key =>
        (State, Source, Cut.Axis, Cut.FixedDeg, Cut.Basis, Cut.Reference);

    /// <summary>Says whether two pieces hold the same components, with or without phase alike.</summary>
    public bool HasSameComponents(CutPiece other) => Shape(Cut.First) == Shape(other.Cut.First) && Shape(Cut.Second) == Shape(other.Cut.Second);

    /// <summary>Says whether two pieces have a component in common.</summary>
    public bool SharesComponent(CutPiece other) => (Cut.First is not null && other.Cut.First is not null) || (Cut.Second is not null && other.Cut.Second is not null);

    /// <summary>Says whether two pieces have a frequency in common.</summary>
    public bool SharesFrequency(CutPiece other) => Cut.FrequencyHz.Intersect(other.Cut.FrequencyHz).Any();

    /// <summary>Says whether two pieces have the same angles.</summary>
    public bool HasSameAngles(CutPiece other) => Cut.AngleDeg.AsSpan().SequenceEqual(other.Cut.AngleDeg);

    /// <summary>Says whether two pieces have the same frequencies.</summary>
    public bool HasSameFrequencies(CutPiece other) => Cut.FrequencyHz.AsSpan().SequenceEqual(other.Cut.FrequencyHz);

    private static int Shape(PatternChannel? channel) => channel is null ? 0 : channel.HasPhase ? 2 : 1;
}
