namespace RangeReduce.Comparison.Identification;

/// <summary>How sweeps are identified.</summary>
public sealed record IdentificationOptions
{
    /// <summary>Gets what the cable may change in phase.</summary>
    public CablePhase CablePhase { get; init; }

    /// <summary>Gets the largest delay of the cable, there and back, in seconds, either way; less where the frequency step resolves less (1/16 of its reciprocal).</summary>
    public double LargestDelaySeconds { get; init; } = 10e-9;

    /// <summary>Gets the probability with which a sweep of a known state may be called unknown.</summary>
    public double FalseAlarmRate { get; init; } = 0.001;

    /// <summary>Gets the probability, among the known states and equal beforehand, that the likeliest state must reach to be the answer.</summary>
    public double LeastProbability { get; init; } = 0.99;

    /// <summary>Gets the standard deviation of the noise in the real and in the imaginary part of the reflection coefficient; null to estimate it from repeats.</summary>
    public double? NoiseStandardDeviation { get; init; }

    /// <summary>Gets the least share of the band of the signatures that a sweep must cover.</summary>
    public double LeastCover { get; init; } = 0.7;
}
