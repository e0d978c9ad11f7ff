namespace RangeReduce.Comparison;

/// <summary>The verdict on a requirement.</summary>
public enum RequirementVerdict
{
    /// <summary>The requirement is met.</summary>
    Met,

    /// <summary>The requirement is not met.</summary>
    NotMet,

    /// <summary>The data do not decide.</summary>
    Undecided,
}
