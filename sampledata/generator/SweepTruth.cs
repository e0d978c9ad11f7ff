using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>Figures of a reflection sweep: resonance by a parabola through the square of the magnitude, edges of the 10 dB band by straight lines through the magnitude.</summary>
/// <param name="ResonanceHz">Frequency of the least reflection.</param>
/// <param name="ReturnLossDb">Return loss there.</param>
/// <param name="BandLowHz">Lower edge of the 10 dB band; NaN where there is none.</param>
/// <param name="BandHighHz">Upper edge.</param>
internal sealed record SweepTruth(double ResonanceHz, double ReturnLossDb, double BandLowHz, double BandHighHz)
{
    private static readonly double Threshold = Math.Pow(10.0, -0.5);

    /// <summary>Reads the figures off a sweep.</summary>
    public static SweepTruth Of(double[] frequencyHz, Complex[] reflection)
    {
        var magnitude = Array.ConvertAll(reflection, Complex.Abs);
        var least = Array.IndexOf(magnitude, magnitude.Min());
        var (resonance, power) = (frequencyHz[least], magnitude[least] * magnitude[least]);
        if (least > 0 && least < magnitude.Length - 1)
        {
            var (before, after) = (magnitude[least - 1] * magnitude[least - 1], magnitude[least + 1] * magnitude[least + 1]);
            var offset = (before - after) / (2.0 * (before - (2.0 * power) + after));
            (resonance, power) = (resonance + (offset * (frequencyHz[least + 1] - frequencyHz[least])), power - ((before - after) * offset / 4.0));
        }

        return new(resonance, -10.0 * Math.Log10(power), Edge(-1), Edge(1));

        double Edge(int step)
        {
            for (var i = least; magnitude[least] <= Threshold && i + step >= 0 && i + step < magnitude.Length; i += step)
            {
                if (magnitude[i + step] > Threshold)
                {
                    return frequencyHz[i] + ((frequencyHz[i + step] - frequencyHz[i]) * (Threshold - magnitude[i]) / (magnitude[i + step] - magnitude[i]));
                }
            }

            return double.NaN;
        }
    }
}
