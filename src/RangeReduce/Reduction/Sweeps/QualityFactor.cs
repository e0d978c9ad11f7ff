using System.Numerics;
using RangeReduce.Networks;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>Quality factor of an antenna from the frequency derivative of its impedance (Yaghjian and Best, IEEE Trans. AP 53(4), 2005).</summary>
public static class QualityFactor
{
    /// <summary>The most samples on either side of the resonance that the derivative is fitted over.</summary>
    private const int LargestReach = 8;

    /// <summary>Gives Q_Z = f0/(2R) · √(R'² + (X' + |X|/f0)²) with primes d/df.</summary>
    /// <param name="impedanceOhm">Impedance in ohm at the resonance.</param>
    /// <param name="derivativeOhmPerHz">Its derivative in ohm per hertz.</param>
    /// <param name="frequencyHz">The resonance in hertz.</param>
    public static double Of(Complex impedanceOhm, Complex derivativeOhmPerHz, double frequencyHz)
    {
        var reactive = derivativeOhmPerHz.Imaginary + (Math.Abs(impedanceOhm.Imaginary) / frequencyHz);
        return frequencyHz / (2.0 * impedanceOhm.Real) * Math.Sqrt((derivativeOhmPerHz.Real * derivativeOhmPerHz.Real) + (reactive * reactive));
    }

    /// <summary>Gives the derivative of the impedance at a frequency, from a cubic fitted to the samples around it.</summary>
    /// <param name="curve">The reflection coefficient, with phase.</param>
    /// <param name="frequencyHz">The frequency in hertz.</param>
    /// <param name="reachHz">Half of the span in hertz that the cubic may be fitted over; two samples on either side are always taken.</param>
    /// <returns>Ohm per hertz; NaN in both parts where there are fewer than two samples on a side.</returns>
    public static Complex DerivativeOhmPerHz(ReflectionCurve curve, double frequencyHz, double reachHz)
    {
        ArgumentNullException.ThrowIfNull(curve);
        var found = Array.BinarySearch(curve.FrequencyHz, frequencyHz);
        var next = found >= 0 ? found : ~found;
        var (first, last) = (next - 2, found >= 0 ? next + 2 : next + 1);
        if (first < 0 || last >= curve.FrequencyHz.Length)
        {
            return new(double.NaN, double.NaN);
        }

        // Noise falls with the span of the fit, bias grows with it.
        while (first > 0 && next - first < LargestReach && frequencyHz - curve.FrequencyHz[first - 1] <= reachHz)
        {
            first--;
        }

        while (last + 1 < curve.FrequencyHz.Length && last - next < LargestReach && curve.FrequencyHz[last + 1] - frequencyHz <= reachHz)
        {
            last++;
        }

        return Slope(curve, frequencyHz, first, last);
    }

    // Least squares in the powers 0 to 3 of the scaled distance; the slope is the coefficient of the first.
    private static Complex Slope(ReflectionCurve curve, double frequencyHz, int first, int last)
    {
        var scale = Math.Max(frequencyHz - curve.FrequencyHz[first], curve.FrequencyHz[last] - frequencyHz);
        var normal = new double[4, 4];
        var right = new Complex[4];
        for (var i = first; i <= last; i++)
        {
            var t = (curve.FrequencyHz[i] - frequencyHz) / scale;
            ReadOnlySpan<double> power = [1.0, t, t * t, t * t * t];
            var impedance = Reflection.ImpedanceOhm(curve[i], curve.ReferenceOhm);
            for (var row = 0; row < 4; row++)
            {
                right[row] += power[row] * impedance;
                for (var column = 0; column < 4; column++)
                {
                    normal[row, column] += power[row] * power[column];
                }
            }
        }

        for (var pivot = 0; pivot < 4; pivot++)
        {
            for (var row = pivot + 1; row < 4; row++)
            {
                var factor = normal[row, pivot] / normal[pivot, pivot];
                right[row] -= factor * right[pivot];
                for (var column = pivot; column < 4; column++)
                {
                    normal[row, column] -= factor * normal[pivot, column];
                }
            }
        }

        for (var row = 3; row >= 1; row--)
        {
            for (var column = row + 1; column < 4; column++)
            {
                right[row] -= normal[row, column] * right[column];
            }

            right[row] /= normal[row, row];
        }

        return right[1] / scale;
    }
}
