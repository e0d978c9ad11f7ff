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
    }

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

    /// <summary>Gives the correlation of the mean-free curves on the logarithmic axis; negative infinity where one of them is constant there.</summary>
    internal double Correlation(double factor)
    {
        var (count, a, b, aa, bb, ab) = (0, 0.0, 0.0, 0.0, 0.0, 0.0);
        for (var n = 0; n < _logAxis.Length; n++)
        {
            var at = Math.Exp(_logAxis[n]) / factor;
            if (at < _simulatedLow || at > _simulatedHigh)
            {
                continue;
            }

            var (m, s) = (_measuredOnLogAxis[n], _simulated.Interpolate(at));
            (count, a, b, aa, bb, ab) = (count + 1, a + m, b + s, aa + (m * m), bb + (s * s), ab + (m * s));
        }

        var spread = ((count * aa) - (a * a)) * ((count * bb) - (b * b));
        return spread > 0.0 ? ((count * ab) - (a * b)) / Math.Sqrt(spread) : double.NegativeInfinity;
    }

    /// <summary>Gives the derivative of the scaled simulated curve by the factor, in the unit of the curves.</summary>
    internal double Sensitivity(double hz, double factor) => -_simulated.Differentiate(hz / factor) * hz / (factor * factor);
}
