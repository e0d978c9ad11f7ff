using System.Numerics;
using RangeReduce.Networks;

namespace RangeReduce.Tests.Synthetic;

/// <summary>Sweeps out of closed forms.</summary>
internal static class SyntheticSweep
{
    /// <summary>Frequencies from first to last, both included.</summary>
    public static double[] Grid(double first, double last, double step) =>
        [.. Enumerable.Range(0, (int)Math.Round((last - first) / step) + 1).Select(i => first + (i * step))];

    /// <summary>A one-port sweep in 50 ohm.</summary>
    public static NetworkSweep Of(double[] frequencyHz, Func<double, Complex> reflection)
    {
        var samples = Array.ConvertAll(frequencyHz, hertz => reflection(hertz));
        return new(frequencyHz, 1, [50.0], Array.ConvertAll(samples, sample => sample.Real), Array.ConvertAll(samples, sample => sample.Imaginary));
    }

    /// <summary>The same sweep with the phase taken away.</summary>
    public static NetworkSweep WithoutPhase(this NetworkSweep sweep) =>
        new(sweep.FrequencyHz, 1, [50.0], [.. Enumerable.Range(0, sweep.Count).Select(i => sweep[i, 0, 0].Magnitude)], new double[sweep.Count]) { HasPhase = false };

    /// <summary>Reflection of a series resonator R (1 + jQ (f/f0 − f0/f)) in 50 ohm.</summary>
    public static Func<double, Complex> Resonator(double resonanceHz, double quality, double resistanceOhm = 50.0) => hertz =>
    {
        var impedance = new Complex(resistanceOhm, resistanceOhm * quality * ((hertz / resonanceHz) - (resonanceHz / hertz)));
        return (impedance - 50.0) / (impedance + 50.0);
    };
}
