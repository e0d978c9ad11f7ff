using System.Numerics;

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

    /// <summary>Gives 10 lg of many power ratios at once; within a few units of the last place of the scalar function.</summary>
    /// <param name="powers">Power ratios.</param>
    /// <param name="levels">Takes the decibels; as long as <paramref name="powers"/>, and may be the same memory.</param>
    public static void OfPowers(ReadOnlySpan<double> powers, Span<double> levels)
    {
        // 10 lg x = 10 lg 2 · lb x, and only lb has a vector form.
        var factor = new Vector<double>(HalfPower);
        var i = 0;
        for (; i <= powers.Length - Vector<double>.Count; i += Vector<double>.Count)
        {
            (factor * Vector.Log2(new Vector<double>(powers[i..]))).CopyTo(levels[i..]);
        }

        for (; i < powers.Length; i++)
        {
            levels[i] = HalfPower * Math.Log2(powers[i]);
        }
    }
}
