namespace RangeReduce.Numerics;

/// <summary>Root and minimum of a function inside a bracket, without derivatives.</summary>
public static class Bisection
{
    // 60 halvings of any bracket reach the spacing of doubles around its ends.
    private const int Halvings = 60;
    private const double Golden = 0.6180339887498949; // (√5 − 1)/2

    /// <summary>Finds where a function passes zero, knowing that its signs at the two ends differ.</summary>
    /// <param name="function">The function.</param>
    /// <param name="low">One end of the bracket.</param>
    /// <param name="high">The other end.</param>
    /// <returns>The root; the end with the smaller magnitude if the signs do not differ.</returns>
    public static double Root(Func<double, double> function, double low, double high)
    {
        ArgumentNullException.ThrowIfNull(function);
        var (atLow, atHigh) = (function(low), function(high));
        if (!((atLow < 0.0 && atHigh >= 0.0) || (atLow >= 0.0 && atHigh < 0.0)))
        {
            return Math.Abs(atLow) <= Math.Abs(atHigh) ? low : high;
        }

        for (var i = 0; i < Halvings; i++)
        {
            var middle = 0.5 * (low + high);
            if (function(middle) < 0.0 == atLow < 0.0)
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

    /// <summary>Finds the minimum of a function that has one dip inside the bracket, by golden section.</summary>
    /// <param name="function">The function.</param>
    /// <param name="low">Lower end of the bracket.</param>
    /// <param name="high">Upper end of the bracket.</param>
    /// <returns>The abscissa of the minimum, to about 1e-8 of the bracket.</returns>
    public static double Minimum(Func<double, double> function, double low, double high)
    {
        ArgumentNullException.ThrowIfNull(function);
        var width = high - low;
        var (a, b) = (high - (Golden * width), low + (Golden * width));
        var (atA, atB) = (function(a), function(b));
        while (high - low > 1e-9 * width)
        {
            if (atA <= atB)
            {
                (high, b, atB) = (b, a, atA);
                a = high - (Golden * (high - low));
                atA = function(a);
            }
            else
            {
                (low, a, atA) = (a, b, atB);
                b = low + (Golden * (high - low));
                atB = function(b);
            }
        }

        return 0.5 * (low + high);
    }
}
