using System.Numerics;
using MathNet.Numerics;
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

    // Fewer samples leave a parabola nothing to average; more lie outside what a parabola can follow.
    private const int LeastFitted = 5;
    private const int MostFitted = 15;

    /// <summary>Finds the resonances, the deepest first. A dip at the very end of the sweep is none: its minimum was not seen.</summary>
    public static IReadOnlyList<Resonance> Find(ReflectionCurve curve)
    {
        ArgumentNullException.ThrowIfNull(curve);
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
    }

    /// <summary>Finds the minimum of |Γ| about the lowest sample: by a least-squares fit where the dip is wide, by the local cubic where it is sharp.</summary>
    /// <remarks>
    /// A wide dip has many samples near its bottom, and the lowest one is a matter of noise: a parabola for real and imaginary part through all samples
    /// within 3 dB of the bottom uses them all. A sharp dip has few, but no noise to speak of on its flanks.
    /// </remarks>
    private static (double FrequencyHz, Complex Reflection) Refine(ReflectionCurve curve, int at)
    {
        var (first, last) = (at, at);
        var bound = curve.Magnitude[at] * Math.Sqrt(2.0);
        while (first > 0 && at - first < MostFitted && curve.Magnitude[first - 1] <= bound)
        {
            first--;
        }

        while (last + 1 < curve.Magnitude.Length && last - at < MostFitted && curve.Magnitude[last + 1] <= bound)
        {
            last++;
        }

        return curve.HasPhase && last - first + 1 >= LeastFitted ? Fitted(curve, first, last) : Interpolated(curve, at);
    }

    private static (double FrequencyHz, Complex Reflection) Fitted(ReflectionCurve curve, int first, int last)
    {
        // Frequencies run from −1 to 1 over the window: powers of hertz would lose the digits.
        var (middle, half) = (0.5 * (curve.FrequencyHz[first] + curve.FrequencyHz[last]), 0.5 * (curve.FrequencyHz[last] - curve.FrequencyHz[first]));
        var x = Array.ConvertAll(curve.FrequencyHz[first..(last + 1)], hertz => (hertz - middle) / half);
        var (re, im) = (Fit.Polynomial(x, curve.Re[first..(last + 1)], 2), Fit.Polynomial(x, curve.Im[first..(last + 1)], 2));
        var best = Bisection.Minimum(t => At(t).Magnitude, -1.0, 1.0);
        return (middle + (best * half), At(best));

        Complex At(double t) => new(re[0] + (t * (re[1] + (t * re[2]))), im[0] + (t * (im[1] + (t * im[2]))));
    }

    private static (double FrequencyHz, Complex Reflection) Interpolated(ReflectionCurve curve, int at)
    {
        // The dip lies in one of the two segments beside the lowest sample: take the deeper of the two minima.
        var frequency = curve.FrequencyHz;
        var left = Bisection.Minimum(hertz => curve.MagnitudeBetween(at - 1, hertz), frequency[at - 1], frequency[at]);
        var right = Bisection.Minimum(hertz => curve.MagnitudeBetween(at, hertz), frequency[at], frequency[at + 1]);

        // The search never meets the ends of its bracket, so a minimum that falls on the sample (a perfect match, say) is held against both.
        ReadOnlySpan<(double Hertz, Complex Reflection)> candidates = [(frequency[at], curve[at]), (left, curve.Between(at - 1, left)), (right, curve.Between(at, right))];
        var best = candidates[0];
        foreach (var candidate in candidates)
        {
            best = candidate.Reflection.Magnitude < best.Reflection.Magnitude ? candidate : best;
        }

        return best;
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
