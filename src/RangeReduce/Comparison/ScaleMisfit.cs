using MathNet.Numerics.Interpolation;

namespace RangeReduce.Comparison;

/// <summary>How far a measured curve is from the simulated one, whose frequencies are multiplied by a factor.</summary>
internal sealed class ScaleMisfit
{
    private readonly double _simulatedLow;
    private readonly double _simulatedHigh;
    private readonly double[] _measuredHz;
    private readonly double[] _measured;
    private readonly double[] _logAxis;
    private readonly double[] _measuredOnLogAxis;
    private readonly double[] _simulatedOnLogAxis;
    private readonly double _leastCover;
    private readonly IInterpolation _simulated;

    internal ScaleMisfit(double[] simulatedHz, double[] simulated, double[] measuredHz, double[] measured, FrequencyScaleOptions options)
    {
        (_simulatedLow, _simulatedHigh, _measuredHz, _measured, _leastCover) = (simulatedHz[0], simulatedHz[^1], measuredHz, measured, options.LeastCover);
        _simulated = options.Interpolation == CurveInterpolation.Linear
            ? LinearSpline.InterpolateSorted(simulatedHz, simulated)
            : CubicSpline.InterpolateNaturalSorted(simulatedHz, simulated);
        _logAxis = SampledCurve.UniformAxis(Math.Log(measuredHz[0]), Math.Log(measuredHz[^1]), Math.Max(simulatedHz.Length, measuredHz.Length));
        var onAxis = Array.ConvertAll(_logAxis, Math.Exp);
        (onAxis[0], onAxis[^1]) = (measuredHz[0], measuredHz[^1]);
        _measuredOnLogAxis = SampledCurve.Interpolate(measuredHz, measured, onAxis);
        Reach = (int)Math.Floor(Math.Log(1.0 + options.LargestDeparture) / LogStep);
        _simulatedOnLogAxis = [.. Enumerable.Range(-Reach, _logAxis.Length + (2 * Reach)).Select(n => OnLogAxis(_logAxis[0] + (n * LogStep)))];
    }

    /// <summary>Gets the largest shift, in whole points of the logarithmic axis, that the options allow.</summary>
    internal int Reach { get; }

    internal double LogStep => _logAxis[1] - _logAxis[0];

    /// <summary>Gives the frequencies and the residuals measured - simulated(f / factor) at the measured points that both curves cover.</summary>
    internal List<(double Hz, double Residual)> Residuals(double factor)
    {
        var residuals = new List<(double Hz, double Residual)>(_measuredHz.Length);
        for (var n = 0; n < _measuredHz.Length; n++)
        {
            var at = _measuredHz[n] / factor;
            if (at >= _simulatedLow && at <= _simulatedHigh)
            {
                residuals.Add((_measuredHz[n], _measured[n] - _simulated.Interpolate(at)));
            }
        }

        return residuals;
    }

    /// <summary>Gives the root mean square difference; NaN where the curves cover too few common points.</summary>
    internal double Rms(double factor, double? leastCover = null)
    {
        var residuals = Residuals(factor);
        return residuals.Count > 0 && residuals.Count >= (leastCover ?? _leastCover) * _measuredHz.Length
            ? Math.Sqrt(residuals.Average(point => point.Residual * point.Residual))
            : double.NaN;
    }

    /// <summary>Compares the curves on the logarithmic axis, where the factor exp(lag * <see cref="LogStep"/>) is a shift by whole points.</summary>
    /// <returns>The root mean square difference, NaN where the curves share too few points, and the correlation of the mean-free curves, negative
    /// infinity where one of them is constant there.</returns>
    internal (double Rms, double Correlation) Shifted(int lag)
    {
        var (count, squares, a, b, aa, bb, ab) = (0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0);
        for (var n = 0; n < _logAxis.Length; n++)
        {
            var (m, s) = (_measuredOnLogAxis[n], _simulatedOnLogAxis[n - lag + Reach]);
            if (double.IsNaN(s))
            {
                continue;
            }

            (count, squares) = (count + 1, squares + ((m - s) * (m - s)));
            (a, b, aa, bb, ab) = (a + m, b + s, aa + (m * m), bb + (s * s), ab + (m * s));
        }

        if (count == 0 || count < _leastCover * _logAxis.Length)
        {
            return (double.NaN, double.NegativeInfinity);
        }

        var spread = ((count * aa) - (a * a)) * ((count * bb) - (b * b));
        return (Math.Sqrt(squares / count), spread > 0.0 ? ((count * ab) - (a * b)) / Math.Sqrt(spread) : double.NegativeInfinity);
    }

    /// <summary>Gives the derivative of the scaled simulated curve by the factor, in the unit of the curves.</summary>
    internal double Sensitivity(double hz, double factor) => -_simulated.Differentiate(hz / factor) * hz / (factor * factor);

    private double OnLogAxis(double logHz)
    {
        // The ends of equal axes must not be lost to the rounding of the logarithm.
        var hz = Math.Exp(logHz);
        return hz < _simulatedLow * (1.0 - 1e-12) || hz > _simulatedHigh * (1.0 + 1e-12) ? double.NaN : _simulated.Interpolate(Math.Clamp(hz, _simulatedLow, _simulatedHigh));
    }
}
