namespace RangeReduce.Comparison;

/// <summary>The probability that a quantity lies inside its limits, given its measurement (JCGM 106).</summary>
/// <param name="Probability">The conformance probability, 0 to 1.</param>
/// <param name="StandardError">Standard error of the probability; 0 where it was computed from a distribution, not from draws.</param>
public sealed record Conformity(double Probability, double StandardError = 0.0)
{
    /// <summary>Gets the bound to quote in place of a probability of 0 or 1 that came from draws: 3/M for M draws (95 %); null otherwise.</summary>
    /// <remarks>With no draw inside, the probability is below the bound; with none outside, one minus the probability is.</remarks>
    public double? Bound { get; init; }
}
