using System.Globalization;
using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>One state of the antenna as NEC-2 gives it: a reflection sweep and three cuts.</summary>
/// <remarks>Fields are indexed [frequency, cut, angle]; their sign beyond theta = 0 is that of the continuous frame of the cut.</remarks>
internal sealed class SimulatedAntenna
{
    /// <summary>Reference impedance of all reflection coefficients.</summary>
    public const double ReferenceOhm = 50.0;

    /// <summary>Step of the angle along a cut, from -180 to 180 degrees.</summary>
    public const int AngleStepDeg = 2;

    private const double FreeSpaceOhm = 376.730313668;
    private const int SweepPoints = 401;

    private SimulatedAntenna(List<NecFrequency> run)
    {
        var (sweep, pattern) = (run.Take(SweepPoints).ToArray(), run.Skip(SweepPoints).ToArray());
        SweepHz = Array.ConvertAll(sweep, point => point.FrequencyHz);
        Reflection = Array.ConvertAll(sweep, ReflectionOf);
        PatternHz = Array.ConvertAll(pattern, point => point.FrequencyHz);
        (Gain, Realized) = (new Jones[pattern.Length, CutPhiDeg.Length, AngleDeg.Length], new Jones[pattern.Length, CutPhiDeg.Length, AngleDeg.Length]);
        for (var f = 0; f < pattern.Length; f++)
        {
            Fill(pattern[f], f);
        }
    }

    /// <summary>Gets phi of the cuts.</summary>
    public static int[] CutPhiDeg { get; } = [0, 45, 90];

    /// <summary>Gets the angles along a cut; the turn is closed, so the last repeats the first.</summary>
    public static int[] AngleDeg { get; } = [.. Enumerable.Range(0, (360 / AngleStepDeg) + 1).Select(i => -180 + (i * AngleStepDeg))];

    /// <summary>Gets the cards that ask NEC-2 for all this: 1.2 to 2.2 GHz by 2.5 MHz at the feed, 1.52 to 1.72 GHz by 20 MHz in the far field.</summary>
    public static string[] ControlCards { get; } = ["FR 0 401 0 0 1200 2.5", "XQ 0", "FR 0 11 0 0 1520 20", "RP 0 181 3 1000 -180 0 2 45"];

    /// <summary>Gets the index of the angle of the axis.</summary>
    public static int AxisIndex => AngleDeg.Length / 2;

    /// <summary>Gets the frequencies of the sweep.</summary>
    public double[] SweepHz { get; }

    /// <summary>Gets the reflection coefficient over the sweep.</summary>
    public Complex[] Reflection { get; }

    /// <summary>Gets the frequencies of the cuts.</summary>
    public double[] PatternHz { get; }

    /// <summary>Gets the field as an amplitude whose square is the partial gain (over the power accepted).</summary>
    public Jones[,,] Gain { get; }

    /// <summary>Gets the field as an amplitude whose square is the partial realized gain (over the power available).</summary>
    public Jones[,,] Realized { get; }

    /// <summary>Runs NEC-2 on a geometry.</summary>
    public static SimulatedAntenna Of(string deck) => new(NecRun.Run(deck));

    private static Complex ReflectionOf(NecFrequency point) => (point.ImpedanceOhm - ReferenceOhm) / (point.ImpedanceOhm + ReferenceOhm);

    // U = |rE|^2/(2 eta); gain = 4 pi U over the power accepted. With a wave of amplitude 1 incident on the port, the 1 V of the deck is 1 + reflection.
    private void Fill(NecFrequency point, int f)
    {
        var accepted = Math.Sqrt(4.0 * Math.PI / (2.0 * FreeSpaceOhm * point.InputPowerW));
        var available = (Complex.One + ReflectionOf(point)) * Math.Sqrt(4.0 * Math.PI * ReferenceOhm / FreeSpaceOhm);
        for (var i = 0; i < point.Directions.Count; i++)
        {
            var direction = point.Directions[i];
            var field = new Jones(direction.ETheta, direction.EPhi);
            var (cut, angle) = (i / AngleDeg.Length, i % AngleDeg.Length);
            (Gain[f, cut, angle], Realized[f, cut, angle]) = (field * accepted, field * available);
            CheckAgainstPrint(direction, Gain[f, cut, angle]);
        }
    }

    private static void CheckAgainstPrint(NecDirection direction, Jones gain)
    {
        var difference = (10.0 * Math.Log10(gain.Power)) - direction.GainTotalDb;
        if (direction.GainTotalDb > -60.0 && Math.Abs(difference) > 0.02)
        {
            throw new InvalidOperationException(string.Create(CultureInfo.InvariantCulture, $"Gain out of the field is {difference:0.000} dB off the gain that NEC-2 prints at theta {direction.ThetaDeg}."));
        }
    }
}
