using System.Numerics;
using MathNet.Numerics.LinearAlgebra;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Turns impedance, admittance and hybrid parameters into scattering parameters with real references.</summary>
/// <remarks>
/// With z = diag(reference): Z → S = (z^-½ Z z^-½ − 1)(z^-½ Z z^-½ + 1)⁻¹; Y → S = (1 − z^½ Y z^½)(1 + z^½ Y z^½)⁻¹, not by way of Y⁻¹, which fails for a lone series element.
/// H and G by putting V = √z (a + b), I = (a − b)/√z into their defining equations (textbook relations between wave and circuit quantities).
/// </remarks>
public static class ParameterConversion
{
    /// <summary>Turns one matrix into scattering parameters.</summary>
    /// <param name="kind">Kind of the matrix, in ohm and siemens.</param>
    /// <param name="native">The matrix, row-major; two by two for H and G.</param>
    /// <param name="referenceOhm">Real references in ohm, one a port.</param>
    /// <returns>The scattering matrix, row-major; null where it does not exist.</returns>
    public static Complex[]? ToScattering(ParameterKind kind, ReadOnlySpan<Complex> native, ReadOnlySpan<double> referenceOhm)
    {
        var n = referenceOhm.Length;
        if (kind == ParameterKind.S)
        {
            return native.ToArray();
        }

        // Every kind gives V and I as combinations A a + B b = 0 of the waves; then S = −B⁻¹ A.
        var (a, b) = kind is ParameterKind.H or ParameterKind.G ? Hybrid(kind, native, referenceOhm) : Square(kind, native, referenceOhm);
        var (right, left) = (Matrix<Complex>.Build.DenseOfArray(a), Matrix<Complex>.Build.DenseOfArray(b));
        var scattering = left.Solve(-right);
        var flat = new Complex[n * n];
        for (var i = 0; i < n * n; i++)
        {
            flat[i] = scattering[i / n, i % n];
            if (!double.IsFinite(flat[i].Real) || !double.IsFinite(flat[i].Imaginary))
            {
                return null;
            }
        }

        return flat;
    }

    private static (Complex[,] A, Complex[,] B) Square(ParameterKind kind, ReadOnlySpan<Complex> native, ReadOnlySpan<double> referenceOhm)
    {
        var n = referenceOhm.Length;
        var (a, b) = (new Complex[n, n], new Complex[n, n]);
        for (var i = 0; i < n; i++)
        {
            for (var j = 0; j < n; j++)
            {
                var root = Math.Sqrt(referenceOhm[i] * referenceOhm[j]);
                var normalised = kind == ParameterKind.Z ? native[(i * n) + j] / root : native[(i * n) + j] * root;
                var unit = i == j ? 1.0 : 0.0;

                // Z: a + b = z (a − b), so (1 − z) a + (1 + z) b = 0. Y: a − b = y (a + b), so (1 − y) a − (1 + y) b = 0.
                a[i, j] = unit - normalised;
                b[i, j] = kind == ParameterKind.Z ? unit + normalised : -(unit + normalised);
            }
        }

        return (a, b);
    }

    private static (Complex[,] A, Complex[,] B) Hybrid(ParameterKind kind, ReadOnlySpan<Complex> m, ReadOnlySpan<double> referenceOhm)
    {
        var (r1, r2) = (Math.Sqrt(referenceOhm[0]), Math.Sqrt(referenceOhm[1]));
        var (a, b) = (new Complex[2, 2], new Complex[2, 2]);
        if (kind == ParameterKind.H)
        {
            // r1 (a1 + b1) = h11 (a1 − b1)/r1 + h12 r2 (a2 + b2);  (a2 − b2)/r2 = h21 (a1 − b1)/r1 + h22 r2 (a2 + b2)
            (a[0, 0], a[0, 1], b[0, 0], b[0, 1]) = (r1 - (m[0] / r1), -m[1] * r2, r1 + (m[0] / r1), -m[1] * r2);
            (a[1, 0], a[1, 1], b[1, 0], b[1, 1]) = (-m[2] / r1, (1.0 / r2) - (m[3] * r2), m[2] / r1, (-1.0 / r2) - (m[3] * r2));
        }
        else
        {
            // (a1 − b1)/r1 = g11 r1 (a1 + b1) + g12 (a2 − b2)/r2;  r2 (a2 + b2) = g21 r1 (a1 + b1) + g22 (a2 − b2)/r2
            (a[0, 0], a[0, 1], b[0, 0], b[0, 1]) = ((1.0 / r1) - (m[0] * r1), -m[1] / r2, (-1.0 / r1) - (m[0] * r1), m[1] / r2);
            (a[1, 0], a[1, 1], b[1, 0], b[1, 1]) = (-m[2] * r1, r2 - (m[3] / r2), -m[2] * r1, r2 + (m[3] / r2));
        }

        return (a, b);
    }
}
