using RangeReduce.Networks;
using RangeReduce.Numerics;
using RangeReduce.Quantities;
using RangeReduce.Reduction.Sweeps;

namespace RangeReduce.Uncertainties;

/// <summary>The trials of a reflection sweep: a phasor of the size of the residual directivity, turning slowly over frequency, is laid on it.</summary>
internal static class SweepUncertainty
{
    // The residual error of a calibration ripples a few times over a sweep: cables of metres, spans of a gigahertz.
    private const double MostTurns = 10.0;

    /// <summary>Gives the uncertainty of each figure of a sweep, in the order of the figures; null where nothing is known.</summary>
    /// <param name="curve">The reflection coefficient.</param>
    /// <param name="figures">Figures that were made of it.</param>
    /// <param name="directivity">Amplitude of the residual directivity.</param>
    /// <param name="trials">Number of trials.</param>
    /// <param name="seed">Seed.</param>
    public static Uncertainty?[] Of(ReflectionCurve curve, Figure[] figures, double directivity, int trials, ulong seed)
    {
        var random = new TrialRandom(seed);
        var draws = figures.Select(_ => new double[trials]).ToArray();
        var n = curve.FrequencyHz.Length;
        var (re, im) = (new double[n], new double[n]);
        for (var trial = 0; trial < trials; trial++)
        {
            var start = 2.0 * Math.PI * random.Uniform();
            var step = 2.0 * Math.PI * random.Rectangular(MostTurns) / n;
            for (var i = 0; i < n; i++)
            {
                var (sin, cos) = Math.SinCos(start + (i * step));
                (re[i], im[i]) = (curve.Re[i] + (directivity * cos), curve.Im[i] + (directivity * sin));
            }

            var disturbed = new ReflectionCurve(curve.FrequencyHz, re, im, curve.ReferenceOhm);
            for (var k = 0; k < figures.Length; k++)
            {
                draws[k][trial] = Again(disturbed, figures[k]);
            }
        }

        var budget = BudgetState.Full;
        return [.. figures.Select((figure, k) => Make(figure, draws[k]))];

        Uncertainty? Make(Figure figure, double[] values)
        {
            if (figure.Quantity == QuantityCatalogue.ReturnLoss)
            {
                // |Γ| near zero is the length of a vector in noise: the same care as for an axial ratio near 0 dB.
                var magnitudes = Array.ConvertAll(values, Reflection.MagnitudeOfReturnLoss);
                return TrialResult.Quotient(magnitudes, Reflection.MagnitudeOfReturnLoss(figure.Value)) is { } ends
                    ? TrialResult.Make(figure.Value, Reflection.ReturnLossDb(ends.High), ends.Low > 0.0 ? Reflection.ReturnLossDb(ends.Low) : double.PositiveInfinity, (Reflection.ReturnLossDb(ends.Low) - Reflection.ReturnLossDb(ends.High)) / 3.92, budget, [new(ErrorTerms.DirectivityKey, (Reflection.ReturnLossDb(ends.Low) - Reflection.ReturnLossDb(ends.High)) / 3.92)])
                    : null;
            }

            return CoverageInterval.Of(values) is { } interval
                ? TrialResult.Make(figure.Value, interval.Low, interval.High, interval.Standard, budget, [new(ErrorTerms.DirectivityKey, interval.Standard)])
                : null;
        }
    }

    /// <summary>Takes one figure again from a disturbed curve.</summary>
    private static double Again(ReflectionCurve curve, Figure figure)
    {
        if (figure.Quantity == QuantityCatalogue.MatchBand || figure.Quantity == QuantityCatalogue.MatchBandFraction)
        {
            var bands = BandFinder.AtMost(curve.FrequencyHz, curve.Magnitude, Reflection.MagnitudeOfReturnLoss(figure.Threshold!.Value), curve.MagnitudeBetween);
            var middle = 0.5 * (figure.LowHz!.Value + figure.HighHz!.Value);
            var band = bands.Cast<Band?>().FirstOrDefault(band => band!.Value.Contains(middle));
            return band is not { } found ? double.NaN : figure.Quantity == QuantityCatalogue.MatchBand ? found.Width : 200.0 * found.Width / (found.Low + found.High);
        }

        if (figure.Quantity == QuantityCatalogue.ResonanceFrequency)
        {
            var resonances = ResonanceFinder.Find(curve);
            return resonances.Count == 0 ? double.NaN : resonances.MinBy(resonance => Math.Abs(resonance.FrequencyHz - figure.Value)).FrequencyHz;
        }

        // The match is asked for at the frequency of the data's own resonance, or else noise would always find a deeper dip beside it.
        var at = figure.FrequencyHz!.Value;
        var index = Array.BinarySearch(curve.FrequencyHz, at);
        var segment = Math.Clamp(index >= 0 ? index : ~index - 1, 0, curve.FrequencyHz.Length - 2);
        var reflection = curve.Between(segment, at);
        return figure.Quantity.Id switch
        {
            "return-loss" => Reflection.ReturnLossDb(reflection.Magnitude),
            "vswr" => Reflection.Vswr(reflection.Magnitude),
            "mismatch-loss" => Reflection.MismatchLossDb(reflection.Magnitude),
            "input-resistance" => Reflection.ImpedanceOhm(reflection, curve.ReferenceOhm).Real,
            "input-reactance" => Reflection.ImpedanceOhm(reflection, curve.ReferenceOhm).Imaginary,
            _ => double.NaN,
        };
    }
}
