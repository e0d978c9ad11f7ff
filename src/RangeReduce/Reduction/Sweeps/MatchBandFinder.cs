using RangeReduce.Numerics;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>Finds the match bands of a port, those that fit between two samples included.</summary>
public static class MatchBandFinder
{
    /// <summary>Finds all runs with |Γ| at most a limit, in rising order.</summary>
    /// <param name="curve">The reflection coefficient over frequency.</param>
    /// <param name="resonances">Its resonances: a dip between two samples above the limit shows only there.</param>
    /// <param name="limit">The limit on |Γ|.</param>
    public static IReadOnlyList<Band> Find(ReflectionCurve curve, IReadOnlyList<Resonance> resonances, double limit)
    {
        ArgumentNullException.ThrowIfNull(curve);
        ArgumentNullException.ThrowIfNull(resonances);
        var bands = BandFinder.AtMost(curve.FrequencyHz, curve.Magnitude, limit, curve.MagnitudeBetween);
        var hidden = resonances
            .Where(resonance => resonance.Reflection.Magnitude <= limit && !bands.Any(band => band.Contains(resonance.FrequencyHz)))
            .Select(Between);
        return [.. bands.Concat(hidden).OrderBy(band => band.Low)];

        Band Between(Resonance resonance)
        {
            var found = Array.BinarySearch(curve.FrequencyHz, resonance.FrequencyHz);
            var segment = found >= 0 ? found : ~found - 1;
            var low = Bisection.Root(Excess, curve.FrequencyHz[segment], resonance.FrequencyHz);
            var high = Bisection.Root(Excess, resonance.FrequencyHz, curve.FrequencyHz[segment + 1]);
            return new(low, high, OpenLow: false, OpenHigh: false, segment, segment + 1);

            double Excess(double hertz) => curve.MagnitudeBetween(segment, hertz) - limit;
        }
    }
}
