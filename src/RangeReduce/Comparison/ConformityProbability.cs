using MathNet.Numerics.Distributions;

namespace RangeReduce.Comparison;

/// <summary>Probability of conformity with tolerance limits (JCGM 106).</summary>
/// <remarks>A limit that does not exist is infinite. Any unit serves as long as all arguments have it.</remarks>
public static class ConformityProbability
{
    /// <summary>Gives the probability for a normal distribution: Phi((high - y)/u) - Phi((low - y)/u).</summary>
    /// <param name="value">The estimate y.</param>
    /// <param name="standardUncertainty">Its standard uncertainty u, not negative; with 0 the answer is 0 or 1.</param>
    /// <param name="low">Lower limit; negative infinity where there is none.</param>
    /// <param name="high">Upper limit; positive infinity where there is none.</param>
    /// <exception cref="ArgumentOutOfRangeException">The uncertainty is negative or not a number.</exception>
    /// <exception cref="ArgumentException">The limits are crossed, or the value is not a number.</exception>
    public static Conformity OfNormal(double value, double standardUncertainty, double low, double high)
    {
        Check(low, high);
        if (double.IsNaN(value))
        {
            throw new ArgumentException("The value is not a number.", nameof(value));
        }

        if (!(standardUncertainty >= 0.0))
        {
            throw new ArgumentOutOfRangeException(nameof(standardUncertainty), standardUncertainty, "A standard uncertainty is not negative.");
        }

        if (standardUncertainty == 0.0)
        {
            return new Conformity(value >= low && value <= high ? 1.0 : 0.0);
        }

        // Both tails are taken on the side where they are small, so that a tiny probability keeps its digits.
        var (a, b) = ((low - value) / standardUncertainty, (high - value) / standardUncertainty);
        return new Conformity(a > 0.0 ? Normal.CDF(0.0, 1.0, -a) - Normal.CDF(0.0, 1.0, -b) : Normal.CDF(0.0, 1.0, b) - Normal.CDF(0.0, 1.0, a));
    }

    /// <summary>Gives the share of draws of the quantity that lie inside the limits.</summary>
    /// <param name="draws">Draws of the quantity, such as those of a Monte Carlo run (JCGM 101); at least one.</param>
    /// <param name="low">Lower limit; negative infinity where there is none.</param>
    /// <param name="high">Upper limit; positive infinity where there is none.</param>
    /// <exception cref="ArgumentException">There is no draw, one is not a number, or the limits are crossed.</exception>
    public static Conformity OfDraws(ReadOnlySpan<double> draws, double low, double high)
    {
        Check(low, high);
        if (draws.Length == 0)
        {
            throw new ArgumentException("There is no draw.", nameof(draws));
        }

        var inside = 0;
        foreach (var draw in draws)
        {
            if (double.IsNaN(draw))
            {
                throw new ArgumentException("A draw is not a number.", nameof(draws));
            }

            inside += draw >= low && draw <= high ? 1 : 0;
        }

        var share = (double)inside / draws.Length;
        return new Conformity(share, Math.Sqrt(share * (1.0 - share) / draws.Length))
        {
            Bound = inside == 0 || inside == draws.Length ? Math.Min(1.0, 3.0 / draws.Length) : null,
        };
    }

    /// <summary>Gives the probability that several requirements are met together, from joint draws, so that their correlation counts.</summary>
    /// <param name="draws">One array of draws a requirement, all of one length; draws of one index belong together.</param>
    /// <param name="limits">The limits, one pair a requirement; infinite where there is none.</param>
    /// <exception cref="ArgumentException">The numbers of arrays, limits or draws do not fit, or limits are crossed.</exception>
    public static Conformity OfJointDraws(IReadOnlyList<double[]> draws, IReadOnlyList<(double Low, double High)> limits)
    {
        ArgumentNullException.ThrowIfNull(draws);
        ArgumentNullException.ThrowIfNull(limits);
        if (draws.Count == 0 || draws.Count != limits.Count || draws.Any(one => one.Length != draws[0].Length))
        {
            throw new ArgumentException("Each requirement needs its draws, as many as the others.", nameof(draws));
        }

        foreach (var (low, high) in limits)
        {
            Check(low, high);
        }

        var all = new double[draws[0].Length];
        for (var m = 0; m < all.Length; m++)
        {
            var met = true;
            for (var r = 0; r < draws.Count && met; r++)
            {
                met = draws[r][m] >= limits[r].Low && draws[r][m] <= limits[r].High;
            }

            all[m] = met ? 1.0 : 0.0;
        }

        return OfDraws(all, 0.5, 1.5);
    }

    /// <summary>Gives the measurement capability index (high - low) / (4 u) of two limits; infinite where one of them does not exist.</summary>
    /// <param name="standardUncertainty">The standard uncertainty u.</param>
    /// <param name="low">Lower limit.</param>
    /// <param name="high">Upper limit.</param>
    public static double CapabilityIndex(double standardUncertainty, double low, double high) => (high - low) / (4.0 * standardUncertainty);

    private static void Check(double low, double high)
    {
        if (!(low <= high))
        {
            throw new ArgumentException("The lower limit is above the upper one.", nameof(low));
        }
    }
}
