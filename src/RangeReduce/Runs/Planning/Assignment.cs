using RangeReduce.Quantities;

namespace RangeReduce.Runs.Planning;

/// <summary>What a file was assigned to.</summary>
internal sealed record Assignment(InputKind Kind, string? State, DataSource? Source, string Reason)
{
    /// <summary>Reason of everything that the manifest decided.</summary>
    public const string ByManifest = "run.toml";

    /// <summary>Gets whether the file belongs to the gain standard.</summary>
    public bool IsOfGainStandard { get; init; }

    /// <summary>Gets whether the content is to decide between sweep and cut.</summary>
    public bool IsKindOpen { get; init; }

    /// <summary>Makes the assignment of a file that is not read.</summary>
    public static Assignment Other(string reason) => new(InputKind.Other, null, null, reason);
}
