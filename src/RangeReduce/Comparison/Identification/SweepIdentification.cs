namespace RangeReduce.Comparison.Identification;

/// <summary>The answer for one sweep.</summary>
public sealed record SweepIdentification
{
    /// <summary>Gets the kind of answer.</summary>
    public required IdentificationAnswer Answer { get; init; }

    /// <summary>Gets the state, where one is the answer; null otherwise.</summary>
    public string? State => Answer == IdentificationAnswer.State ? Nearest : null;

    /// <summary>Gets the likeliest state, the answer or not; null for a refused sweep.</summary>
    public string? Nearest { get; init; }

    /// <summary>Gets the second likeliest state; null where there is one state only.</summary>
    public string? RunnerUp { get; init; }

    /// <summary>Gets the probability that a sweep of the likeliest state lies as far from its signature as this one; unknown is below the false-alarm rate.</summary>
    public double FitProbability { get; init; } = double.NaN;

    /// <summary>Gets the probability of the likeliest state among the known ones, equal beforehand; it says nothing where none of them fits.</summary>
    public double StateProbability { get; init; } = double.NaN;

    /// <summary>Gets the log-likelihood of the likeliest state less that of the second (natural logarithm); positive infinity where there is one state only.</summary>
    public double LogLikelihoodRatio { get; init; } = double.NaN;

    /// <summary>Gets the root mean square distance from the signature of the likeliest state, as a reflection coefficient; noise alone gives sqrt 2 of its standard deviation with phase.</summary>
    public double RmsDistance { get; init; } = double.NaN;

    /// <summary>Gets the cable delay that was found against the likeliest state, there and back, in seconds; 0 where it was not free.</summary>
    public double DelaySeconds { get; init; }

    /// <summary>Gets whether the comparison was of magnitudes only.</summary>
    public bool MagnitudeOnly { get; init; }

    /// <summary>Gets whether the signatures were interpolated to the frequencies of the sweep.</summary>
    public bool Resampled { get; init; }

    /// <summary>Gets the number of frequency points that were compared.</summary>
    public int Count { get; init; }

    /// <summary>Gets why the sweep was refused; empty where it was not.</summary>
    public string Reason { get; init; } = string.Empty;
}
