namespace RangeReduce.Patterns;

/// <summary>Samples of one channel or component over [frequency, angle], as planar arrays.</summary>
/// <param name="Re">Real parts [frequency, angle] in row-major order; amplitudes where there is no phase. NaN marks a missing sample.</param>
/// <param name="Im">Imaginary parts in the same order; null where the phase was not recorded.</param>
public sealed record PatternChannel(double[] Re, double[]? Im)
{
    /// <summary>Gives whether the phase was recorded.</summary>
    public bool HasPhase => Im is not null;

    /// <summary>Gives the power of one sample; NaN where it is missing.</summary>
    /// <param name="at">Index into the arrays: frequency * number of angles + angle.</param>
    public double Power(int at) => (Re[at] * Re[at]) + (Im is null ? 0.0 : Im[at] * Im[at]);

    /// <summary>Gives the samples multiplied by a real factor a frequency.</summary>
    /// <param name="factor">Factors on the amplitude, one a frequency.</param>
    public PatternChannel Scaled(double[] factor)
    {
        ArgumentNullException.ThrowIfNull(factor);
        var angles = Re.Length / factor.Length;
        return new(Times(Re), Im is null ? null : Times(Im));

        double[] Times(double[] plane)
        {
            var scaled = new double[plane.Length];
            for (var i = 0; i < scaled.Length; i++)
            {
                scaled[i] = plane[i] * factor[i / angles];
            }

            return scaled;
        }
    }
}
