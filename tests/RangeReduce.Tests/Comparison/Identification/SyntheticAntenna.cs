using System.Numerics;
using MathNet.Numerics.Distributions;
using RangeReduce.Networks;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Tests.Comparison.Identification;

/// <summary>An invented switched antenna whose reflection is known in closed form: resonances in front of a line, with a cable and noise of our choice.</summary>
internal sealed class SyntheticAntenna(int seed)
{
    internal static readonly string[] Known = ["left", "right", "stowed"];
    internal static readonly string[] Unseen = ["half-deployed", "contact-missing", "other-load"];
    internal static readonly double[] Axis = [.. Enumerable.Range(0, 401).Select(n => 1.2e9 + (2.5e6 * n))];

    private readonly Random _random = new(seed);

    internal static Complex Reflection(string state, double hz) => Line(hz, 1.2e-9) * (state switch
    {
        "right" => 1.0 - Resonance(hz, 1.585e9, 14.0, 0.9) - Resonance(hz, 1.655e9, 16.0, 0.75),
        "left" => 1.0 - Resonance(hz, 1.580e9, 14.0, 0.85) - Resonance(hz, 1.662e9, 16.0, 0.8),
        "stowed" => 0.97 - Resonance(hz, 1.42e9, 40.0, 0.25),
        "half-deployed" => 1.0 - Resonance(hz, 1.640e9, 14.0, 0.9) - Resonance(hz, 1.72e9, 16.0, 0.7),
        "contact-missing" => 0.99 - Resonance(hz, 1.95e9, 30.0, 0.1),
        "other-load" => 0.3 - Resonance(hz, 1.62e9, 8.0, 0.3),
        _ => throw new ArgumentOutOfRangeException(nameof(state), state, "There is no such state."),
    });

    /// <summary>Gives a sweep with a new cable and new noise; correlation is that of neighbouring points.</summary>
    internal NetworkSweep Sweep(string state, double noise, double[]? axis = null, bool hasPhase = true, double cableSeconds = 2e-9, double correlation = 0.0)
    {
        axis ??= Axis;
        var (delay, phase) = (cableSeconds * ((2.0 * _random.NextDouble()) - 1.0), cableSeconds > 0.0 ? 2.0 * Math.PI * _random.NextDouble() : 0.0);
        var (re, im, drift) = (new double[axis.Length], new double[axis.Length], Noise(noise));
        for (var n = 0; n < axis.Length; n++)
        {
            drift = (correlation * drift) + (Math.Sqrt(1.0 - (correlation * correlation)) * Noise(noise));
            var value = (Reflection(state, axis[n]) * Line(axis[n], delay) * Complex.FromPolarCoordinates(1.0, phase)) + drift;
            (re[n], im[n]) = hasPhase ? (value.Real, value.Imaginary) : (value.Magnitude, 0.0);
        }

        return new NetworkSweep(axis, 1, [50.0], re, im) { HasPhase = hasPhase };
    }

    /// <summary>Gives the repeats of the known states as the sweeps of a run.</summary>
    internal StateSweep[] Run(int repeats, double noise, bool hasPhase = true, double correlation = 0.0) =>
        [.. from state in Known from repeat in Enumerable.Range(1, repeats) select new StateSweep($"{state}-{repeat}", state, DataSource.Measured, Sweep(state, noise, hasPhase: hasPhase, correlation: correlation))];

    private static Complex Line(double hz, double seconds) => Complex.FromPolarCoordinates(1.0, -2.0 * Math.PI * hz * seconds);

    private static Complex Resonance(double hz, double centre, double quality, double depth) => depth / new Complex(1.0, quality * ((hz / centre) - (centre / hz)));

    private Complex Noise(double deviation) => new(Normal.Sample(_random, 0.0, deviation), Normal.Sample(_random, 0.0, deviation));
}
