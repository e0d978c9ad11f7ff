using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Turns the parts of a channel into real and imaginary parts, in place.</summary>
internal static class SampleConversion
{
    /// <summary>Nepers of amplitude in a decibel: ln(10) / 20.</summary>
    private const double NeperPerDecibel = 0.11512925464970228420;

    /// <summary>Makes a channel out of one part (amplitudes) or two (level and phase, or real and imaginary); the arrays are taken over and changed.</summary>
    public static PatternChannel ToChannel(IEnumerable<(ChannelPart Part, double[] Values)> parts)
    {
        double[]? size = null;
        double[]? second = null;
        var isPolar = false;
        foreach (var (part, values) in parts)
        {
            switch (part)
            {
                case ChannelPart.Real:
                    size = values;
                    break;
                case ChannelPart.Imaginary:
                    second = values;
                    break;
                case ChannelPart.Phase:
                    (second, isPolar) = (values, true);
                    break;
                default:
                    size = values;
                    ToAmplitude(part, values);
                    break;
            }
        }

        if (isPolar)
        {
            ToRectangular(size!, second!);
        }
        else if (second is not null)
        {
            JoinGaps(size!, second);
        }

        return new(size!, second);
    }

    /// <summary>Turns levels, powers, return losses or standing wave ratios into amplitudes.</summary>
    public static void ToAmplitude(ChannelPart part, Span<double> values)
    {
        switch (part)
        {
            case ChannelPart.Level:
                FromDecibel(values, NeperPerDecibel);
                break;
            case ChannelPart.ReturnLoss:
                FromDecibel(values, -NeperPerDecibel);
                break;
            case ChannelPart.Power:
                foreach (ref var value in values)
                {
                    value = Math.Sqrt(value);
                }

                break;
            case ChannelPart.StandingWaveRatio:
                foreach (ref var value in values)
                {
                    value = (value - 1.0) / (value + 1.0);
                }

                break;
        }
    }

    // Vector code is an order of magnitude slower before it is optimised, and a small table is over by then.
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void FromDecibel(Span<double> values, double factor)
    {
        Span<double> last = stackalloc double[Vector256<double>.Count];
        for (var at = 0; at < values.Length; at += Vector256<double>.Count)
        {
            // The last few go through the same code as all others, so that a sample does not depend on its neighbours.
            var rest = values[at..];
            var four = rest.Length >= Vector256<double>.Count ? rest[..Vector256<double>.Count] : last;
            if (rest.Length < four.Length)
            {
                rest.CopyTo(four);
            }

            Vector256.Exp(Vector256.Create<double>(four) * factor).CopyTo(four);
            if (rest.Length < four.Length)
            {
                four[..rest.Length].CopyTo(rest);
            }
        }
    }

    /// <summary>Turns amplitude and phase in degrees into real and imaginary part.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void ToRectangular(Span<double> size, Span<double> phaseDeg)
    {
        const double RadianPerDegree = Math.PI / 180.0;
        Span<double> lastSizes = stackalloc double[Vector256<double>.Count];
        Span<double> lastPhases = stackalloc double[Vector256<double>.Count];
        for (var at = 0; at < size.Length; at += Vector256<double>.Count)
        {
            var count = Math.Min(Vector256<double>.Count, size.Length - at);
            var isWhole = count == Vector256<double>.Count;
            var sizes = isWhole ? size.Slice(at, count) : lastSizes;
            var phases = isWhole ? phaseDeg.Slice(at, count) : lastPhases;
            if (!isWhole)
            {
                size[at..].CopyTo(sizes);
                phaseDeg[at..].CopyTo(phases);
            }

            var amplitude = Vector256.Create<double>(sizes);
            var (sine, cosine) = Vector256.SinCos(Vector256.Create<double>(phases) * RadianPerDegree);
            (amplitude * cosine).CopyTo(sizes);
            (amplitude * sine).CopyTo(phases);
            if (!isWhole)
            {
                sizes[..count].CopyTo(size[at..]);
                phases[..count].CopyTo(phaseDeg[at..]);
            }
        }
    }

    /// <summary>Makes both parts missing where one is.</summary>
    private static void JoinGaps(Span<double> re, Span<double> im)
    {
        for (var at = 0; at < re.Length; at++)
        {
            if (double.IsNaN(re[at] + im[at]))
            {
                re[at] = im[at] = double.NaN;
            }
        }
    }
}
