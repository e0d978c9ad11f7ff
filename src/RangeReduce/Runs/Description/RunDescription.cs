using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Description;

/// <summary>What was found in a measurement folder and how it was understood, as plain data.</summary>
public sealed record RunDescription
{
    /// <summary>Gets what is known about the run as a whole.</summary>
    public required RunInformation Information { get; init; }

    /// <summary>Gets whether the folder has a manifest.</summary>
    public bool HasManifest { get; init; }

    /// <summary>Gets every file, in the order of the paths.</summary>
    public IReadOnlyList<FileDescription> Files { get; init; } = [];

    /// <summary>Gets the states.</summary>
    public IReadOnlyList<StateDescription> States { get; init; } = [];

    /// <summary>Gets the conventions in use and where each came from.</summary>
    public IReadOnlyList<ConventionDescription> Conventions { get; init; } = [];

    /// <summary>Gets the requirements.</summary>
    public IReadOnlyList<Requirement> Requirements { get; init; } = [];

    /// <summary>Gets what is not there and what therefore cannot be determined, one sentence each.</summary>
    public IReadOnlyList<string> Missing { get; init; } = [];

    /// <summary>Gets the remarks, faults first, otherwise in order.</summary>
    public IReadOnlyList<Remark> Remarks { get; init; } = [];

    /// <summary>Gets the text of a run.toml that says what was understood.</summary>
    public string ManifestDraft { get; init; } = string.Empty;
}
