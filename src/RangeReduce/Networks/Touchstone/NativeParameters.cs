using System.Numerics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Turns the parameters as filed into scattering parameters: takes the normalisation of version 1 off, mixed modes apart, and converts the kind.</summary>
/// <param name="kind">Kind as filed.</param>
/// <param name="isNormalised">Whether the values are normalised, as version 1 has it.</param>
/// <param name="file">File for messages.</param>
internal sealed class NativeParameters(ParameterKind kind, bool isNormalised, string file)
{
    /// <summary>Converts all matrices in place.</summary>
    /// <param name="re">Real parts, [frequency, row, column].</param>
    /// <param name="im">Imaginary parts.</param>
    /// <param name="referenceOhm">References in ohm, one a port.</param>
    /// <param name="mixedMode">Order of the modes; null for a single-ended file.</param>
    /// <param name="line">Line of the option line, for messages.</param>
    /// <exception cref="Diagnostics.MeasurementDataException">Version 1 with unequal references and another kind than S, or a matrix without scattering parameters.</exception>
    public void ToScattering(double[] re, double[] im, double[] referenceOhm, MixedModeOrder? mixedMode, int line)
    {
        var n = referenceOhm.Length;
        if (mixedMode is not null)
        {
            foreach (var (first, second) in mixedMode.Pairs)
            {
                if (referenceOhm[first] != referenceOhm[second] || kind != ParameterKind.S)
                {
                    throw TouchstoneErrors.UnequalReferences(new(file, line), kind);
                }
            }

            for (var start = 0; start < re.Length; start += n * n)
            {
                mixedMode.ToSingleEnded(re.AsSpan(start, n * n), im.AsSpan(start, n * n));
            }
        }

        if (kind == ParameterKind.S)
        {
            return;
        }

        if (isNormalised && referenceOhm.Distinct().Skip(1).Any())
        {
            throw TouchstoneErrors.UnequalReferences(new(file, line), kind);
        }

        var factors = isNormalised ? Factors(n, referenceOhm[0]) : null;
        var native = new Complex[n * n];
        for (var start = 0; start < re.Length; start += n * n)
        {
            for (var i = 0; i < native.Length; i++)
            {
                native[i] = new Complex(re[start + i], im[start + i]) * (factors?[i] ?? 1.0);
            }

            var scattering = ParameterConversion.ToScattering(kind, native, referenceOhm) ?? throw TouchstoneErrors.NotConvertible(new(file, line), kind);
            for (var i = 0; i < native.Length; i++)
            {
                (re[start + i], im[start + i]) = (scattering[i].Real, scattering[i].Imaginary);
            }
        }
    }

    /// <summary>Gives what each element of a version 1 matrix is multiplied by to be in ohm and siemens.</summary>
    private double[] Factors(int ports, double r) => kind switch
    {
        ParameterKind.Z => [.. Enumerable.Repeat(r, ports * ports)],
        ParameterKind.Y => [.. Enumerable.Repeat(1.0 / r, ports * ports)],
        ParameterKind.H => [r, 1.0, 1.0, 1.0 / r],
        _ => [1.0 / r, 1.0, 1.0, r],
    };
}
