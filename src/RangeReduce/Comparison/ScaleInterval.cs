using MathNet.Numerics.Distributions;

namespace RangeReduce.Comparison;

/// <summary>The interval of a fitted frequency scale.</summary>
internal static class ScaleInterval
{
    /// <summary>Gives half the 95 % interval and the number of independent points that the residuals amount to; NaN where the curve is flat.</summary>
    /// <remarks>Linearized least squares (JCGM 100, 5.1.2): variance of the factor = residual variance / sum of squared sensitivities. What simulation
    /// leaves over is smooth along frequency, so the variance is multiplied by the count over the effective count, n / (1 + 2 sum of the autocorrelation
    /// up to its first sign change), and the quantile is Student's with the effective count less one. For a curve whose slope changes sign within that length the interval comes out rather
    /// too wide than too narrow.</remarks>
    internal static (double HalfWidth, double EffectiveCount) HalfWidth(ScaleMisfit misfit, double factor)
    {
        var points = misfit.Residuals(factor);
        var residuals = points.Select(point => point.Residual).ToArray();
        var sensitivity = points.Sum(point => Math.Pow(misfit.Sensitivity(point.Hz, factor), 2.0));
        var squares = residuals.Sum(residual => residual * residual);
        if (sensitivity <= 0.0 || points.Count < 3)
        {
            return (double.NaN, double.NaN);
        }

        if (squares == 0.0)
        {
            return (0.0, points.Count);
        }

        var effective = Math.Max(2.0, points.Count / CorrelationLength(residuals, squares));
        var variance = squares / (points.Count - 1) / sensitivity * (points.Count / effective);
        return (StudentT.InvCDF(0.0, 1.0, effective - 1.0, 0.975) * Math.Sqrt(variance), effective);
    }

    private static double CorrelationLength(double[] residuals, double squares)
    {
        var length = 1.0;
        for (var lag = 1; lag < residuals.Length; lag++)
        {
            var sum = 0.0;
            for (var n = lag; n < residuals.Length; n++)
            {
                sum += residuals[n] * residuals[n - lag];
            }

            if (sum <= 0.0)
            {
                break;
            }

            length += 2.0 * sum / squares;
        }

        return length;
    }
}
