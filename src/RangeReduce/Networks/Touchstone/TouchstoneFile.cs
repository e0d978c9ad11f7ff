using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>What a Touchstone file held.</summary>
public sealed record TouchstoneFile
{
    /// <summary>Gets the scattering parameters, turned from whatever kind the file holds, row by row whatever its order.</summary>
    public required NetworkSweep Sweep { get; init; }

    /// <summary>Gets the noise parameters; empty where there are none.</summary>
    public IReadOnlyList<NoisePoint> Noise { get; init; } = [];

    /// <summary>Gets the comments without their mark, in order.</summary>
    public IReadOnlyList<string> Comments { get; init; } = [];

    /// <summary>Gets the version: <c>1.0</c>, <c>1.1</c> (several references on the option line), <c>2.0</c> or <c>2.1</c>.</summary>
    public string Version { get; init; } = "1.0";

    /// <summary>Gets the kind of parameters in the file.</summary>
    public ParameterKind Kind { get; init; }

    /// <summary>Gets the format of the pairs in the file.</summary>
    public ParameterFormat Format { get; init; }

    /// <summary>Gets what was remarked while reading.</summary>
    public IReadOnlyList<Remark> Remarks { get; init; } = [];
}
