using System.Numerics;

namespace RangeReduce.Networks;

/// <summary>Scattering parameters over frequency, as planar arrays.</summary>
public sealed class NetworkSweep
{
    /// <summary>Takes over the arrays; the caller must not change them afterwards.</summary>
    /// <param name="frequencyHz">Frequencies in hertz, strictly rising.</param>
    /// <param name="ports">Number of ports.</param>
    /// <param name="referenceOhm">Real reference impedance in ohm, one a port.</param>
    /// <param name="re">Real parts, [frequency, row, column] in row-major order.</param>
    /// <param name="im">Imaginary parts, in the same order.</param>
    /// <exception cref="ArgumentException">The lengths do not fit each other.</exception>
    public NetworkSweep(double[] frequencyHz, int ports, double[] referenceOhm, double[] re, double[] im)
    {
        ArgumentNullException.ThrowIfNull(frequencyHz);
        ArgumentNullException.ThrowIfNull(referenceOhm);
        ArgumentNullException.ThrowIfNull(re);
        ArgumentNullException.ThrowIfNull(im);
        ArgumentOutOfRangeException.ThrowIfLessThan(ports, 1);
        var cells = (long)frequencyHz.Length * ports * ports;
        if (re.Length != cells || im.Length != cells || referenceOhm.Length != ports)
        {
            throw new ArgumentException($"A sweep of {frequencyHz.Length} points and {ports} ports needs {cells} values and {ports} references.", nameof(re));
        }

        (FrequencyHz, Ports, ReferenceOhm, Re, Im) = (frequencyHz, ports, referenceOhm, re, im);
    }

    /// <summary>Gets the frequencies in hertz, strictly rising.</summary>
    public double[] FrequencyHz { get; }

    /// <summary>Gets the number of ports.</summary>
    public int Ports { get; }

    /// <summary>Gets the real reference impedance in ohm, one a port.</summary>
    public double[] ReferenceOhm { get; }

    /// <summary>Gets the real parts, [frequency, row, column] in row-major order.</summary>
    public double[] Re { get; }

    /// <summary>Gets the imaginary parts, [frequency, row, column] in row-major order.</summary>
    public double[] Im { get; }

    /// <summary>Gets whether the phase was recorded; where it was not, <see cref="Re"/> holds magnitudes and <see cref="Im"/> zeros.</summary>
    public bool HasPhase { get; init; } = true;

    /// <summary>Gives the number of frequency points.</summary>
    public int Count => FrequencyHz.Length;

    /// <summary>Gives one scattering parameter; row and column count from 0, so S11 is (0, 0).</summary>
    public Complex this[int frequency, int row, int column]
    {
        get
        {
            var at = (((frequency * Ports) + row) * Ports) + column;
            return new(Re[at], Im[at]);
        }
    }
}
