namespace RangeReduce.Comparison;

/// <summary>Where a value lies among the limits and their guard bands (the non-binary statement of ILAC-G8:09/2019).</summary>
public enum DecisionZone
{
    /// <summary>There is no value, or no uncertainty where the rule needs one.</summary>
    Unknown,

    /// <summary>Inside the limits by at least the guard band.</summary>
    Pass,

    /// <summary>Inside the limits, within the guard band.</summary>
    ConditionalPass,

    /// <summary>Outside the limits, within the guard band.</summary>
    ConditionalFail,

    /// <summary>Outside the limits by more than the guard band.</summary>
    Fail,
}
