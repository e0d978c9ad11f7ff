using RangeReduce.Quantities;
using RangeReduce.Uncertainties;

namespace RangeReduce.Comparison;

/// <summary>Uncertainty of the difference of two levels of the same run: what both share in full cancels, the rest adds in squares (JCGM 100, 5.1 and 5.2).</summary>
internal static class DifferenceUncertainty
{
    /// <summary>Terms that move all levels of a run alike and so cancel in a difference.</summary>
    public static readonly IReadOnlyList<string> Shared = [ErrorTerms.GainStandardKey, ErrorTerms.DistanceKey];

    /// <summary>Gives the expanded uncertainty (k = 2) of the difference of two figures.</summary>
    public static Uncertainty OfSameRun(Figure one, Figure other)
    {
        var shares = one.Uncertainty.Shares.Concat(other.Uncertainty.Shares)
            .Where(share => !Shared.Contains(share.Term, StringComparer.Ordinal))
            .GroupBy(share => share.Term, StringComparer.Ordinal)
            .Select(group => new UncertaintyShare(group.Key, Math.Sqrt(group.Sum(share => share.Contribution * share.Contribution))))
            .ToArray();
        if (shares.Length == 0)
        {
            return Uncertainty.None;
        }

        var standard = Math.Sqrt(shares.Sum(share => share.Contribution * share.Contribution));
        var budget = one.Uncertainty.Budget < other.Uncertainty.Budget ? one.Uncertainty.Budget : other.Uncertainty.Budget;
        return new(2.0 * standard, 2.0, budget) { Standard = standard, Shares = shares };
    }
}
