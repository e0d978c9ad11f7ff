using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>Adds the quality factor at each resonance and the match band that it predicts.</summary>
internal static class QualityReducer
{
    // Beyond this share the two answers contradict each other (common practice).
    private const double LargestDisagreement = 0.10;

    // The derivative is taken over the middle third of the band.
    private const double ShareOfBand = 1.0 / 3.0;

    // A sphere of more than this in wavelengths over 2π carries several modes and has no such limit.
    private const double LargestSize = 1.0;

    public static void Reduce(StateSweep input, ReflectionCurve curve, IReadOnlyList<Resonance> resonances, string? method, ReductionContext context)
    {
        if (!curve.HasPhase)
        {
            return;
        }

        var limit = Reflection.MagnitudeOfReturnLoss(ReflectionReducer.MatchThresholdDb);
        var bands = MatchBandFinder.Find(curve, resonances, limit);
        for (var rank = 1; rank <= resonances.Count; rank++)
        {
            var resonance = resonances[rank - 1];
            var seen = bands.Where(band => band.Contains(resonance.FrequencyHz)).Select(band => (double?)band.Width).FirstOrDefault();
            var slope = QualityFactor.DerivativeOhmPerHz(curve, resonance.FrequencyHz, 0.5 * ShareOfBand * (seen ?? 0.0));
            var quality = QualityFactor.Of(Reflection.ImpedanceOhm(resonance.Reflection, curve.ReferenceOhm), slope, resonance.FrequencyHz);
            if (!(quality > 0.0 && double.IsFinite(quality)))
            {
                continue;
            }

            var predicted = resonance.FrequencyHz * 2.0 * limit / Math.Sqrt(1.0 - (limit * limit)) / quality;
            var figure = new Figure
            {
                Quantity = QuantityCatalogue.QualityFactor,
                Value = quality,
                State = input.State,
                Source = input.Source,
                FrequencyHz = resonance.FrequencyHz,
                At = FigurePlace.Resonance,
                Rank = rank,
                Method = method,
                Origin = ReductionContext.OriginOfSweep(input.InputId, "ω/(2R) √(R'² + (X' + |X|/ω)²) (Yaghjian and Best 2005), derivative of a cubic through the samples about the resonance, losses included"),
            };
            context.Table.Add(figure);
            context.Table.Add(figure with
            {
                Quantity = QuantityCatalogue.PredictedMatchBand,
                Value = predicted,
                Threshold = ReflectionReducer.MatchThresholdDb,
                Origin = ReductionContext.OriginOfSweep(input.InputId, "f0 · 2g/(√(1 − g²) Q) (Yaghjian and Best 2005), tuned and matched at the resonance"),
            });
            RemarkAgreement(input, resonance, seen, predicted, bands, context);
            RemarkSize(input, resonance, seen, limit, context);
        }
    }

    private static void RemarkAgreement(StateSweep input, Resonance resonance, double? seen, double predicted, IReadOnlyList<Numerics.Band> bands, ReductionContext context)
    {
        if (seen is { } width && bands.First(band => band.Contains(resonance.FrequencyHz)).Open is null && Math.Abs(width - predicted) > LargestDisagreement * width)
        {
            Say(context, input, "quality-against-band", $"at {resonance.FrequencyHz / 1e9:0.0000} GHz has a match band of {width / 1e6:0.0} MHz where its quality factor predicts {predicted / 1e6:0.0} MHz: the resonance is not isolated or not matched, so the quality factor describes it poorly.");
        }
    }

    // McLean 1996: the least Q of one mode; equal TM and TE modes (circular polarization) reach half of it and a little more. The wider bound is used: nothing is accused that physics allows.
    private static void RemarkSize(StateSweep input, Resonance resonance, double? seen, double limit, ReductionContext context)
    {
        if (seen is not { } width || context.Run.LargestDimensionM is not { } dimension)
        {
            return;
        }

        var size = Math.PI * dimension * resonance.FrequencyHz / 299_792_458.0;
        var leastQuality = LeastQuality(size);
        var most = resonance.FrequencyHz * 2.0 * limit / Math.Sqrt(1.0 - (limit * limit)) / leastQuality;
        if (size <= LargestSize && width > most)
        {
            Say(context, input, "size-limit", $"at {resonance.FrequencyHz / 1e9:0.0000} GHz has a match band of {width / 1e6:0.0} MHz, more than the {most / 1e6:0.0} MHz that a lossless single resonance inside a sphere of {dimension:0.###} m allows (McLean 1996): losses, several resonances, or a cable or case that radiates as well.");
        }
    }

    /// <summary>Gives the least quality factor of equal TM and TE modes in a sphere, (1/(ka)³ + 2/(ka))/2 (McLean, IEEE Trans. AP 44(5), 1996).</summary>
    internal static double LeastQuality(double size) => 0.5 * ((1.0 / (size * size * size)) + (2.0 / size));

    private static void Say(ReductionContext context, StateSweep input, string code, FormattableString rest) => context.Remarks.Add(
        code is "quality-against-band" ? RemarkSeverity.Note : RemarkSeverity.Doubt, // two resonances close together are common, and the band itself is sure
        code,
        $"The {input.Source.Word()} resonance of state {input.State} {rest.ToString(CultureInfo.InvariantCulture)}",
        input.State,
        context.PlaceOf(input.InputId));
}
