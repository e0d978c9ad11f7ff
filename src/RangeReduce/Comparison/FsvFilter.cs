using System.Numerics;
using MathNet.Numerics.IntegralTransforms;

namespace RangeReduce.Comparison;

/// <summary>Splits a curve into offset, slow and fast part by its discrete Fourier transform: no padding, no taper, no removal of the mean.</summary>
internal static class FsvFilter
{
    private const int OffsetBins = 4;

    internal static Complex[] Transform(double[] y)
    {
        var bins = Array.ConvertAll(y, value => new Complex(value, 0.0));
        Fourier.Forward(bins, FourierOptions.AsymmetricScaling);
        return bins;
    }

    /// <summary>Finds the first bin at which 40 % of the intensity above the offset bins is reached; intensity is the magnitude of a one-sided bin.</summary>
    internal static int FortyPercentBin(Complex[] bins, double largest)
    {
        var last = bins.Length / 2;
        var sum = 0.0;
        for (var bin = OffsetBins; bin <= last; bin++)
        {
            sum += bins[bin].Magnitude;
        }

        // A constant curve has nothing but rounding here.
        if (sum <= 1e-12 * bins.Length * largest)
        {
            return last;
        }

        var partial = 0.0;
        for (var bin = OffsetBins; bin < last; bin++)
        {
            partial += bins[bin].Magnitude;
            if (partial >= 0.4 * sum)
            {
                return bin;
            }
        }

        return last;
    }

    internal static double[] OffsetPart(Complex[] bins) => Part(bins, bin => bin < OffsetBins ? 1.0 : 0.0);

    internal static double[] SlowPart(Complex[] bins, int breakPoint) => Part(bins, bin => bin < OffsetBins ? 0.0 : SlowWeight(bin, breakPoint));

    internal static double[] FastPart(Complex[] bins, int breakPoint) => Part(bins, bin => bin < OffsetBins ? 0.0 : 1.0 - SlowWeight(bin, breakPoint));

    /// <summary>Falls from 1 to 0 in exact sixths over the seven bins about the break point.</summary>
    private static double SlowWeight(int bin, int breakPoint) => Math.Clamp((breakPoint + 3 - bin) / 6.0, 0.0, 1.0);

    private static double[] Part(Complex[] bins, Func<int, double> weight)
    {
        var part = new Complex[bins.Length];
        for (var bin = 0; bin < bins.Length; bin++)
        {
            // A bin of the upper half is the mirror of one below and takes its weight, so that the part stays real.
            part[bin] = bins[bin] * weight(Math.Min(bin, bins.Length - bin));
        }

        Fourier.Inverse(part, FourierOptions.AsymmetricScaling);
        return Array.ConvertAll(part, value => value.Real);
    }
}
