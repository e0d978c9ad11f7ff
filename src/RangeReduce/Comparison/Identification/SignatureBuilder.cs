using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Runs;

namespace RangeReduce.Comparison.Identification;

/// <summary>Makes the signature of a state from its repeats, and from their differences what the noise is made of.</summary>
internal sealed class SignatureBuilder(IdentificationOptions options)
{
    private readonly List<(double[] Axis, double[] Re, double[] Im, bool HasPhase)> _contrasts = [];

    internal List<Remark> Remarks { get; } = [];

    internal StateSignature Build(string state, IReadOnlyList<StateSweep> sweeps)
    {
        var lead = sweeps.FirstOrDefault(sweep => sweep.Sweep.HasPhase)?.Sweep ?? sweeps[0].Sweep;
        var usable = sweeps.Where(sweep => Fits(sweep.Sweep, lead)).ToArray();
        foreach (var left in sweeps.Except(usable))
        {
            Remarks.Add(new Remark(RemarkSeverity.Note, "signature-sweep-left-out", $"Sweep {left.InputId} has another frequency axis, reference impedance or no phase and is left out of the signature.", State: state));
        }

        var curves = Array.ConvertAll(usable, sweep => Curve(sweep.Sweep));
        var fit = lead.HasPhase ? new CableFit(lead.FrequencyHz, options.CablePhase, options.LargestDelaySeconds) : null;
        var mean = curves[0];
        for (var pass = 0; fit is not null && curves.Length > 1 && pass < 2; pass++)
        {
            foreach (var curve in curves)
            {
                Align(fit, curve, mean);
            }

            mean = Mean(curves);
        }

        mean = Mean(curves);
        AddContrasts(lead, curves);
        return new StateSignature(state, lead.FrequencyHz, mean.Re, mean.Im, lead.HasPhase, curves.Length, lead.ReferenceOhm[0]);
    }

    /// <summary>Estimates the noise from the contrasts of all states; null where no state has repeats.</summary>
    /// <remarks>The contrasts of a state are orthogonal (Helmert), so each is one independent draw of the noise. The square of the inner product of two
    /// draws has the mean tr(C^2) of their covariance C, which gives the effective number of independent points (tr C)^2 / tr(C^2) after Satterthwaite.</remarks>
    internal NoiseEstimate? Noise()
    {
        if (_contrasts.Count == 0)
        {
            return null;
        }

        var freedom = _contrasts.Sum(Freedom);
        var variance = _contrasts.Sum(contrast => Product(contrast, contrast)) / freedom;
        var ratios = new List<double>();
        for (var a = 0; a < _contrasts.Count; a++)
        {
            for (var b = a + 1; b < _contrasts.Count && variance > 0.0; b++)
            {
                if (_contrasts[a].HasPhase == _contrasts[b].HasPhase && ReflectionData.SameAxis(_contrasts[a].Axis, _contrasts[b].Axis))
                {
                    ratios.Add(Math.Pow(Product(_contrasts[a], _contrasts[b]) / variance, 2.0) / Freedom(_contrasts[a]));
                }
            }
        }

        if (ratios.Count < 6)
        {
            Remarks.Add(new Remark(RemarkSeverity.Note, "few-repeats", "There are few repeats; how far their scatter is correlated along frequency is little known, and the false-alarm rate with it."));
        }

        var correlation = ratios.Count < 3 ? 1.0 : Math.Max(1.0, ratios.Average());
        return new NoiseEstimate(Math.Sqrt(variance), freedom / correlation, correlation);
    }

    private static bool Fits(NetworkSweep sweep, NetworkSweep lead) =>
        sweep.HasPhase == lead.HasPhase && sweep.ReferenceOhm[0] == lead.ReferenceOhm[0] && ReflectionData.SameAxis(sweep.FrequencyHz, lead.FrequencyHz);

    private static (double[] Re, double[] Im) Curve(NetworkSweep sweep)
    {
        var (re, im) = (new double[sweep.Count], new double[sweep.Count]);
        ReflectionData.Copy(sweep, 0, re, im);
        return (re, im);
    }

    private static void Align(CableFit fit, (double[] Re, double[] Im) curve, (double[] Re, double[] Im) onto)
    {
        var (re, im) = (new double[fit.Length], new double[fit.Length]);
        for (var n = 0; n < curve.Re.Length; n++)
        {
            re[n] = (curve.Re[n] * onto.Re[n]) + (curve.Im[n] * onto.Im[n]);
            im[n] = (curve.Im[n] * onto.Re[n]) - (curve.Re[n] * onto.Im[n]);
        }

        var (_, delay, phase) = fit.Largest(re, im, new double[fit.ScratchLength]);
        fit.Turn(curve.Re, curve.Im, delay, phase);
    }

    private static (double[] Re, double[] Im) Mean((double[] Re, double[] Im)[] curves)
    {
        var (re, im) = (new double[curves[0].Re.Length], new double[curves[0].Re.Length]);
        foreach (var curve in curves)
        {
            for (var n = 0; n < re.Length; n++)
            {
                (re[n], im[n]) = (re[n] + (curve.Re[n] / curves.Length), im[n] + (curve.Im[n] / curves.Length));
            }
        }

        return (re, im);
    }

    private static double Product((double[] Axis, double[] Re, double[] Im, bool HasPhase) a, (double[] Axis, double[] Re, double[] Im, bool HasPhase) b)
    {
        var sum = 0.0;
        for (var n = 0; n < a.Re.Length; n++)
        {
            sum += (a.Re[n] * b.Re[n]) + (a.Im[n] * b.Im[n]);
        }

        return sum;
    }

    private double Freedom((double[] Axis, double[] Re, double[] Im, bool HasPhase) contrast) =>
        contrast.HasPhase ? (2.0 * contrast.Re.Length) - IdentificationPlan.FreePhases(options.CablePhase) : contrast.Re.Length;

    private void AddContrasts(NetworkSweep lead, (double[] Re, double[] Im)[] curves)
    {
        var (sumRe, sumIm) = ((double[])curves[0].Re.Clone(), (double[])curves[0].Im.Clone());
        for (var i = 1; i < curves.Length; i++)
        {
            var (re, im, norm) = (new double[sumRe.Length], new double[sumRe.Length], 1.0 / Math.Sqrt(i * (i + 1.0)));
            for (var n = 0; n < sumRe.Length; n++)
            {
                (re[n], im[n]) = (norm * (sumRe[n] - (i * curves[i].Re[n])), norm * (sumIm[n] - (i * curves[i].Im[n])));
                (sumRe[n], sumIm[n]) = (sumRe[n] + curves[i].Re[n], sumIm[n] + curves[i].Im[n]);
            }

            _contrasts.Add((lead.FrequencyHz, re, im, lead.HasPhase));
        }
    }
}
