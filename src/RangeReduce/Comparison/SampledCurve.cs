namespace RangeReduce.Comparison;

/// <summary>What the comparisons need of a sampled curve: soundness, uniformity and linear interpolation.</summary>
internal static class SampledCurve
{
    // A written frequency or angle axis carries rounded decimals; steps alike to this share count as uniform.
    private const double UniformTolerance = 1e-6;

    /// <summary>Says what is wrong with a curve; null where nothing is.</summary>
    internal static string? Fault(string name, double[] x, double[] y)
    {
        if (x.Length != y.Length)
        {
            throw new ArgumentException($"The {name} curve has {x.Length} abscissae and {y.Length} ordinates.", nameof(y));
        }

        if (x.Length < 2)
        {
            return $"The {name} curve has fewer than 2 points.";
        }

        for (var n = 0; n < x.Length; n++)
        {
            if (!double.IsFinite(x[n]) || !double.IsFinite(y[n]))
            {
                return $"The {name} curve has a value that is not finite.";
            }

            if (n > 0 && x[n] <= x[n - 1])
            {
                return $"The axis of the {name} curve does not rise strictly.";
            }
        }

        return null;
    }

    internal static bool IsUniform(double[] x)
    {
        var step = (x[^1] - x[0]) / (x.Length - 1);
        for (var n = 1; n < x.Length; n++)
        {
            if (Math.Abs(x[n] - x[n - 1] - step) > UniformTolerance * step)
            {
                return false;
            }
        }

        return true;
    }

    internal static int CountInside(double[] x, double low, double high) => x.Count(value => value >= low && value <= high);

    internal static double[] UniformAxis(double low, double high, int count)
    {
        var x = new double[count];
        for (var n = 0; n < count; n++)
        {
            x[n] = low + ((high - low) * n / (count - 1));
        }

        x[^1] = high;
        return x;
    }

    /// <summary>Interpolates linearly at rising places that lie inside the curve.</summary>
    internal static double[] Interpolate(double[] x, double[] y, double[] at)
    {
        var result = new double[at.Length];
        var left = 0;
        for (var n = 0; n < at.Length; n++)
        {
            while (left < x.Length - 2 && x[left + 1] <= at[n])
            {
                left++;
            }

            var share = (at[n] - x[left]) / (x[left + 1] - x[left]);
            result[n] = ((1.0 - share) * y[left]) + (share * y[left + 1]);
        }

        return result;
    }
}
