using RangeReduce.Numerics;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>The band about the highest gain on the axis inside which the gain is at most 1 dB or 3 dB below it.</summary>
internal static class GainBandFigure
{
    private static readonly double[] ThresholdsDb = [1.0, 3.0];

    /// <summary>Gives the bands, edges by a cubic between frequencies; none where fewer than three frequencies have a gain.</summary>
    /// <param name="frequencyHz">Frequencies in hertz, strictly rising.</param>
    /// <param name="gainDb">Gain of the co-polar component on the axis in dBi, one a frequency.</param>
    public static IEnumerable<(double ThresholdDb, Band Band)> Of(double[] frequencyHz, double[] gainDb)
    {
        if (gainDb.Count(double.IsFinite) < 3)
        {
            yield break;
        }

        var peak = 0;
        for (var i = 1; i < gainDb.Length; i++)
        {
            peak = double.IsFinite(gainDb[i]) && !(gainDb[i] <= gainDb[peak]) ? i : peak;
        }

        double[] under = [.. gainDb.Select(gain => gainDb[peak] - gain)];
        foreach (var threshold in ThresholdsDb)
        {
            yield return (threshold, BandFinder.AtMost(frequencyHz, under, threshold).First(band => band.Contains(frequencyHz[peak])));
        }
    }

    /// <summary>Makes the figure of a band; all other keys are those of the gain on the axis.</summary>
    public static Figure Make(Figure gain, double thresholdDb, Band band) => gain with
    {
        Quantity = QuantityCatalogue.GainBand,
        Value = band.Width,
        FrequencyHz = null,
        LowHz = band.Low,
        HighHz = band.High,
        Threshold = thresholdDb,
        Open = band.Open,
    };
}
