using MathNet.Numerics.Interpolation;

namespace RangeReduce.Comparison.Identification;

/// <summary>The signatures of all states on the axis of the first, over the band that all cover.</summary>
internal sealed class CommonSignatures
{
    private readonly double[][] _re;
    private readonly double[][] _im;

    private CommonSignatures(SweepIdentifier identifier, double[] frequencyHz, bool magnitudeOnly)
    {
        FrequencyHz = frequencyHz;
        MagnitudeOnly = magnitudeOnly;
        States = [.. identifier.Signatures.Select(signature => signature.State)];
        CablePhase = identifier.Options.CablePhase;
        SignatureNoise = [.. identifier.Signatures.Select(signature => 1.0 / signature.Repeats)];
        Correlation = identifier.Noise.Correlation;
        LargestDelaySeconds = identifier.Options.LargestDelaySeconds;
        NoiseVariance = identifier.Noise.StandardDeviation * identifier.Noise.StandardDeviation * identifier.Noise.Correlation;
        _re = [.. identifier.Signatures.Select(signature => Carry(signature, signature.Re, frequencyHz))];
        _im = [.. identifier.Signatures.Select(signature => Carry(signature, signature.Im, frequencyHz))];
        for (var k = 0; magnitudeOnly && k < _re.Length; k++)
        {
            ReflectionData.DropPhase(_re[k], _im[k]);
        }
    }

    internal double[] FrequencyHz { get; }

    internal bool MagnitudeOnly { get; }

    internal string[] States { get; }

    internal CablePhase CablePhase { get; }

    internal double LargestDelaySeconds { get; }

    /// <summary>Gets the noise variance in the real part, raised by the correlation along frequency.</summary>
    internal double NoiseVariance { get; }

    /// <summary>Gets the noise variance of each signature over that of one sweep.</summary>
    internal double[] SignatureNoise { get; }

    /// <summary>Gets by how much correlation along frequency lowers the number of independent points.</summary>
    internal double Correlation { get; }

    internal static CommonSignatures Of(SweepIdentifier identifier, bool magnitudeOnly)
    {
        var (low, high) = (identifier.Signatures.Max(signature => signature.FrequencyHz[0]), identifier.Signatures.Min(signature => signature.FrequencyHz[^1]));
        double[] axis = [.. identifier.Signatures[0].FrequencyHz.Where(hz => hz >= low && hz <= high)];
        return new CommonSignatures(identifier, axis, magnitudeOnly || identifier.Signatures.Any(signature => !signature.HasPhase));
    }

    /// <summary>Gives the least sum of squared distances of two signatures over what the cable leaves free; without a fit the arrays are compared as they are.</summary>
    internal double SquaredDistance(int a, int b, int first, int count, CableFit? fit)
    {
        var (energy, direct) = (0.0, 0.0);
        var (re, im) = (new double[fit?.Length ?? count], new double[fit?.Length ?? count]);
        for (var n = 0; n < count; n++)
        {
            var (x, y, u, v) = (_re[a][first + n], _im[a][first + n], _re[b][first + n], _im[b][first + n]);
            energy += (x * x) + (y * y) + (u * u) + (v * v);
            direct += ((x - u) * (x - u)) + ((y - v) * (y - v));
            (re[n], im[n]) = ((x * u) + (y * v), (y * u) - (x * v));
        }

        return fit is null ? direct : Math.Max(0.0, energy - (2.0 * fit.Largest(re, im, new double[fit.ScratchLength]).Value));
    }

    private static double[] Carry(StateSignature signature, double[] values, double[] axis)
    {
        var spline = CubicSpline.InterpolateNaturalSorted(signature.FrequencyHz, values);
        return Array.ConvertAll(axis, spline.Interpolate);
    }
}
