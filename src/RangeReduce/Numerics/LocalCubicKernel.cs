namespace RangeReduce.Numerics;

/// <summary>The polynomial through two to four samples, for loops that must not allocate.</summary>
internal static class LocalCubicKernel
{
    // Each halving gains one bit; 48 leave an edge of a beam known to far below a millionth of a step.
    private const int Halvings = 48;

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

        var (low, high) = (x[left], x[left + 1]);
        var lowIsBelow = y[left] < level;
        for (var i = 0; i < Halvings; i++)
        {
            var middle = 0.5 * (low + high);
            var value = c[n - 1];
            for (var k = n - 2; k >= 0; k--)
            {
                value = (value * (middle - x[k])) + c[k];
            }

            if (value < level == lowIsBelow)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return 0.5 * (low + high);
    }
}
