using System.Numerics;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Interpolation;
using RangeReduce.Networks;

namespace RangeReduce.Comparison.Identification;

/// <summary>All that can be worked out once for sweeps on one frequency axis: the signatures on that axis, the steering of the delay search.</summary>
/// <remarks>The signatures are carried to the axis of the sweep (natural cubic spline), never the other way round, so that the noise of the sweep stays what it is.</remarks>
internal sealed class IdentificationPlan
{
    private readonly IReadOnlyList<StateSignature> _signatures;
    private readonly IdentificationOptions _options;
    private readonly NoiseEstimate _noise;
    private readonly CableFit _fit;
    private readonly double[][] _re;
    private readonly double[][] _im;
    private readonly double[] _energy;
    private readonly double[] _scale;
    private readonly double[] _normalizer;
    private readonly double _freedom;
    private bool _resampled;

    private IdentificationPlan(double[] axis, bool magnitudeOnly, int first, int count, IReadOnlyList<StateSignature> signatures, NoiseEstimate noise, IdentificationOptions options)
    {
        (Axis, MagnitudeOnly, First, Count, _signatures, _noise, _options) = (axis, magnitudeOnly, first, count, signatures, noise, options);
        _fit = new CableFit(axis.AsSpan(first, count), options.CablePhase, options.LargestDelaySeconds);
        (_re, _im) = (new double[signatures.Count][], new double[signatures.Count][]);
        (_energy, _scale, _normalizer) = (new double[signatures.Count], new double[signatures.Count], new double[signatures.Count]);
        for (var k = 0; k < signatures.Count; k++)
        {
            Load(k);
        }

        _freedom = (magnitudeOnly ? count : (2.0 * count) - FreePhases(options.CablePhase)) / noise.Correlation;
    }

    internal double[] Axis { get; }

    internal bool MagnitudeOnly { get; }

    /// <summary>Gets the index of the first frequency of the axis that the signatures cover.</summary>
    internal int First { get; }

    internal int Count { get; }

    internal CableFit Fit => _fit;

    /// <summary>Gives the number of real parameters that the cable leaves free.</summary>
    internal static int FreePhases(CablePhase phase) => phase switch
    {
        CablePhase.PhaseAndDelay => 2,
        CablePhase.Phase => 1,
        _ => 0,
    };

    internal static bool TryMake(double[] axis, bool hasPhase, IReadOnlyList<StateSignature> signatures, NoiseEstimate noise, IdentificationOptions options, out IdentificationPlan? plan, out string reason)
    {
        const int LeastCount = 32;
        plan = null;
        var (low, high) = (signatures.Max(signature => signature.FrequencyHz[0]), signatures.Min(signature => signature.FrequencyHz[^1]));

        // The last digit of a written frequency must not cost an end point.
        var rounding = 1e-9 * high;
        var first = Array.FindIndex(axis, hz => hz >= low - rounding);
        var last = Array.FindLastIndex(axis, hz => hz <= high + rounding);
        var count = first < 0 ? 0 : last - first + 1;
        reason = count < LeastCount
            ? FormattableString.Invariant($"The sweep has {Math.Max(count, 0)} points in the band of the signatures, {low / 1e6:0.###} to {high / 1e6:0.###} MHz; {LeastCount} are needed.")
            : axis[last] - axis[first] < options.LeastCover * (high - low)
            ? FormattableString.Invariant($"The sweep covers {100.0 * (axis[last] - axis[first]) / (high - low):0} % of the band of the signatures, {low / 1e6:0.###} to {high / 1e6:0.###} MHz; {100.0 * options.LeastCover:0} % are needed.")
            : string.Empty;
        if (reason.Length > 0)
        {
            return false;
        }

        var magnitudeOnly = !hasPhase || signatures.Any(signature => !signature.HasPhase);
        plan = new IdentificationPlan(axis, magnitudeOnly, first, count, signatures, noise, options);
        return true;
    }

    internal IdentificationScratch MakeScratch() => new(_fit.Length, _fit.ScratchLength, _signatures.Count);

    /// <summary>Fills the scratch with the sweep and its distance from every state, the likeliest last found in <see cref="Rank"/>; false where a value is not finite.</summary>
    internal bool Measure(NetworkSweep sweep, IdentificationScratch scratch)
    {
        var re = scratch.Re.AsSpan(0, Count);
        var im = scratch.Im.AsSpan(0, Count);
        scratch.Re.AsSpan(Count).Clear();
        scratch.Im.AsSpan(Count).Clear();
        ReflectionData.Copy(sweep, First, re, im);
        if (MagnitudeOnly)
        {
            ReflectionData.DropPhase(re, im);
        }

        var energy = SquareSum(scratch.Re, scratch.Im);
        if (!double.IsFinite(energy))
        {
            return false;
        }

        for (var k = 0; k < _signatures.Count; k++)
        {
            if (MagnitudeOnly)
            {
                scratch.Squares[k] = WeightedSquares(scratch.Re, _re[k], _im[k]);
            }
            else
            {
                Multiply(scratch, k);
                var (value, delay, phase) = _fit.Largest(scratch.ProductRe, scratch.ProductIm, scratch.Blocks);
                (scratch.Delay[k], scratch.Phase[k]) = (delay, phase);
                scratch.Squares[k] = Math.Max(0.0, energy + _energy[k] - (2.0 * value));
            }

            scratch.LogLikelihood[k] = (-0.5 * scratch.Squares[k] / _scale[k] / _noise.Correlation) - _normalizer[k];
        }

        return true;
    }

    internal SweepIdentification Answer(IdentificationScratch scratch)
    {
        var (best, second) = Rank(scratch.LogLikelihood);
        var fit = FitProbability(scratch.Squares[best] / _scale[best]);
        var likelihood = scratch.LogLikelihood;
        var probability = 1.0 / likelihood.Sum(value => Math.Exp(value - likelihood[best]));
        return new SweepIdentification
        {
            Answer = fit < _options.FalseAlarmRate ? IdentificationAnswer.Unknown
                : probability < _options.LeastProbability ? IdentificationAnswer.Ambiguous
                : IdentificationAnswer.State,
            Nearest = _signatures[best].State,
            RunnerUp = second < 0 ? null : _signatures[second].State,
            FitProbability = fit,
            StateProbability = probability,
            LogLikelihoodRatio = second < 0 ? double.PositiveInfinity : likelihood[best] - likelihood[second],
            RmsDistance = Math.Sqrt(scratch.Squares[best] / Count),
            DelaySeconds = scratch.Delay[best],
            MagnitudeOnly = MagnitudeOnly,
            Resampled = _resampled,
            Count = Count,
        };
    }

    /// <summary>Gives the indices of the largest and the second largest value; -1 for the second of one.</summary>
    internal static (int Best, int Second) Rank(double[] values)
    {
        var (best, second) = (0, -1);
        for (var k = 1; k < values.Length; k++)
        {
            if (values[k] > values[best])
            {
                (best, second) = (k, best);
            }
            else if (second < 0 || values[k] > values[second])
            {
                second = k;
            }
        }

        return (best, second);
    }

    /// <summary>Gives each point's squared distance from a state over twice the noise variance, after the cable fit that <see cref="Measure"/> made.</summary>
    internal double[] PointDistances(IdentificationScratch scratch, int k)
    {
        var (re, im) = ((double[])scratch.Re.Clone(), (double[])scratch.Im.Clone());
        var distances = new double[Count];
        if (!MagnitudeOnly && _options.CablePhase != CablePhase.Fixed)
        {
            _fit.Turn(re, im, scratch.Delay[k], scratch.Phase[k]);
        }

        for (var n = 0; n < Count; n++)
        {
            var (a, b) = (re[n] - _re[k][n], im[n] - _im[k][n]);
            distances[n] = (MagnitudeOnly ? a * a * _im[k][n] : (a * a) + (b * b)) / (2.0 * _scale[k] * _noise.Correlation);
        }

        return distances;
    }

    private static double SquareSum(double[] re, double[] im)
    {
        var sum = Vector<double>.Zero;
        for (var n = 0; n < re.Length; n += Vector<double>.Count)
        {
            var (a, b) = (new Vector<double>(re, n), new Vector<double>(im, n));
            sum += (a * a) + (b * b);
        }

        return Vector.Sum(sum);
    }

    private static double WeightedSquares(double[] value, double[] mean, double[] weight)
    {
        var sum = Vector<double>.Zero;
        for (var n = 0; n < value.Length; n += Vector<double>.Count)
        {
            var difference = new Vector<double>(value, n) - new Vector<double>(mean, n);
            sum += difference * difference * new Vector<double>(weight, n);
        }

        return Vector.Sum(sum);
    }

    private static double[] Carry(StateSignature signature, double[] values, ReadOnlySpan<double> axis)
    {
        var spline = CubicSpline.InterpolateNaturalSorted(signature.FrequencyHz, values);
        var result = new double[axis.Length];
        for (var n = 0; n < axis.Length; n++)
        {
            result[n] = spline.Interpolate(axis[n]);
        }

        return result;
    }

    private void Load(int k)
    {
        var signature = _signatures[k];
        var axis = Axis.AsSpan(First, Count);
        var (re, im) = (new double[_fit.Length], new double[_fit.Length]);
        if (ReflectionData.SameAxis(Axis, signature.FrequencyHz))
        {
            signature.Re.AsSpan(First, Count).CopyTo(re);
            signature.Im.AsSpan(First, Count).CopyTo(im);
        }
        else
        {
            _resampled = true;
            Carry(signature, signature.Re, axis).CopyTo(re, 0);
            Carry(signature, signature.Im, axis).CopyTo(im, 0);
        }

        var logVariances = 2.0 * Count * Math.Log(signature.VarianceFactor);
        if (MagnitudeOnly)
        {
            LoadMagnitudes(signature, re, im);
            logVariances = (0.5 * logVariances) - im.Take(Count).Sum(Math.Log);
        }

        (_re[k], _im[k], _energy[k]) = (re, im, SquareSum(re, im));
        _scale[k] = _noise.StandardDeviation * _noise.StandardDeviation * signature.VarianceFactor;
        _normalizer[k] = 0.5 * logVariances / _noise.Correlation;
    }

    /// <summary>Puts the expected magnitude into the real part and the weight, noise variance over variance of the magnitude, into the imaginary part.</summary>
    private void LoadMagnitudes(StateSignature signature, double[] re, double[] im)
    {
        var deviation = _noise.StandardDeviation;
        for (var n = 0; n < Count; n++)
        {
            if (signature.HasPhase)
            {
                var (mean, variance) = RiceDistribution.Moments(Math.Sqrt((re[n] * re[n]) + (im[n] * im[n])), deviation);
                (re[n], im[n]) = (mean, deviation * deviation / variance);
            }
            else
            {
                // A mean of magnitudes holds the rise by noise already.
                im[n] = 1.0;
            }
        }
    }

    private void Multiply(IdentificationScratch scratch, int k)
    {
        var (gammaRe, gammaIm) = (_re[k], _im[k]);
        for (var n = 0; n < gammaRe.Length; n += Vector<double>.Count)
        {
            var (a, b) = (new Vector<double>(scratch.Re, n), new Vector<double>(scratch.Im, n));
            var (c, d) = (new Vector<double>(gammaRe, n), new Vector<double>(gammaIm, n));
            ((a * c) + (b * d)).CopyTo(scratch.ProductRe, n);
            ((b * c) - (a * d)).CopyTo(scratch.ProductIm, n);
        }
    }

    /// <summary>Gives the probability of a larger distance: chi-square for a stated noise, Fisher's F for an estimated one.</summary>
    private double FitProbability(double chiSquare)
    {
        var reduced = chiSquare / _noise.Correlation;
        var below = double.IsInfinity(_noise.DegreesOfFreedom)
            ? ChiSquared.CDF(_freedom, reduced)
            : FisherSnedecor.CDF(_freedom, _noise.DegreesOfFreedom, reduced / _freedom);
        return Math.Clamp(1.0 - below, 0.0, 1.0);
    }
}
