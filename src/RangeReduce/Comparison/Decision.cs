namespace RangeReduce.Comparison;

/// <summary>What a decision rule says of a value.</summary>
/// <param name="Verdict">The verdict.</param>
/// <param name="Zone">Where the value lies among the limits and their guard bands.</param>
/// <param name="ConformityProbability">Probability that the quantity lies inside the limits (JCGM 106); NaN where the uncertainty is not known.</param>
/// <param name="AcceptanceLow">Lower acceptance limit: the lower limit plus the guard band; NaN where there was no decision.</param>
/// <param name="AcceptanceHigh">Upper acceptance limit; where it is under the lower one the guard bands leave no room to accept.</param>
public sealed record Decision(RequirementVerdict Verdict, DecisionZone Zone, double ConformityProbability, double AcceptanceLow, double AcceptanceHigh)
{
    /// <summary>Gets why there was no decision; empty where there was one.</summary>
    public string Reason { get; init; } = string.Empty;

    /// <summary>Gets the probability that the verdict is wrong (specific risk, JCGM 106); NaN for an undecided verdict or an unknown uncertainty.</summary>
    public double Risk => Verdict switch
    {
        RequirementVerdict.Met => 1.0 - ConformityProbability,
        RequirementVerdict.NotMet => ConformityProbability,
        _ => double.NaN,
    };
}
