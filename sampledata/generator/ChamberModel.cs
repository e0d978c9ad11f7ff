using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>What the chamber makes of a field: m = A(f) (D(n) P F e(theta) + s(f, theta)) + noise. The README of the sample data explains each letter.</summary>
internal static class ChamberModel
{
    /// <summary>Level of the receiver for 0 dBi at 1.62 GHz.</summary>
    public const double ReceiverScaleDb = -51.4;

    /// <summary>Slope of that level over 100 MHz, out of path loss and cables.</summary>
    public const double ReceiverSlopeDb = -0.9;

    /// <summary>Electrical length of range and cables.</summary>
    public const double PathM = 16.84;

    /// <summary>Noise of the receiver (root mean square), about 75 dB under the peak of the states that radiate.</summary>
    public const double NoiseLevelDb = -120.0;

    /// <summary>Stray path off a wall, against the largest field of the state at the frequency.</summary>
    public const double StrayDb = -40.0;

    /// <summary>Loss of the jumper between the cable of the chamber and the antenna at 1.62 GHz; the gain standard is connected without it.</summary>
    public const double FeedLineLossDb = 0.30;

    /// <summary>Drift of the level from the first to the last angle of a cut.</summary>
    public const double DriftDb = 0.05;

    /// <summary>Drift of the phase from the first to the last angle of a cut.</summary>
    public const double DriftDeg = 0.5;

    /// <summary>Gives the scale of the receiver with the phase of the range.</summary>
    public static Complex Receiver(double frequencyHz) =>
        Phasor.Of(ReceiverScaleDb + (ReceiverSlopeDb * (frequencyHz - 1.62e9) / 1e8), 0.0) * Phasor.Delay(frequencyHz, PathM);

    /// <summary>Measures one cut of an antenna.</summary>
    /// <param name="antenna">The antenna as built.</param>
    /// <param name="cut">Index of the cut.</param>
    /// <param name="probe">The probe.</param>
    /// <param name="noise">Noise of the file.</param>
    /// <returns>Readings over [frequency, angle].</returns>
    public static Jones[,] Measure(SimulatedAntenna antenna, int cut, Probe probe, SeededNoise noise)
    {
        var readings = new Jones[antenna.PatternHz.Length, SimulatedAntenna.AngleDeg.Length];
        for (var f = 0; f < antenna.PatternHz.Length; f++)
        {
            var hertz = antenna.PatternHz[f];
            var (receiver, feedLine) = (Receiver(hertz), Phasor.Of(-FeedLineLossDb * Math.Sqrt(hertz / 1.62e9), 0.0));
            var strongest = Math.Sqrt(antenna.Realized.Cast<Jones>().Where((_, index) => index / (SimulatedAntenna.CutPhiDeg.Length * SimulatedAntenna.AngleDeg.Length) == f).Max(field => field.Power));
            for (var n = 0; n < SimulatedAntenna.AngleDeg.Length; n++)
            {
                var elapsed = (double)n / (SimulatedAntenna.AngleDeg.Length - 1);
                var direct = probe.Read(antenna.Realized[f, cut, n]) * (feedLine * Phasor.Of(DriftDb * elapsed, DriftDeg * elapsed));
                var stray = Stray(hertz, SimulatedAntenna.AngleDeg[n], SimulatedAntenna.CutPhiDeg[cut]) * (feedLine * strongest);
                readings[f, n] = new(
                    (receiver * (direct.First + stray.First)) + noise.Next(Phasor.Of(NoiseLevelDb, 0.0).Real),
                    (receiver * (direct.Second + stray.Second)) + noise.Next(Phasor.Of(NoiseLevelDb, 0.0).Real));
            }
        }

        return readings;
    }

    /// <summary>Reads the gain standard at one frequency.</summary>
    /// <param name="frequencyHz">Frequency.</param>
    /// <param name="rollDeg">Angle of its field from theta towards phi.</param>
    /// <param name="probe">The probe.</param>
    /// <param name="noise">Noise of the file.</param>
    public static Jones MeasureStandard(double frequencyHz, double rollDeg, Probe probe, SeededNoise noise)
    {
        var amplitude = Phasor.Of(GainStandardHorn.TrueGainDbi(frequencyHz), 0.0);
        var field = new Jones(amplitude * Math.Round(Math.Cos(rollDeg * Math.PI / 180.0), 12), amplitude * Math.Round(Math.Sin(rollDeg * Math.PI / 180.0), 12));
        var reading = probe.Read(field) * Receiver(frequencyHz);
        return new(reading.First + noise.Next(Phasor.Of(NoiseLevelDb, 0.0).Real), reading.Second + noise.Next(Phasor.Of(NoiseLevelDb, 0.0).Real));
    }

    // A wall scatters; the excess path changes as the antenna and its support turn.
    private static Jones Stray(double frequencyHz, double angleDeg, double phiDeg)
    {
        var excessM = 3.1 + (0.55 * Math.Cos((angleDeg - 35.0 - (phiDeg / 3.0)) * Math.PI / 180.0));
        var phasor = Phasor.Of(StrayDb, 0.0) * Phasor.Delay(frequencyHz, excessM);
        return new(phasor * Phasor.Of(0.0, 20.0), phasor * Phasor.Of(-2.0, 160.0));
    }
}
