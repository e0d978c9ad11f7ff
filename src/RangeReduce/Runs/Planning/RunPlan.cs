using RangeReduce.Diagnostics;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>What each file of a measurement folder is going to be read as, and why.</summary>
public sealed record RunPlan
{
    /// <summary>Gets the folder as the user named it.</summary>
    public required string Folder { get; init; }

    /// <summary>Gets the manifest; null where the folder has none.</summary>
    public RunManifest? Manifest { get; init; }

    /// <summary>Gets all files, in ordinal order of their paths. Tables count as cuts until they have been read.</summary>
    public required IReadOnlyList<PlannedFile> Files { get; init; }

    /// <summary>Gets the states, in the order of the manifest or else of the names.</summary>
    public required IReadOnlyList<ConfigurationState> States { get; init; }

    /// <summary>Gets the errors of files that could not even be looked at; they are among the remarks too.</summary>
    public IReadOnlyList<MeasurementDataException> Faults { get; init; } = [];

    /// <summary>Gets what was remarked while planning.</summary>
    public required IReadOnlyList<Remark> Remarks { get; init; }
}
