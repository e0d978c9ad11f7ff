using MathNet.Numerics.Distributions;

namespace RangeReduce.Comparison.Identification;

/// <summary>Finds how well the states of an identifier can be told apart, and in which band best.</summary>
public static class SeparationSearch
{
    private const int LeastCount = 8;
    private const int MostWindows = 200;

    /// <summary>Gives the separation of each pair of states over the whole band of the signatures, the nearest pair first.</summary>
    /// <param name="identifier">The identifier.</param>
    /// <param name="magnitudeOnly">Whether sweeps without phase are meant.</param>
    /// <returns>One entry a pair; none where there is one state or no common band of at least 8 points.</returns>
    public static IReadOnlyList<StateSeparation> Pairs(SweepIdentifier identifier, bool magnitudeOnly = false)
    {
        ArgumentNullException.ThrowIfNull(identifier);
        var common = CommonSignatures.Of(identifier, magnitudeOnly);
        return common.FrequencyHz.Length < LeastCount ? [] : [.. PairsWithin(common, 0, common.FrequencyHz.Length).OrderBy(pair => pair.Distance)];
    }

    /// <summary>Finds the band of a given width in which the pair of states that is hardest to tell apart is told apart best.</summary>
    /// <param name="identifier">The identifier.</param>
    /// <param name="widthHz">Width of the band in hertz.</param>
    /// <param name="magnitudeOnly">Whether sweeps without phase are meant.</param>
    /// <returns>The hardest pair in the best band; null where there is one state, or the width holds fewer than 8 points or is wider than the signatures.</returns>
    public static StateSeparation? BestBand(SweepIdentifier identifier, double widthHz, bool magnitudeOnly = false)
    {
        ArgumentNullException.ThrowIfNull(identifier);
        var common = CommonSignatures.Of(identifier, magnitudeOnly);
        var axis = common.FrequencyHz;
        var stride = Math.Max(1, axis.Length / MostWindows);
        var best = default(StateSeparation);
        for (var first = 0; first < axis.Length; first += stride)
        {
            // A rounded axis must not lose the band that ends exactly on its last point.
            var end = axis.AsSpan().BinarySearch(axis[first] + (widthHz * (1.0 + 1e-9)));
            var count = (end < 0 ? ~end : end + 1) - first;
            if (axis[first] + (widthHz * (1.0 - 1e-9)) > axis[^1] || count < LeastCount)
            {
                continue;
            }

            var hardest = PairsWithin(common, first, count).MinBy(pair => pair.Distance);
            if (hardest is not null && (best is null || hardest.Distance > best.Distance))
            {
                best = hardest;
            }
        }

        return best;
    }

    private static IEnumerable<StateSeparation> PairsWithin(CommonSignatures common, int first, int count)
    {
        var fit = common.MagnitudeOnly ? null : new CableFit(common.FrequencyHz.AsSpan(first, count), common.CablePhase, common.LargestDelaySeconds);
        for (var a = 0; a < common.States.Length; a++)
        {
            for (var b = a + 1; b < common.States.Length; b++)
            {
                yield return Separation(common, a, b, first, count, fit);
            }
        }
    }

    /// <summary>Takes the noise of the signatures out of their distance and puts it into the error.</summary>
    /// <remarks>In units of the noise, with signatures that hold the shares r and s of it and n points, the squared distance of the signatures is too
    /// large by n (r + s) in the mean, and the decision variable |x - b|^2 - |x - a|^2 has the mean d^2 and the variance
    /// 4 d^2 (1 + s) + 4 n (r + s) + 2 n (r^2 + s^2); taken as normal, with s as the larger share.</remarks>
    private static StateSeparation Separation(CommonSignatures common, int a, int b, int first, int count, CableFit? fit)
    {
        var points = (common.MagnitudeOnly ? count : (2.0 * count) - IdentificationPlan.FreePhases(common.CablePhase)) / common.Correlation;
        var (r, s) = (Math.Min(common.SignatureNoise[a], common.SignatureNoise[b]), Math.Max(common.SignatureNoise[a], common.SignatureNoise[b]));
        var square = Math.Max(0.0, (common.SquaredDistance(a, b, first, count, fit) / common.NoiseVariance) - (points * (r + s)));
        var variance = (4.0 * square * (1.0 + s)) + (4.0 * points * (r + s)) + (2.0 * points * ((r * r) + (s * s)));
        var error = Normal.CDF(0.0, 1.0, -square / Math.Sqrt(variance));
        return new StateSeparation(common.States[a], common.States[b], common.FrequencyHz[first], common.FrequencyHz[first + count - 1], Math.Sqrt(square), error);
    }
}
