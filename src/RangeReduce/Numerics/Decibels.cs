namespace RangeReduce.Numerics;

/// <summary>Decibels of powers and amplitudes.</summary>
public static class Decibels
{
    /// <summary>The drop of half power, 10 lg 2 = 3.0103 dB.</summary>
    public const double HalfPower = 3.010299956639812;

    /// <summary>Gives 10 lg of a power ratio; −∞ for zero, NaN for NaN.</summary>
    public static double OfPower(double power) => 10.0 * Math.Log10(power);

    /// <summary>Gives 20 lg of an amplitude ratio; −∞ for zero, NaN for NaN.</summary>
    public static double OfAmplitude(double amplitude) => 20.0 * Math.Log10(amplitude);

    /// <summary>Gives the power ratio of a number of decibels.</summary>
    public static double ToPower(double decibels) => Math.Pow(10.0, decibels / 10.0);

    /// <summary>Gives the amplitude ratio of a number of decibels.</summary>
    public static double ToAmplitude(double decibels) => Math.Pow(10.0, decibels / 20.0);
}
