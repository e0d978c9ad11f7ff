namespace RangeReduce.Numerics;

/// <summary>Straight lines between the rows of a table, and nothing outside it.</summary>
public static class LinearTable
{
    /// <summary>Interpolates over the logarithm of the abscissa, as is usual for the gain of a horn over frequency.</summary>
    /// <param name="x">Abscissae, positive and strictly rising.</param>
    /// <param name="y">Ordinates, as many.</param>
    /// <param name="at">The abscissa.</param>
    /// <returns>The ordinate; NaN outside the table: a gain is not extrapolated.</returns>
    public static double InterpolateOverLogarithm(double[] x, double[] y, double at)
    {
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        var found = Array.BinarySearch(x, at);
        if (found >= 0)
        {
            return y[found];
        }

        var next = ~found;
        if (next == 0 || next == x.Length)
        {
            return double.NaN;
        }

        var share = Math.Log(at / x[next - 1]) / Math.Log(x[next] / x[next - 1]);
        return y[next - 1] + (share * (y[next] - y[next - 1]));
    }
}
