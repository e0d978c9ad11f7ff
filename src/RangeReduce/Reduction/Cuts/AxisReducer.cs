using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>Brings together what several cuts say about the axis, and follows it over frequency.</summary>
/// <remarks>
/// Every cut through the axis sees the same wave there, in a basis that turns with phi. Levels of the two hands do not turn,
/// so they are averaged over the cuts in power; phases do, so tilt stays a figure of each cut.
/// </remarks>
public static class AxisReducer
{
    private const string MeanFormula = "power of each hand averaged over the cuts through the axis";

    /// <summary>Reduces the cuts of one state and source that share probe, frequencies and reference.</summary>
    /// <param name="cuts">The cuts, at least one.</param>
    /// <param name="method">The method key that the figures of the cuts have.</param>
    /// <param name="context">The run and its table.</param>
    public static void Reduce(IReadOnlyList<ReducedCut> cuts, string? method, ReductionContext context)
    {
        ArgumentNullException.ThrowIfNull(cuts);
        ArgumentNullException.ThrowIfNull(context);
        var through = cuts.Where(cut => cut.Cut.Axis == CutAxis.Theta).ToArray();
        var usable = through.Where(cut => cut.HasEllipse).ToArray();
        if (usable.Length == 0)
        {
            AxisPowerReducer.Reduce(through, method, context);
            return;
        }

        var frequencies = usable[0].Cut.FrequencyHz;
        var (right, left) = (AxisMean.Amplitude(usable, FieldComponent.Right, context.Run.AxisDeg), AxisMean.Amplitude(usable, FieldComponent.Left, context.Run.AxisDeg));
        if (right.All(double.IsNaN))
        {
            return;
        }

        var owner = usable[0].Source;
        var intended = context.Run.States.FirstOrDefault(state => string.Equals(state.Name, owner.State, StringComparison.Ordinal))?.IntendedHand;
        var inputs = usable.SelectMany(cut => cut.Source.InputIds).Distinct(StringComparer.Ordinal).ToArray();
        var total = right.Zip(left, (r, l) => Math.Sqrt((r * r) + (l * l))).ToArray();
        var level = CutKeys.LevelQuantityOf(owner);
        for (var i = 0; i < frequencies.Length; i++)
        {
            var hertz = frequencies[i];
            foreach (var (component, amplitude) in new[] { (FieldComponent.Right, right[i]), (FieldComponent.Left, left[i]), (FieldComponent.Total, total[i]) })
            {
                if (amplitude > 0.0)
                {
                    context.Table.Add(Make(level, Decibels.OfAmplitude(amplitude), MeanFormula) with { Component = component });
                }
            }

            foreach (var figure in EllipseFigures.Of(right[i], left[i], intended, Make))
            {
                context.Table.Add(figure);
            }

            Figure Make(Quantity quantity, double value, string formula) => new()
            {
                Quantity = quantity,
                Value = value,
                State = owner.State,
                Source = owner.Source,
                FrequencyHz = hertz,
                At = FigurePlace.Axis,
                Method = method,
                Realized = quantity == QuantityCatalogue.Gain ? owner.Cut.IsRealized : null,
                Origin = context.OriginOfCut(inputs, usable.Length > 1 ? $"{formula}; {MeanFormula}" : formula),
            };
        }

        AddTraces();
        AddBand();
        AddGainBands();

        void AddTraces()
        {
            Add(level, Array.ConvertAll(right, Decibels.OfAmplitude), FieldComponent.Right, MeanFormula);
            Add(level, Array.ConvertAll(left, Decibels.OfAmplitude), FieldComponent.Left, MeanFormula);
            Add(level, Array.ConvertAll(total, Decibels.OfAmplitude), FieldComponent.Total, MeanFormula);
            Add(QuantityCatalogue.AxialRatio, [.. right.Zip(left, PolarizationEllipse.AxialRatioDb)], FieldComponent.None, EllipseFigures.AxialRatioFormula);
            var rightIsCo = intended is Hand.Right || (intended is null or Hand.Linear && right.Where(double.IsFinite).Sum() >= left.Where(double.IsFinite).Sum());
            Add(QuantityCatalogue.CrossPolarRatio, [.. right.Zip(left, (r, l) => Decibels.OfAmplitude(rightIsCo ? r / l : l / r))], rightIsCo ? FieldComponent.Right : FieldComponent.Left, "20 lg of co-polar over cross-polar amplitude");
        }

        void Add(Quantity quantity, double[] y, FieldComponent component, string formula) => context.Table.Add(new Trace
        {
            Quantity = quantity,
            Axis = TraceAxis.Frequency,
            X = frequencies,
            Y = y,
            State = owner.State,
            Source = owner.Source,
            At = FigurePlace.Axis,
            Component = component,
            Method = method,
            Origin = context.OriginOfCut(inputs, formula),
        });

        void AddGainBands()
        {
            if (level != QuantityCatalogue.Gain)
            {
                return;
            }

            var rightIsCo = intended is Hand.Right || (intended is null or Hand.Linear && right.Where(double.IsFinite).Sum() >= left.Where(double.IsFinite).Sum());
            var gain = new Figure
            {
                Quantity = level,
                State = owner.State,
                Source = owner.Source,
                At = FigurePlace.Axis,
                Component = rightIsCo ? FieldComponent.Right : FieldComponent.Left,
                Method = method,
                Realized = owner.Cut.IsRealized,
                Origin = context.OriginOfCut(inputs, "connected run about the highest co-polar gain on the axis with gain at most threshold below it; edges by a cubic between frequencies"),
            };
            foreach (var (threshold, band) in GainBandFigure.Of(frequencies, Array.ConvertAll(rightIsCo ? right : left, Decibels.OfAmplitude)))
            {
                context.Table.Add(GainBandFigure.Make(gain, threshold, band));
            }
        }

        // Cross over co of the stronger hand: its square has no kink where the axial ratio is infinite, and the hand may not turn inside a band.
        void AddBand()
        {
            if (frequencies.Length < 2)
            {
                return;
            }

            var rank = 0;
            var limit = AxialRatioBeamwidthFigure.CrossOverCo(AxialRatioBeamwidthFigure.ThresholdDb);
            var bands = BandFinder.AtMost(frequencies, [.. left.Zip(right, (l, r) => l / r)], limit)
                .Concat(BandFinder.AtMost(frequencies, [.. right.Zip(left, (r, l) => r / l)], limit));
            foreach (var band in bands.OrderByDescending(band => band.Width))
            {
                context.Table.Add(new Figure
                {
                    Quantity = QuantityCatalogue.AxialRatioBand,
                    Value = band.Width,
                    State = owner.State,
                    Source = owner.Source,
                    LowHz = band.Low,
                    HighHz = band.High,
                    At = FigurePlace.Axis,
                    Threshold = AxialRatioBeamwidthFigure.ThresholdDb,
                    Rank = ++rank,
                    Open = band.Open,
                    Method = method,
                    Origin = context.OriginOfCut(inputs, "connected run of frequencies with axial ratio ≤ threshold on the axis; edges where cross over co, by a cubic between frequencies, crosses its bound"),
                });
            }
        }
    }
}
