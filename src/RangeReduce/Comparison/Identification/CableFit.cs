using System.Numerics;

namespace RangeReduce.Comparison.Identification;

/// <summary>Finds the cable delay that lays one reflection curve on another, for one frequency axis.</summary>
/// <remarks>With p the product of the sweep and the conjugate signature, the least squared distance over a constant phase and a delay t belongs to the
/// largest |S(t)|, S(t) = sum(p exp(j 2 pi f t)). Coarse search over block sums of p, then Newton's method at full resolution. Arrays are padded
/// with zeros to whole vectors. Delays count in reciprocals of the bandwidth inside.</remarks>
internal sealed class CableFit
{
    private static readonly int Lane = Vector<double>.Count;
    private readonly CablePhase _phase;
    private readonly double _bandwidthHz;
    private readonly double[] _angle;
    private readonly double _reach;
    private readonly bool _uniform;
    private readonly int _block;
    private readonly double[][] _cos;
    private readonly double[][] _sin;

    internal CableFit(ReadOnlySpan<double> frequencyHz, CablePhase phase, double largestDelaySeconds)
    {
        _phase = phase;
        Length = (frequencyHz.Length + Lane - 1) / Lane * Lane;
        _bandwidthHz = frequencyHz[^1] - frequencyHz[0];
        var centre = 0.5 * (frequencyHz[0] + frequencyHz[^1]);
        _angle = new double[Length];
        var (step, even) = (0.0, _bandwidthHz / (frequencyHz.Length - 1));
        _uniform = true;
        for (var n = 0; n < frequencyHz.Length; n++)
        {
            _angle[n] = 2.0 * Math.PI * (frequencyHz[n] - centre) / _bandwidthHz;
            step = n > 0 ? Math.Max(step, frequencyHz[n] - frequencyHz[n - 1]) : 0.0;
            _uniform &= Math.Abs(frequencyHz[n] - frequencyHz[0] - (n * even)) < 1e-5 * even;
        }

        var delay = phase == CablePhase.PhaseAndDelay ? Math.Min(largestDelaySeconds, 1.0 / (16.0 * step)) : 0.0;
        _reach = delay * _bandwidthHz;

        // A block turns by at most a quarter of a turn at the largest delay, which costs the coarse search a tenth of the sum.
        _block = delay > 0.0 ? Math.Clamp((int)(1.0 / (4.0 * delay * step)) / Lane * Lane, Lane, Length) : Length;
        var half = (int)Math.Ceiling(2.0 * _reach);
        CoarseStep = half > 0 ? _reach / half : 0.0;
        (_cos, _sin) = (new double[(2 * half) + 1][], new double[(2 * half) + 1][]);
        Steer(frequencyHz.Length, half);
    }

    /// <summary>Gets the padded length of the arrays.</summary>
    internal int Length { get; }

    /// <summary>Gets the length of the scratch array that <see cref="Largest"/> needs.</summary>
    internal int ScratchLength => 2 * BlockLength;

    private int Blocks => (Length + _block - 1) / _block;

    private int BlockLength => (Blocks + Lane - 1) / Lane * Lane;

    private double CoarseStep { get; }

    /// <summary>Gives the largest |S| (the real part of S for a fixed phase), the delay in seconds and the constant phase in radians.</summary>
    internal (double Value, double DelaySeconds, double PhaseRad) Largest(ReadOnlySpan<double> re, ReadOnlySpan<double> im, Span<double> scratch)
    {
        if (_phase == CablePhase.Fixed)
        {
            return (Sum(re), 0.0, 0.0);
        }

        if (_cos.Length == 1)
        {
            var (a, b) = (Sum(re), Sum(im));
            return (Math.Sqrt((a * a) + (b * b)), 0.0, Math.Atan2(b, a));
        }

        return Refine(re, im, Coarse(re, im, scratch));
    }

    /// <summary>Turns a curve by the delay and phase that <see cref="Largest"/> gave, so that it lies on the signature.</summary>
    internal void Turn(Span<double> re, Span<double> im, double delaySeconds, double phaseRad)
    {
        for (var n = 0; n < re.Length; n++)
        {
            var (sin, cos) = Math.SinCos((_angle[n] * delaySeconds * _bandwidthHz) - phaseRad);
            (re[n], im[n]) = ((re[n] * cos) - (im[n] * sin), (re[n] * sin) + (im[n] * cos));
        }
    }

    private static double Sum(ReadOnlySpan<double> values)
    {
        var sum = Vector<double>.Zero;
        for (var n = 0; n < values.Length; n += Lane)
        {
            sum += new Vector<double>(values[n..]);
        }

        return Vector.Sum(sum);
    }

    private void Steer(int count, int half)
    {
        for (var d = 0; d < _cos.Length; d++)
        {
            (_cos[d], _sin[d]) = (new double[BlockLength], new double[BlockLength]);
            for (var b = 0; b < Blocks; b++)
            {
                var (first, last) = (b * _block, Math.Min(((b + 1) * _block) - 1, count - 1));
                var angle = first <= last ? 0.5 * (_angle[first] + _angle[last]) : 0.0;
                (_sin[d][b], _cos[d][b]) = Math.SinCos(angle * (d - half) * CoarseStep);
            }
        }
    }

    private double Coarse(ReadOnlySpan<double> re, ReadOnlySpan<double> im, Span<double> scratch)
    {
        var blockRe = scratch[..BlockLength];
        var blockIm = scratch[BlockLength..(2 * BlockLength)];
        scratch.Clear();
        for (var b = 0; b < Blocks; b++)
        {
            var (first, end) = (b * _block, Math.Min((b + 1) * _block, Length));
            (blockRe[b], blockIm[b]) = (Sum(re[first..end]), Sum(im[first..end]));
        }

        var (best, largest) = (0, double.NegativeInfinity);
        for (var d = 0; d < _cos.Length; d++)
        {
            var value = Power(blockRe, blockIm, d);
            if (value > largest)
            {
                (best, largest) = (d, value);
            }
        }

        var place = (best - (_cos.Length / 2)) * CoarseStep;
        if (best == 0 || best == _cos.Length - 1)
        {
            return place;
        }

        var (before, after) = (Power(blockRe, blockIm, best - 1), Power(blockRe, blockIm, best + 1));
        var bend = before - (2.0 * largest) + after;
        return bend < 0.0 ? place + (0.5 * CoarseStep * (before - after) / bend) : place;
    }

    private double Power(ReadOnlySpan<double> re, ReadOnlySpan<double> im, int d)
    {
        var (sumRe, sumIm) = (Vector<double>.Zero, Vector<double>.Zero);
        var (cosines, sines) = (_cos[d], _sin[d]);
        for (var n = 0; n < re.Length; n += Lane)
        {
            var (a, b, c, s) = (new Vector<double>(re[n..]), new Vector<double>(im[n..]), new Vector<double>(cosines, n), new Vector<double>(sines, n));
            sumRe += (a * c) - (b * s);
            sumIm += (a * s) + (b * c);
        }

        var (x, y) = (Vector.Sum(sumRe), Vector.Sum(sumIm));
        return (x * x) + (y * y);
    }

    private (double Value, double DelaySeconds, double PhaseRad) Refine(ReadOnlySpan<double> re, ReadOnlySpan<double> im, double start)
    {
        var delay = Math.Clamp(start, -_reach, _reach);
        var value = 0.0;
        var phase = 0.0;
        for (var turn = 0; turn < 6; turn++)
        {
            Moments(re, im, delay, out var s, out var s1, out var s2);
            value = s.Magnitude;
            phase = s.Phase;

            // S' = j s1 and S'' = -s2 with the sums below, so |S|^2 has the slope 2 Re(S* S') and the bend 2 (|S'|^2 + Re(S* S'')).
            var slope = 2.0 * ((s.Imaginary * s1.Real) - (s.Real * s1.Imaginary));
            var bend = 2.0 * ((s1.Real * s1.Real) + (s1.Imaginary * s1.Imaginary) - (s.Real * s2.Real) - (s.Imaginary * s2.Imaginary));
            if (bend >= 0.0)
            {
                break;
            }

            var next = Math.Clamp(delay - Math.Clamp(slope / bend, -CoarseStep, CoarseStep), -_reach, _reach);
            var step = next - delay;
            if (Math.Abs(step) < 1e-4)
            {
                // The remaining step is so short that the parabola is exact enough for the value.
                value = Math.Sqrt((value * value) + (slope * step) + (0.5 * bend * step * step));
                phase += step * ((s.Real * s1.Real) + (s.Imaginary * s1.Imaginary)) / ((s.Real * s.Real) + (s.Imaginary * s.Imaginary));
                delay = next;
                break;
            }

            delay = next;
        }

        return (value, delay / _bandwidthHz, phase);
    }

    private void Moments(ReadOnlySpan<double> re, ReadOnlySpan<double> im, double delay, out Complex s, out Complex s1, out Complex s2)
    {
        var (re0, im0, re1, im1, re2, im2) = (Vector<double>.Zero, Vector<double>.Zero, Vector<double>.Zero, Vector<double>.Zero, Vector<double>.Zero, Vector<double>.Zero);
        var (sin, cos) = Vector.SinCos(new Vector<double>(_angle) * delay);
        var (turnSin, turnCos) = Math.SinCos(Lane * (_angle[1] - _angle[0]) * delay);
        for (var n = 0; n < re.Length; n += Lane)
        {
            var angle = new Vector<double>(_angle, n);
            var (a, b) = (new Vector<double>(re[n..]), new Vector<double>(im[n..]));
            var (x, y) = ((a * cos) - (b * sin), (a * sin) + (b * cos));
            (re0, im0) = (re0 + x, im0 + y);
            (x, y) = (x * angle, y * angle);
            (re1, im1) = (re1 + x, im1 + y);
            (re2, im2) = (re2 + (x * angle), im2 + (y * angle));

            // On a uniform axis the steering goes on by one turn a vector, which is several times faster than its sine and cosine.
            (sin, cos) = _uniform ? ((sin * turnCos) + (cos * turnSin), (cos * turnCos) - (sin * turnSin))
                : n + Lane < re.Length ? Vector.SinCos(new Vector<double>(_angle, n + Lane) * delay)
                : (sin, cos);
        }

        s = new Complex(Vector.Sum(re0), Vector.Sum(im0));
        s1 = new Complex(Vector.Sum(re1), Vector.Sum(im1));
        s2 = new Complex(Vector.Sum(re2), Vector.Sum(im2));
    }
}
