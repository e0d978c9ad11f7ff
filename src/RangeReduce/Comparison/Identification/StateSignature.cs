using MathNet.Numerics.Interpolation;

namespace RangeReduce.Comparison.Identification;

/// <summary>What the reflection of one configuration state looks like: the mean of its repeats.</summary>
public sealed class StateSignature
{
    internal StateSignature(string state, double[] frequencyHz, double[] re, double[] im, bool hasPhase, int repeats, double referenceOhm)
    {
        (State, FrequencyHz, Re, Im, HasPhase, Repeats, ReferenceOhm) = (state, frequencyHz, re, im, hasPhase, repeats, referenceOhm);
    }

    /// <summary>Gets the configuration state.</summary>
    public string State { get; }

    /// <summary>Gets the frequencies in hertz, strictly rising.</summary>
    public double[] FrequencyHz { get; }

    /// <summary>Gets the real parts of S11, or its magnitudes where there is no phase, one a frequency.</summary>
    public double[] Re { get; }

    /// <summary>Gets the imaginary parts of S11, zeros where there is no phase, one a frequency.</summary>
    public double[] Im { get; }

    /// <summary>Gets whether the phase is known.</summary>
    public bool HasPhase { get; }

    /// <summary>Gets the number of sweeps in the mean.</summary>
    public int Repeats { get; }

    /// <summary>Gets the reference impedance in ohm.</summary>
    public double ReferenceOhm { get; }

    /// <summary>Gets how far a curve between the points may be off, root mean square, as a reflection coefficient; it matters for sweeps on another axis only.</summary>
    /// <remarks>A sixteenth of what a cubic spline through every second point misses at the others, since its error falls with the fourth power of the step.</remarks>
    public double InterpolationError
    {
        get
        {
            if (FrequencyHz.Length < 8)
            {
                return double.NaN;
            }

            var (re, im) = (Missed(Re), Missed(Im));
            return Math.Sqrt((re * re) + (im * im)) / 16.0;
        }
    }

    /// <summary>Gets the factor on the noise variance of one sweep that the noise of the mean adds.</summary>
    internal double VarianceFactor => 1.0 + (1.0 / Repeats);

    private double Missed(double[] values)
    {
        var spline = CubicSpline.InterpolateNaturalSorted([.. FrequencyHz.Where((_, n) => n % 2 == 0)], [.. values.Where((_, n) => n % 2 == 0)]);
        var (squares, count) = (0.0, 0);
        for (var n = 1; n < values.Length - 1; n += 2)
        {
            squares += Math.Pow(values[n] - spline.Interpolate(FrequencyHz[n]), 2.0);
            count++;
        }

        return Math.Sqrt(squares / count);
    }
}
