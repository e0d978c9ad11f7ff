using System.Numerics;
using MathNet.Numerics.LinearAlgebra;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Changes the real reference impedances of scattering parameters (power waves, K. Kurokawa, IEEE Trans. MTT 13(2), 1965).</summary>
public static class Renormalization
{
    /// <summary>Gives the sweep with other references.</summary>
    /// <param name="sweep">The sweep.</param>
    /// <param name="referenceOhm">New references in ohm, positive, one a port.</param>
    /// <exception cref="ArgumentException">There is not one positive reference a port.</exception>
    public static NetworkSweep To(NetworkSweep sweep, double[] referenceOhm)
    {
        ArgumentNullException.ThrowIfNull(sweep);
        ArgumentNullException.ThrowIfNull(referenceOhm);
        var n = sweep.Ports;
        if (referenceOhm.Length != n || referenceOhm.Any(ohm => !(ohm > 0.0)))
        {
            throw new ArgumentException("There must be one positive reference a port.", nameof(referenceOhm));
        }

        // For real references: r = (z' − z)/(z' + z), S' = A⁻¹ (S − r)(1 − r S)⁻¹ A with A = diag(√(1 − r²)).
        var r = Matrix<Complex>.Build.DenseDiagonal(n, n, i => (referenceOhm[i] - sweep.ReferenceOhm[i]) / (referenceOhm[i] + sweep.ReferenceOhm[i]));
        var unit = Matrix<Complex>.Build.DenseIdentity(n);
        var a = Matrix<Complex>.Build.DenseDiagonal(n, n, i => Math.Sqrt(1.0 - (r[i, i].Real * r[i, i].Real)) / Math.Abs(1.0 - r[i, i].Real) * (1.0 - r[i, i].Real));
        var inverse = Matrix<Complex>.Build.DenseDiagonal(n, n, i => 1.0 / a[i, i]);
        var (re, im) = (new double[sweep.Re.Length], new double[sweep.Im.Length]);
        for (var f = 0; f < sweep.Count; f++)
        {
            var frequency = f;
            var s = Matrix<Complex>.Build.Dense(n, n, (row, column) => sweep[frequency, row, column]);
            var turned = inverse * (s - r) * (unit - (r * s)).Inverse() * a;
            for (var i = 0; i < n * n; i++)
            {
                (re[(f * n * n) + i], im[(f * n * n) + i]) = (turned[i / n, i % n].Real, turned[i / n, i % n].Imaginary);
            }
        }

        return new(sweep.FrequencyHz, n, referenceOhm, re, im);
    }
}
