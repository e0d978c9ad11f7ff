using System.Numerics;
using RangeReduce.Networks;
using RangeReduce.Numerics;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>The reflection coefficient of one port over frequency, and between its samples.</summary>
public sealed class ReflectionCurve
{
    private readonly double[] _re;
    private readonly double[] _im;
    private readonly double[] _power;

    /// <summary>Takes one port of a sweep.</summary>
    /// <param name="sweep">The sweep.</param>
    /// <param name="port">Port, counted from 0.</param>
    public ReflectionCurve(NetworkSweep sweep, int port)
    {
        ArgumentNullException.ThrowIfNull(sweep);
        (FrequencyHz, HasPhase, ReferenceOhm) = (sweep.FrequencyHz, sweep.HasPhase, sweep.ReferenceOhm[port]);
        (_re, _im) = (new double[sweep.Count], new double[sweep.Count]);
        Magnitude = new double[sweep.Count];
        _power = new double[sweep.Count];
        for (var i = 0; i < sweep.Count; i++)
        {
            var reflection = sweep[i, port, port];
            (_re[i], _im[i], Magnitude[i]) = (reflection.Real, reflection.Imaginary, reflection.Magnitude);
            _power[i] = Magnitude[i] * Magnitude[i];
        }
    }

    /// <summary>Takes a reflection coefficient as it is; the arrays are kept, not copied.</summary>
    /// <param name="frequencyHz">Frequencies in hertz, strictly rising.</param>
    /// <param name="re">Real parts, as many.</param>
    /// <param name="im">Imaginary parts, as many.</param>
    /// <param name="referenceOhm">Reference impedance in ohm.</param>
    public ReflectionCurve(double[] frequencyHz, double[] re, double[] im, double referenceOhm)
    {
        ArgumentNullException.ThrowIfNull(frequencyHz);
        ArgumentNullException.ThrowIfNull(re);
        ArgumentNullException.ThrowIfNull(im);
        (FrequencyHz, _re, _im, ReferenceOhm, HasPhase) = (frequencyHz, re, im, referenceOhm, true);
        (Magnitude, _power) = (new double[frequencyHz.Length], new double[frequencyHz.Length]);
        for (var i = 0; i < Magnitude.Length; i++)
        {
            _power[i] = (re[i] * re[i]) + (im[i] * im[i]);
            Magnitude[i] = Math.Sqrt(_power[i]);
        }
    }

    /// <summary>Gets the frequencies in hertz.</summary>
    public double[] FrequencyHz { get; }

    /// <summary>Gets |Γ| at the samples.</summary>
    public double[] Magnitude { get; }

    /// <summary>Gets the real parts at the samples; magnitudes where there is no phase.</summary>
    public double[] Re => _re;

    /// <summary>Gets the imaginary parts at the samples; zeros where there is no phase.</summary>
    public double[] Im => _im;

    /// <summary>Gets whether the phase is known.</summary>
    public bool HasPhase { get; }

    /// <summary>Gets the reference impedance in ohm.</summary>
    public double ReferenceOhm { get; }

    /// <summary>Gives Γ at a sample; a real magnitude where there is no phase.</summary>
    public Complex this[int sample] => HasPhase ? new Complex(_re[sample], _im[sample]) : Magnitude[sample];

    /// <summary>Gives Γ between a sample and the next one, by a cubic in real and imaginary part.</summary>
    /// <remarks>
    /// Real and imaginary part are smooth through a resonance where |Γ| has a sharp dip and its decibels a pole. Where there is no phase, |Γ|² is interpolated,
    /// which is smooth too, and its root given as a real number: 0 where the cubic runs below zero, a dip deeper than the samples can tell.
    /// </remarks>
    public Complex Between(int segment, double frequencyHz) => HasPhase
        ? new Complex(LocalCubic.Interpolate(FrequencyHz, _re, segment, frequencyHz), LocalCubic.Interpolate(FrequencyHz, _im, segment, frequencyHz))
        : Math.Sqrt(Math.Max(0.0, LocalCubic.Interpolate(FrequencyHz, _power, segment, frequencyHz)));

    /// <summary>Gives |Γ| between a sample and the next one.</summary>
    public double MagnitudeBetween(int segment, double frequencyHz) => Between(segment, frequencyHz).Magnitude;
}
