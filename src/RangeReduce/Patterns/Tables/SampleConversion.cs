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

    private static void FromDecibel(Span<double> values, double factor)
    {
        var at = 0;
        for (; at <= values.Length - Vector256<double>.Count; at += Vector256<double>.Count)
        {
            var four = values.Slice(at, Vector256<double>.Count);
            Vector256.Exp(Vector256.Create<double>(four) * factor).CopyTo(four);
        }

        for (; at < values.Length; at++)
        {
            // The same code as above for the last few, so that a sample does not depend on its neighbours.
            values[at] = Vector256.Exp(Vector256.Create(values[at] * factor))[0];
        }
    }

    /// <summary>Turns amplitude and phase in degrees into real and imaginary part.</summary>
    private static void ToRectangular(Span<double> size, Span<double> phaseDeg)
    {
        const double RadianPerDegree = Math.PI / 180.0;
        var at = 0;
        for (; at <= size.Length - Vector256<double>.Count; at += Vector256<double>.Count)
        {
            var sizes = size.Slice(at, Vector256<double>.Count);
            var phases = phaseDeg.Slice(at, Vector256<double>.Count);
            var amplitude = Vector256.Create<double>(sizes);
            var (sine, cosine) = Vector256.SinCos(Vector256.Create<double>(phases) * RadianPerDegree);
            (amplitude * cosine).CopyTo(sizes);
            (amplitude * sine).CopyTo(phases);
        }

        for (; at < size.Length; at++)
        {
            var (sine, cosine) = Vector256.SinCos(Vector256.Create(phaseDeg[at] * RadianPerDegree));
            (size[at], phaseDeg[at]) = (size[at] * cosine[0], size[at] * sine[0]);
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
