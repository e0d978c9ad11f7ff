using MathNet.Numerics.Statistics;

namespace RangeReduce.Comparison;

/// <summary>Feature Selective Validation: a graded likeness of two curves (IEEE Std 1597.1; Duffy and others, IEEE Trans. EMC 48(3), 2006).</summary>
/// <remarks>The result depends on whether the curves are in decibels or linear: state it beside the number. The exponential offset term is that of
/// Duffy, Orlandi and Sasse, IEEE Trans. EMC 50(2), 2008. Where the texts differ, <see cref="FsvResult.Choices"/> says which reading is taken.</remarks>
public static class FeatureSelectiveValidation
{
    /// <summary>The fewest points of the common axis: fewer leave no room for the offset bins and the transition.</summary>
    public const int LeastCount = 32;

    /// <summary>Compares two curves.</summary>
    /// <param name="x1">Abscissae of the first curve, strictly rising.</param>
    /// <param name="y1">Its ordinates, as many.</param>
    /// <param name="x2">Abscissae of the second curve, strictly rising, in the same unit.</param>
    /// <param name="y2">Its ordinates, as many, in the same unit as those of the first.</param>
    /// <exception cref="ArgumentException">The curves cannot be compared; <see cref="TryCompare"/> gives the reason without an exception.</exception>
    public static FsvResult Compare(double[] x1, double[] y1, double[] x2, double[] y2) =>
        TryCompare(x1, y1, x2, y2, out var result, out var reason) ? result! : throw new ArgumentException(reason, nameof(x1));

    /// <summary>Compares two curves where that is possible.</summary>
    /// <param name="x1">Abscissae of the first curve, strictly rising.</param>
    /// <param name="y1">Its ordinates, as many.</param>
    /// <param name="x2">Abscissae of the second curve, strictly rising, in the same unit.</param>
    /// <param name="y2">Its ordinates, as many, in the same unit as those of the first.</param>
    /// <param name="result">The outcome; null where there is none.</param>
    /// <param name="reason">Why there is none, as a sentence; empty where there is one.</param>
    /// <returns>Whether there is an outcome.</returns>
    /// <exception cref="ArgumentException">A curve has not as many ordinates as abscissae.</exception>
    public static bool TryCompare(double[] x1, double[] y1, double[] x2, double[] y2, out FsvResult? result, out string reason)
    {
        result = null;
        if (!CurvePair.TryOverlay(x1, y1, x2, y2, out var pair, out reason))
        {
            return false;
        }

        if (pair!.Count < LeastCount)
        {
            reason = $"The overlap holds {pair.Count} points; the method needs {LeastCount}.";
            return false;
        }

        result = Measure(pair);
        return true;
    }

    private static FsvResult Measure(CurvePair pair)
    {
        var largest = Math.Max(pair.First.MaximumAbsolute(), pair.Second.MaximumAbsolute());
        var (first, second) = (FsvFilter.Transform(pair.First), FsvFilter.Transform(pair.Second));
        var breakPoint = Math.Min(FsvFilter.FortyPercentBin(first, largest), FsvFilter.FortyPercentBin(second, largest)) + 5;
        var (slow1, slow2) = (FsvFilter.SlowPart(first, breakPoint), FsvFilter.SlowPart(second, breakPoint));
        var (fastSlope1, fastSlope2) = (Slope(FsvFilter.FastPart(first, breakPoint)), Slope(FsvFilter.FastPart(second, breakPoint)));

        var offset = Difference(FsvFilter.OffsetPart(first), FsvFilter.OffsetPart(second), 1.0, largest);
        var amplitude = Difference(slow1, slow2, 1.0, largest);
        var feature1 = Difference(Slope(slow1), Slope(slow2), 2.0, largest);
        var feature2 = Difference(fastSlope1, fastSlope2, 6.0, largest);
        var feature3 = Difference(Slope(fastSlope1), Slope(fastSlope2), 7.2, largest);

        var (odm, adm, fdm, gdm) = (new double[pair.Count], new double[pair.Count], new double[pair.Count], new double[pair.Count]);
        for (var n = 0; n < pair.Count; n++)
        {
            odm[n] = Math.Abs(offset[n]) * Math.Exp(Math.Abs(offset[n]));
            adm[n] = Math.Abs(amplitude[n]) + odm[n];
            fdm[n] = 2.0 * Math.Abs(feature1[n] + feature2[n] + feature3[n]);
            gdm[n] = Math.Sqrt((adm[n] * adm[n]) + (fdm[n] * fdm[n]));
        }

        return new FsvResult
        {
            X = pair.X,
            Resampled = pair.Resampled,
            BreakPoint = breakPoint,
            Offset = new FsvMeasure(odm),
            Amplitude = new FsvMeasure(adm),
            Feature = new FsvMeasure(fdm),
            Global = new FsvMeasure(gdm),
            Correlation = Correlation.Pearson(pair.First, pair.Second),
        };
    }

    /// <summary>Gives (|a| - |b|) / (divisor * mean(|a| + |b|)) point by point; zero where both parts are nothing but rounding.</summary>
    private static double[] Difference(double[] a, double[] b, double divisor, double largest)
    {
        var mean = 0.0;
        for (var n = 0; n < a.Length; n++)
        {
            mean += (Math.Abs(a[n]) + Math.Abs(b[n])) / a.Length;
        }

        var result = new double[a.Length];
        if (mean <= 1e-12 * largest)
        {
            return result;
        }

        for (var n = 0; n < a.Length; n++)
        {
            result[n] = (Math.Abs(a[n]) - Math.Abs(b[n])) / (divisor * mean);
        }

        return result;
    }

    /// <summary>Takes the derivative in the point index: central quotients inside, two-point quotients at the ends.</summary>
    private static double[] Slope(double[] y)
    {
        var slope = new double[y.Length];
        slope[0] = y[1] - y[0];
        slope[^1] = y[^1] - y[^2];
        for (var n = 1; n < y.Length - 1; n++)
        {
            slope[n] = 0.5 * (y[n + 1] - y[n - 1]);
        }

        return slope;
    }
}
