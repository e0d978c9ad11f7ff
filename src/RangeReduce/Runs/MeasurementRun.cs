using RangeReduce.Diagnostics;

namespace RangeReduce.Runs;

/// <summary>A measurement folder read into memory. Immutable: a correction returns a new run.</summary>
public sealed record MeasurementRun
{
    /// <summary>Gets what is known about the run as a whole.</summary>
    public required RunInformation Information { get; init; }

    /// <summary>Gets the conventions that decide handedness.</summary>
    public PolarizationConventions Conventions { get; init; } = new();

    /// <summary>Gets every file of the folder, read or not, in the order of the paths.</summary>
    public IReadOnlyList<InputFile> Inputs { get; init; } = [];

    /// <summary>Gets the configuration states, in the order of the manifest or else of the names.</summary>
    public IReadOnlyList<ConfigurationState> States { get; init; } = [];

    /// <summary>Gets the sweeps, ordered by state, source and path.</summary>
    public IReadOnlyList<StateSweep> Sweeps { get; init; } = [];

    /// <summary>Gets the cuts, ordered by state, source, path and fixed angle.</summary>
    public IReadOnlyList<StateCut> Cuts { get; init; } = [];

    /// <summary>Gets sweeps that repeat one of <see cref="Sweeps"/>: kept for repeatability, not used for figures.</summary>
    public IReadOnlyList<StateSweep> RepeatedSweeps { get; init; } = [];

    /// <summary>Gets cuts that repeat one of <see cref="Cuts"/>: kept for repeatability, not used for figures.</summary>
    public IReadOnlyList<StateCut> RepeatedCuts { get; init; } = [];

    /// <summary>Gets the gain standard; null where there is none.</summary>
    public GainStandard? GainStandard { get; init; }

    /// <summary>Gets the angle along the cuts, in degrees, at which the antenna points.</summary>
    public double AxisDeg { get; init; }

    /// <summary>Gets the distance between the antennas in metres; null where not stated.</summary>
    public double? RangeLengthM { get; init; }

    /// <summary>Gets the largest dimension of the antenna in metres; null where not stated.</summary>
    public double? LargestDimensionM { get; init; }

    /// <summary>Gets the terms of the uncertainty budget that the manifest states.</summary>
    public IReadOnlyList<UncertaintyTerm> UncertaintyTerms { get; init; } = [];

    /// <summary>Gets the requirements.</summary>
    public IReadOnlyList<Requirement> Requirements { get; init; } = [];

    /// <summary>Gets the corrections that were applied, in order.</summary>
    public IReadOnlyList<AppliedCorrection> Corrections { get; init; } = [];

    /// <summary>Gets what was remarked while reading and correcting.</summary>
    public IReadOnlyList<Remark> Remarks { get; init; } = [];
}
