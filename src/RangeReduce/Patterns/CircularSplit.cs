namespace RangeReduce.Patterns;

/// <summary>From theta and phi components to right- and left-hand circular ones and back.</summary>
/// <remarks>
/// For a time factor exp(+jwt), theta × phi along propagation, and the hand of IEEE Std 145:
/// R = (θ + jφ)/√2, L = (θ − jφ)/√2; a right-hand wave has φ = −jθ (phi lags). The split is unitary: |R|² + |L|² = |θ|² + |φ|².
/// </remarks>
public static class CircularSplit
{
    private const double InverseRootTwo = 0.70710678118654752440; // 1/√2 keeps the power

    /// <summary>Splits theta and phi into right and left.</summary>
    /// <param name="theta">Theta component with phase.</param>
    /// <param name="phi">Phi component with phase, over the same samples.</param>
    /// <returns>The right-hand and the left-hand component, over the same samples.</returns>
    /// <exception cref="ArgumentException">A phase is missing or the lengths differ.</exception>
    public static (PatternChannel Right, PatternChannel Left) ToCircular(PatternChannel theta, PatternChannel phi)
    {
        var (thetaRe, thetaIm, phiRe, phiIm) = Planes(theta, phi);
        var n = thetaRe.Length;
        var (rightRe, rightIm, leftRe, leftIm) = (new double[n], new double[n], new double[n], new double[n]);
        for (var i = 0; i < n; i++)
        {
            // jφ = −Im φ + j Re φ
            rightRe[i] = (thetaRe[i] - phiIm[i]) * InverseRootTwo;
            rightIm[i] = (thetaIm[i] + phiRe[i]) * InverseRootTwo;
            leftRe[i] = (thetaRe[i] + phiIm[i]) * InverseRootTwo;
            leftIm[i] = (thetaIm[i] - phiRe[i]) * InverseRootTwo;
        }

        return (new(rightRe, rightIm), new(leftRe, leftIm));
    }

    /// <summary>Puts theta and phi together from right and left: θ = (R + L)/√2, φ = −j (R − L)/√2.</summary>
    /// <param name="right">Right-hand component with phase.</param>
    /// <param name="left">Left-hand component with phase, over the same samples.</param>
    /// <returns>The theta and the phi component, over the same samples.</returns>
    /// <exception cref="ArgumentException">A phase is missing or the lengths differ.</exception>
    public static (PatternChannel Theta, PatternChannel Phi) ToLinear(PatternChannel right, PatternChannel left)
    {
        var (rightRe, rightIm, leftRe, leftIm) = Planes(right, left);
        var n = rightRe.Length;
        var (thetaRe, thetaIm, phiRe, phiIm) = (new double[n], new double[n], new double[n], new double[n]);
        for (var i = 0; i < n; i++)
        {
            thetaRe[i] = (rightRe[i] + leftRe[i]) * InverseRootTwo;
            thetaIm[i] = (rightIm[i] + leftIm[i]) * InverseRootTwo;
            phiRe[i] = (rightIm[i] - leftIm[i]) * InverseRootTwo;
            phiIm[i] = (leftRe[i] - rightRe[i]) * InverseRootTwo;
        }

        return (new(thetaRe, thetaIm), new(phiRe, phiIm));
    }

    private static (double[] FirstRe, double[] FirstIm, double[] SecondRe, double[] SecondIm) Planes(PatternChannel first, PatternChannel second)
    {
        ArgumentNullException.ThrowIfNull(first);
        ArgumentNullException.ThrowIfNull(second);
        if (first.Im is not { } firstIm || second.Im is not { } secondIm)
        {
            throw new ArgumentException("Both components need a phase.", nameof(first));
        }

        return first.Re.Length == second.Re.Length
            ? (first.Re, firstIm, second.Re, secondIm)
            : throw new ArgumentException("The components must run over the same samples.", nameof(second));
    }
}
