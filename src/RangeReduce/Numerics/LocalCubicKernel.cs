namespace RangeReduce.Numerics;

/// <summary>The polynomial through two to four samples, for loops that must not allocate.</summary>
internal static class LocalCubicKernel
{
    // A cubic between two samples needs about six steps of the Illinois rule; more are a safeguard against a double bend.
    private const int MostSteps = 40;

    /// <summary>Evaluates Lagrange's polynomial through all given samples.</summary>
    public static double Evaluate(ReadOnlySpan<double> x, ReadOnlySpan<double> y, double at)
    {
        var sum = 0.0;
        for (var i = 0; i < x.Length; i++)
        {
            var weight = 1.0;
            for (var k = 0; k < x.Length; k++)
            {
                if (k != i)
                {
                    weight *= (at - x[k]) / (x[i] - x[k]);
                }
            }

            sum += weight * y[i];
        }

        return sum;
    }

    /// <summary>Finds where the polynomial passes a level between sample <paramref name="left"/> and the next, which lie on either side of it.</summary>
    public static double Crossing(ReadOnlySpan<double> x, ReadOnlySpan<double> y, int left, double level)
    {
        // Newton's divided differences: cheaper to evaluate many times than Lagrange's form.
        Span<double> c = stackalloc double[4];
        y.CopyTo(c);
        var n = x.Length;
        for (var order = 1; order < n; order++)
        {
            for (var i = n - 1; i >= order; i--)
            {
                c[i] = (c[i] - c[i - 1]) / (x[i] - x[i - order]);
            }
        }

        // Regula falsi with the Illinois rule (an end that stays twice counts half): keeps the bracket, converges superlinearly.
        var (low, high) = (x[left], x[left + 1]);
        var (atLow, atHigh) = (y[left] - level, y[left + 1] - level);
        var tolerance = 1e-10 * (high - low);
        var kept = 0;
        for (var step = 0; step < MostSteps && high - low > tolerance && atHigh != atLow; step++)
        {
            var at = ((low * atHigh) - (high * atLow)) / (atHigh - atLow);
            var value = c[n - 1];
            for (var k = n - 2; k >= 0; k--)
            {
                value = (value * (at - x[k])) + c[k];
            }

            value -= level;
            if (Math.Abs(value) < 1e-12)
            {
                return at;
            }

            if (value < 0.0 == atLow < 0.0)
            {
                (low, atLow) = (at, value);
                atHigh = kept < 0 ? 0.5 * atHigh : atHigh;
                kept = -1;
            }
            else
            {
                (high, atHigh) = (at, value);
                atLow = kept > 0 ? 0.5 * atLow : atLow;
                kept = 1;
            }
        }

        return 0.5 * (low + high);
    }
}
