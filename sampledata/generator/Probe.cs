using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>The range antenna with its two ports: how they turn the two components of the field into two readings.</summary>
/// <param name="FirstName">Heading of the first port.</param>
/// <param name="SecondName">Heading of the second port.</param>
/// <param name="IsCircular">Whether the ports take right and left hand; if not, theta and phi.</param>
/// <param name="Balance">What the second port has more than the first, as a complex factor.</param>
/// <param name="LeakIntoFirst">Share of the second component in the first port.</param>
/// <param name="LeakIntoSecond">Share of the first component in the second port.</param>
internal sealed record Probe(string FirstName, string SecondName, bool IsCircular, Complex Balance, Complex LeakIntoFirst, Complex LeakIntoSecond)
{
    /// <summary>Gets the dual-linear probe: 0.3 dB and 2 degrees between the ports, leakage of -35 dB.</summary>
    public static Probe Linear { get; } = new("H", "V", IsCircular: false, Phasor.Of(-0.3, 2.0), Phasor.Of(-35.0, 40.0), Phasor.Of(-35.0, -110.0));

    /// <summary>Gets the dual-circular probe: 0.4 dB and 5 degrees between the ports, leakage of -32 dB (an axial ratio of the ports of 0.44 dB).</summary>
    public static Probe Circular { get; } = new("Right", "Left", IsCircular: true, Phasor.Of(-0.4, 5.0), Phasor.Of(-32.0, 75.0), Phasor.Of(-32.0, -20.0));

    /// <summary>Gives what the two ports take of a field.</summary>
    public Jones Read(Jones field)
    {
        var (first, second) = IsCircular ? (field.Right, field.Left) : (field.First, field.Second);
        return new(first + (LeakIntoFirst * second), Balance * (second + (LeakIntoSecond * first)));
    }
}
