using System.Numerics;

namespace RangeReduce.Networks;

/// <summary>What a reflection coefficient says about a match (IEEE Std 145).</summary>
public static class Reflection
{
    /// <summary>Gives the return loss −20 lg |Γ| in dB: positive for a passive antenna, +∞ for a perfect match.</summary>
    public static double ReturnLossDb(double magnitude) => 20.0 * Math.Log10(1.0 / magnitude);

    /// <summary>Gives |Γ| of a return loss in dB.</summary>
    public static double MagnitudeOfReturnLoss(double returnLossDb) => Math.Pow(10.0, -returnLossDb / 20.0);

    /// <summary>Gives (1 + |Γ|)/(1 − |Γ|); +∞ at |Γ| = 1, NaN above it, where it has no meaning.</summary>
    public static double Vswr(double magnitude) => magnitude > 1.0 ? double.NaN : (1.0 + magnitude) / (1.0 - magnitude);

    /// <summary>Gives |Γ| of a voltage standing wave ratio.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is below 1.</exception>
    public static double MagnitudeOfVswr(double vswr)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(vswr, 1.0);
        return double.IsPositiveInfinity(vswr) ? 1.0 : (vswr - 1.0) / (vswr + 1.0);
    }

    /// <summary>Gives −10 lg (1 − |Γ|²) in dB, against a generator of the reference impedance; +∞ at |Γ| = 1, NaN above it.</summary>
    public static double MismatchLossDb(double magnitude) => magnitude > 1.0 ? double.NaN : 10.0 * Math.Log10(1.0 / (1.0 - (magnitude * magnitude)));

    /// <summary>Gives the impedance Z = Z0 (1 + Γ)/(1 − Γ) in ohm.</summary>
    public static Complex ImpedanceOhm(Complex reflection, double referenceOhm) => referenceOhm * (1.0 + reflection) / (1.0 - reflection);
}
