using RangeReduce.Quantities;

namespace RangeReduce.Uncertainties;

/// <summary>Says which terms matter for which quantity, and so whether a budget is full, partial or absent.</summary>
public static class BudgetRules
{
    private static readonly string[] LevelTerms =
    [
        ErrorTerms.GainStandardKey, ErrorTerms.LinearityKey, ErrorTerms.MismatchKey, ErrorTerms.ReflectivityKey, ErrorTerms.NoiseFloorKey,
        ErrorTerms.DriftKey, ErrorTerms.AlignmentKey, ErrorTerms.DistanceKey, ErrorTerms.RepeatabilityKey,
    ];

    private static readonly string[] EllipseTerms =
    [
        ErrorTerms.BalanceKey, ErrorTerms.BalancePhaseKey, ErrorTerms.CrossPolarKey, ErrorTerms.ReflectivityKey, ErrorTerms.NoiseFloorKey, ErrorTerms.AlignmentKey,
    ];

    private static readonly string[] ShapeTerms = [ErrorTerms.ReflectivityKey, ErrorTerms.NoiseFloorKey, ErrorTerms.DriftKey];

    private static readonly string[] DirectionTerms = [.. ShapeTerms, ErrorTerms.AlignmentKey];

    private static readonly string[] SweepTerms = [ErrorTerms.DirectivityKey];

    /// <summary>Gives the keys of the terms that matter for a quantity; none where no budget is made for it.</summary>
    public static IReadOnlyList<string> TermsOf(Quantity quantity)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        return quantity.Id switch
        {
            "gain" or "level" => LevelTerms,
            "axial-ratio" or "cross-polar-ratio" or "tilt-angle" or "axial-ratio-beamwidth" => EllipseTerms,
            "half-power-beamwidth" or "sidelobe-level" or "front-to-back-ratio" => ShapeTerms,
            "peak-direction" => DirectionTerms,
            "return-loss" or "vswr" or "mismatch-loss" or "resonance-frequency" or "input-resistance" or "input-reactance" or "match-band" or "match-band-fraction" => SweepTerms,
            _ => [],
        };
    }

    /// <summary>Tells how complete the budget of a quantity is, given the terms that were stated.</summary>
    public static BudgetState StateOf(Quantity quantity, IReadOnlySet<string> given)
    {
        ArgumentNullException.ThrowIfNull(given);
        var terms = TermsOf(quantity);
        var known = terms.Count(given.Contains);
        return known == 0 ? BudgetState.Absent : known == terms.Count ? BudgetState.Full : BudgetState.Partial;
    }
}
