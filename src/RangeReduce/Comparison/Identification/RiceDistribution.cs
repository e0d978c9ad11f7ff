using MathNet.Numerics;

namespace RangeReduce.Comparison.Identification;

/// <summary>Mean and variance of the magnitude of a complex value with normal noise (Rice 1945).</summary>
internal static class RiceDistribution
{
    internal static (double Mean, double Variance) Moments(double magnitude, double deviation)
    {
        var square = magnitude * magnitude;
        var ratio = square / (2.0 * deviation * deviation);

        // Far above the noise the Bessel form is 0/0 in numbers, and the series in 1/ratio is exact.
        var mean = ratio > 300.0
            ? magnitude * (1.0 + (1.0 / (4.0 * ratio)) + (1.0 / (32.0 * ratio * ratio)))
            : deviation * Math.Sqrt(Math.PI / 2.0) * Math.Exp(-0.5 * ratio) * (((1.0 + ratio) * SpecialFunctions.BesselI0(0.5 * ratio)) + (ratio * SpecialFunctions.BesselI1(0.5 * ratio)));
        return (mean, ratio > 300.0 ? deviation * deviation * (1.0 - (1.0 / (4.0 * ratio))) : square + (2.0 * deviation * deviation) - (mean * mean));
    }
}
