using RangeReduce.Uncertainties;

namespace RangeReduce;

/// <summary>What a user may choose about the reduction.</summary>
public sealed record ReductionOptions
{
    /// <summary>Gets the number of Monte Carlo trials; the default is <see cref="UncertaintyEvaluator.UsualTrials"/>, at least 100.</summary>
    public int Trials { get; init; } = UncertaintyEvaluator.UsualTrials;
}
