using System.Numerics;
using RangeReduce.Networks;
using RangeReduce.Numerics;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>Finds the resonances of a port: the dips of |Γ| that stand out.</summary>
public static class ResonanceFinder
{
    /// <summary>A dip counts when the return loss falls by at least this much in dB on both sides of it; less is ripple of the calibration (common practice).</summary>
    public const double LeastRiseDb = 1.0;

    /// <summary>A dip counts when its return loss reaches at least this much in dB: half the power goes in.</summary>
    public const double LeastReturnLossDb = 3.0;

    /// <summary>Finds the resonances, the deepest first. A dip at the very end of the sweep is none: its minimum was not seen.</summary>
    public static IReadOnlyList<Resonance> Find(ReflectionCurve curve)
    {
        ArgumentNullException.ThrowIfNull(curve);
        var frequency = curve.FrequencyHz;
        var loss = Array.ConvertAll(curve.Magnitude, magnitude => Math.Min(Reflection.ReturnLossDb(magnitude), 400.0));
        var found = new List<Resonance>();
        for (var i = 1; i + 1 < loss.Length; i++)
        {
            if (loss[i] < LeastReturnLossDb || loss[i] < loss[i - 1] || loss[i] <= loss[i + 1])
            {
                continue;
            }

            var rise = Math.Min(loss[i] - LowestTowards(loss, i, -1), loss[i] - LowestTowards(loss, i, +1));
            if (rise >= LeastRiseDb)
            {
                var (hertz, reflection) = Refine(curve, i);
                found.Add(new(hertz, reflection, rise));
            }
        }

        return [.. found.OrderBy(resonance => resonance.Reflection.Magnitude).ThenBy(resonance => resonance.FrequencyHz)];

        (double, Complex) Refine(ReflectionCurve of, int at)
        {
            // The dip lies in one of the two segments beside the lowest sample: take the deeper of the two minima.
            var left = Bisection.Minimum(hertz => of.MagnitudeBetween(at - 1, hertz), frequency[at - 1], frequency[at]);
            var right = Bisection.Minimum(hertz => of.MagnitudeBetween(at, hertz), frequency[at], frequency[at + 1]);
            // The search never meets the ends of its bracket, so a minimum that falls on the sample (a perfect match, say) is held against both.
            ReadOnlySpan<(double Hertz, Complex Reflection)> candidates = [(frequency[at], of[at]), (left, of.Between(at - 1, left)), (right, of.Between(at, right))];
            var best = candidates[0];
            foreach (var candidate in candidates)
            {
                best = candidate.Reflection.Magnitude < best.Reflection.Magnitude ? candidate : best;
            }

            return best;
        }
    }

    private static double LowestTowards(double[] loss, int from, int step)
    {
        var lowest = loss[from];
        for (var i = from + step; i >= 0 && i < loss.Length && loss[i] <= loss[from]; i += step)
        {
            lowest = Math.Min(lowest, loss[i]);
        }

        return lowest;
    }
}
