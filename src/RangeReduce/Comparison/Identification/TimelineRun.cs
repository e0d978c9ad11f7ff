namespace RangeReduce.Comparison.Identification;

/// <summary>A stretch of sweeps with one answer.</summary>
/// <param name="Answer">The kind of answer.</param>
/// <param name="State">The state; null where none is the answer.</param>
/// <param name="First">Index of the first sweep, from 0.</param>
/// <param name="Last">Index of the last sweep.</param>
public sealed record TimelineRun(IdentificationAnswer Answer, string? State, int First, int Last)
{
    /// <summary>Gets the number of sweeps.</summary>
    public int Count => Last - First + 1;
}
