namespace RangeReduce.Runs.Manifest;

/// <summary>The manifest run.toml as typed data. What it does not say is null or empty; no default is filled in here.</summary>
public sealed record RunManifest
{
    /// <summary>Gets the path as shown in messages.</summary>
    public required string Path { get; init; }

    /// <summary>Gets the name of the run.</summary>
    public string? Name { get; init; }

    /// <summary>Gets the date as YYYY-MM-DD.</summary>
    public string? Date { get; init; }

    /// <summary>Gets who took the data.</summary>
    public string? Operator { get; init; }

    /// <summary>Gets the chamber or range.</summary>
    public string? Chamber { get; init; }

    /// <summary>Gets free notes.</summary>
    public string? Notes { get; init; }

    /// <summary>Gets the antenna under test.</summary>
    public string? Antenna { get; init; }

    /// <summary>Gets its serial number.</summary>
    public string? Serial { get; init; }

    /// <summary>Gets words to find the run by.</summary>
    public IReadOnlyList<string> Tags { get; init; } = [];

    /// <summary>Gets the time factor of the phases in the files.</summary>
    public TimeFactor? Time { get; init; }

    /// <summary>Gets the probe; null where the manifest has no such table.</summary>
    public ManifestProbe? Probe { get; init; }

    /// <summary>Gets the angle along the cuts, in degrees, at which the antenna points.</summary>
    public double? AxisDeg { get; init; }

    /// <summary>Gets the largest dimension of the antenna in metres.</summary>
    public double? LargestDimensionM { get; init; }

    /// <summary>Gets the distance between the antennas in metres.</summary>
    public double? RangeLengthM { get; init; }

    /// <summary>Gets the states, in order.</summary>
    public IReadOnlyList<ManifestState> States { get; init; } = [];

    /// <summary>Gets the gain standard.</summary>
    public ManifestGainStandard? GainStandard { get; init; }

    /// <summary>Gets the terms of the uncertainty budget, in order.</summary>
    public IReadOnlyList<UncertaintyTerm> UncertaintyTerms { get; init; } = [];

    /// <summary>Gets the statements for the report head by key, in order of the keys.</summary>
    public IReadOnlyDictionary<string, string> ReportFields { get; init; } = new SortedDictionary<string, string>(StringComparer.Ordinal);

    /// <summary>Gets what the headings of data tables mean.</summary>
    public IReadOnlyList<ManifestColumn> Columns { get; init; } = [];

    /// <summary>Gets the requirements, in order.</summary>
    public IReadOnlyList<Requirement> Requirements { get; init; } = [];
}
