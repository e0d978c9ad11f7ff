using System.Numerics;
using RangeReduce.Patterns;

namespace RangeReduce.Tests.Synthetic;

/// <summary>Cuts out of closed forms: fields as functions of frequency and angle.</summary>
internal static class SyntheticCut
{
    public const double Ghz = 1e9;

    /// <summary>Angles from first to last, both included.</summary>
    public static double[] Grid(double first, double last, double step) =>
        [.. Enumerable.Range(0, (int)Math.Round((last - first) / step) + 1).Select(i => first + (i * step))];

    /// <summary>A dual-linear cut with phase at 1 GHz.</summary>
    public static PatternCut Linear(double[] angleDeg, Func<double, Complex> theta, Func<double, Complex> phi) =>
        Complex(PolarizationBasis.ThetaPhi, [Ghz], angleDeg, (_, at) => theta(at), (_, at) => phi(at));

    /// <summary>A dual-circular cut with phase at 1 GHz.</summary>
    public static PatternCut Circular(double[] angleDeg, Func<double, Complex> right, Func<double, Complex> left) =>
        Complex(PolarizationBasis.RightLeft, [Ghz], angleDeg, (_, at) => right(at), (_, at) => left(at));

    /// <summary>A linearly polarized cut whose amplitude is the square root of a power pattern.</summary>
    public static PatternCut OfPower(double[] angleDeg, Func<double, double> power) =>
        Linear(angleDeg, at => Math.Sqrt(power(at)), _ => 0.0);

    /// <summary>A cut with phase over several frequencies.</summary>
    public static PatternCut Complex(PolarizationBasis basis, double[] frequencyHz, double[] angleDeg, Func<double, double, Complex> first, Func<double, double, Complex> second) => new()
    {
        Axis = CutAxis.Theta,
        FixedDeg = 0.0,
        FrequencyHz = frequencyHz,
        AngleDeg = angleDeg,
        Basis = basis,
        First = Sampled(frequencyHz, angleDeg, first),
        Second = Sampled(frequencyHz, angleDeg, second),
    };

    /// <summary>Samples a field over [frequency, angle].</summary>
    public static PatternChannel Sampled(double[] frequencyHz, double[] angleDeg, Func<double, double, Complex> field)
    {
        Complex[] samples = [.. frequencyHz.SelectMany(hertz => angleDeg.Select(at => field(hertz, at)))];
        return new(Array.ConvertAll(samples, sample => sample.Real), Array.ConvertAll(samples, sample => sample.Imaginary));
    }

    /// <summary>Leaves the amplitudes and takes the phase away.</summary>
    public static PatternCut WithoutPhase(this PatternCut cut)
    {
        return cut with { First = Amplitudes(cut.First), Second = Amplitudes(cut.Second) };

        static PatternChannel? Amplitudes(PatternChannel? channel) =>
            channel is null ? null : new([.. Enumerable.Range(0, channel.Re.Length).Select(i => Math.Sqrt(channel.Power(i)))], null);
    }

    /// <summary>Takes samples away: they become NaN in both components.</summary>
    public static PatternCut Without(this PatternCut cut, params int[] samples)
    {
        return cut with { First = Holed(cut.First), Second = Holed(cut.Second) };

        PatternChannel? Holed(PatternChannel? channel)
        {
            return channel is null ? null : new(Plane(channel.Re)!, Plane(channel.Im));

            double[]? Plane(double[]? plane) => plane is null ? null : [.. plane.Select((value, i) => samples.Contains(i) ? double.NaN : value)];
        }
    }
}
