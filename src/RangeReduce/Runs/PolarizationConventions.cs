namespace RangeReduce.Runs;

/// <summary>The conventions that decide handedness, and where each was taken from.</summary>
public sealed record PolarizationConventions
{
    /// <summary>Gets the time factor of the phases in the files.</summary>
    public TimeFactor Time { get; init; }

    /// <summary>Gets where the time factor was taken from: <c>run.toml</c> or <c>assumed</c>.</summary>
    public string TimeFrom { get; init; } = "assumed";

    /// <summary>Gets the recorded channel that is the theta component, with a leading minus where its sign is turned.</summary>
    public string ThetaPort { get; init; } = "H";

    /// <summary>Gets the recorded channel that is the phi component, with a leading minus where its sign is turned.</summary>
    public string PhiPort { get; init; } = "V";

    /// <summary>Gets where the ports were taken from: <c>run.toml</c>, <c>headings</c> or <c>assumed</c>.</summary>
    public string PortsFrom { get; init; } = "assumed";
}
