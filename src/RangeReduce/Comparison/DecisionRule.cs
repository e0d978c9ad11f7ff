using System.Globalization;

namespace RangeReduce.Comparison;

/// <summary>A rule that turns a value, its standard uncertainty and tolerance limits into a verdict (JCGM 106, ILAC-G8).</summary>
/// <param name="Name">Its name, to be printed beside every verdict.</param>
/// <param name="GuardFactor">Width of the guard band w in standard uncertainties, g in w = g u; 0 for simple acceptance.</param>
public sealed record DecisionRule(string Name, double GuardFactor)
{
    /// <summary>Simple acceptance: the value itself decides; up to 50 % risk at the limit (ILAC-G8:09/2019).</summary>
    public static readonly DecisionRule Simple = new("simple acceptance", 0.0);

    /// <summary>Guarded acceptance with w = U = 2 u: at most 2.3 % risk at a single limit (ILAC-G8:09/2019).</summary>
    public static readonly DecisionRule GuardedByExpanded = new("guarded acceptance, w = 2 u", 2.0);

    /// <summary>Guarded acceptance with w = 1.645 u: at most 5 % risk at a single limit.</summary>
    public static readonly DecisionRule GuardedAt95Percent = new("guarded acceptance, w = 1.645 u", 1.645);

    /// <summary>Gives guarded acceptance with another guard factor.</summary>
    /// <param name="guardFactor">Guard band in standard uncertainties, not negative.</param>
    public static DecisionRule Guarded(double guardFactor)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(guardFactor);
        return new(string.Create(CultureInfo.InvariantCulture, $"guarded acceptance, w = {guardFactor:0.###} u"), guardFactor);
    }

    /// <summary>Decides for a value with a normal distribution.</summary>
    /// <remarks>Met inside the limits narrowed by w, not met outside the limits widened by w, undecided between. Simple acceptance leaves nothing undecided.</remarks>
    /// <param name="value">The estimate.</param>
    /// <param name="standardUncertainty">Its standard uncertainty; NaN where it is not known.</param>
    /// <param name="low">Lower limit; negative infinity where there is none.</param>
    /// <param name="high">Upper limit; positive infinity where there is none.</param>
    /// <exception cref="ArgumentException">The limits are crossed.</exception>
    public Decision Decide(double value, double standardUncertainty, double low, double high)
    {
        if (!(low <= high))
        {
            throw new ArgumentException("The lower limit is above the upper one.", nameof(low));
        }

        var known = standardUncertainty >= 0.0;
        if (double.IsNaN(value) || (!known && GuardFactor != 0.0))
        {
            return new Decision(RequirementVerdict.Undecided, DecisionZone.Unknown, double.NaN, double.NaN, double.NaN)
            {
                Reason = double.IsNaN(value) ? "There is no value." : "The rule needs the uncertainty, which is not known.",
            };
        }

        var guard = GuardFactor == 0.0 ? 0.0 : GuardFactor * standardUncertainty;
        var verdict = value >= low + guard && value <= high - guard ? RequirementVerdict.Met
            : value < low - guard || value > high + guard ? RequirementVerdict.NotMet
            : RequirementVerdict.Undecided;
        var inside = value >= low && value <= high;
        var zone = verdict switch
        {
            RequirementVerdict.Met => DecisionZone.Pass,
            RequirementVerdict.NotMet => DecisionZone.Fail,
            _ => inside ? DecisionZone.ConditionalPass : DecisionZone.ConditionalFail,
        };
        var conformity = known ? ConformityProbability.OfNormal(value, standardUncertainty, low, high).Probability : double.NaN;
        return new Decision(verdict, zone, conformity, low + guard, high - guard);
    }
}
