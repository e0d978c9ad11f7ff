using RangeReduce.Networks;

namespace RangeReduce.Comparison.Identification;

/// <summary>Reads S11 out of a sweep into plain arrays.</summary>
internal static class ReflectionData
{
    /// <summary>Copies S11 of the points from <paramref name="first"/> on, as many as the spans are long.</summary>
    internal static void Copy(NetworkSweep sweep, int first, Span<double> re, Span<double> im)
    {
        if (sweep.Ports == 1)
        {
            sweep.Re.AsSpan(first, re.Length).CopyTo(re);
            sweep.Im.AsSpan(first, re.Length).CopyTo(im);
            return;
        }

        var stride = sweep.Ports * sweep.Ports;
        for (var n = 0; n < re.Length; n++)
        {
            (re[n], im[n]) = (sweep.Re[(first + n) * stride], sweep.Im[(first + n) * stride]);
        }
    }

    /// <summary>Puts the magnitude into the real part and zero into the imaginary part.</summary>
    internal static void DropPhase(Span<double> re, Span<double> im)
    {
        for (var n = 0; n < re.Length; n++)
        {
            re[n] = Math.Sqrt((re[n] * re[n]) + (im[n] * im[n]));
            im[n] = 0.0;
        }
    }

    /// <summary>Says whether two axes hold the same frequencies but for the rounding of a written file.</summary>
    internal static bool SameAxis(double[] a, double[] b)
    {
        if (ReferenceEquals(a, b) || a.AsSpan().SequenceEqual(b))
        {
            return true;
        }

        if (a.Length != b.Length)
        {
            return false;
        }

        var tolerance = 1e-6 * (a[^1] - a[0]) / a.Length;
        for (var n = 0; n < a.Length; n++)
        {
            if (Math.Abs(a[n] - b[n]) > tolerance)
            {
                return false;
            }
        }

        return true;
    }
}
