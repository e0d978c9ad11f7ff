namespace RangeReduce.Comparison;

/// <summary>Two real curves on one uniform axis, over the range that both cover.</summary>
public sealed class CurvePair
{
    private CurvePair(double[] x, double[] first, double[] second, bool resampled)
    {
        (X, First, Second, Resampled) = (x, first, second, resampled);
    }

    /// <summary>Gets the common abscissae, uniform and rising.</summary>
    public double[] X { get; }

    /// <summary>Gets the ordinates of the first curve, as many as <see cref="X"/>.</summary>
    public double[] First { get; }

    /// <summary>Gets the ordinates of the second curve, as many as <see cref="X"/>.</summary>
    public double[] Second { get; }

    /// <summary>Gets whether the curves were interpolated; false where both came on the same uniform axis.</summary>
    public bool Resampled { get; }

    /// <summary>Gets the number of points.</summary>
    public int Count => X.Length;

    /// <summary>Lays two curves on a uniform axis over their overlap.</summary>
    /// <remarks>The count is the larger of the two numbers of own points inside the overlap, and the interpolation is linear. Curves that
    /// already share a uniform axis pass unchanged.</remarks>
    /// <param name="x1">Abscissae of the first curve, strictly rising.</param>
    /// <param name="y1">Its ordinates, as many.</param>
    /// <param name="x2">Abscissae of the second curve, strictly rising, in the same unit.</param>
    /// <param name="y2">Its ordinates, as many.</param>
    /// <param name="pair">The pair; null where there is none.</param>
    /// <param name="reason">Why there is none; empty where there is one.</param>
    /// <returns>Whether there is a pair.</returns>
    /// <exception cref="ArgumentException">A curve has not as many ordinates as abscissae.</exception>
    public static bool TryOverlay(double[] x1, double[] y1, double[] x2, double[] y2, out CurvePair? pair, out string reason)
    {
        ArgumentNullException.ThrowIfNull(x1);
        ArgumentNullException.ThrowIfNull(y1);
        ArgumentNullException.ThrowIfNull(x2);
        ArgumentNullException.ThrowIfNull(y2);
        pair = null;
        reason = SampledCurve.Fault("first", x1, y1) ?? SampledCurve.Fault("second", x2, y2) ?? string.Empty;
        if (reason.Length > 0)
        {
            return false;
        }

        if (x1.AsSpan().SequenceEqual(x2) && SampledCurve.IsUniform(x1))
        {
            pair = new CurvePair(x1, y1, y2, resampled: false);
            return true;
        }

        var (low, high) = (Math.Max(x1[0], x2[0]), Math.Min(x1[^1], x2[^1]));
        var count = high > low ? Math.Max(SampledCurve.CountInside(x1, low, high), SampledCurve.CountInside(x2, low, high)) : 0;
        if (count < 2)
        {
            reason = "The curves do not overlap.";
            return false;
        }

        var x = SampledCurve.UniformAxis(low, high, count);
        pair = new CurvePair(x, SampledCurve.Interpolate(x1, y1, x), SampledCurve.Interpolate(x2, y2, x), resampled: true);
        return true;
    }
}
