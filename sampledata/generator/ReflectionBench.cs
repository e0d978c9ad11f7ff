using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>What a calibrated network analyser makes of a reflection coefficient: the loss of a pigtail, a residue of the calibration, noise.</summary>
internal static class ReflectionBench
{
    /// <summary>Loss, one way, of the pigtail behind the calibration plane; its phase is taken out by port extension.</summary>
    public const double PigtailLossDb = 0.05;

    /// <summary>Residual directivity.</summary>
    public const double RippleDb = -60.0;

    /// <summary>Noise (root mean square).</summary>
    public const double NoiseDb = -70.0;

    private const double RippleM = 2.4;

    /// <summary>Measures a sweep.</summary>
    public static Complex[] Measure(SimulatedAntenna antenna, SeededNoise noise) =>
    [
        .. antenna.SweepHz.Zip(antenna.Reflection, (hertz, reflection) =>
            (reflection * Phasor.Of(-2.0 * PigtailLossDb, 0.0)) + (Phasor.Of(RippleDb, 65.0) * Phasor.Delay(hertz, RippleM)) + noise.Next(Phasor.Of(NoiseDb, 0.0).Real)),
    ];
}
