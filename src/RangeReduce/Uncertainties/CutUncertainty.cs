using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Reduction.Cuts;

namespace RangeReduce.Uncertainties;

/// <summary>The trials of one cut at one frequency, and what they say about its figures.</summary>
internal sealed class CutUncertainty
{
    private readonly double[] _values;
    private readonly double[][] _trials;
    private readonly (string Term, double[] Spread)[] _terms;
    private readonly ErrorTerms _errors;

    private CutUncertainty(double[] values, double[][] trials, (string Term, double[] Spread)[] terms, ErrorTerms errors) =>
        (_values, _trials, _terms, _errors) = (values, trials, terms, errors);

    /// <summary>Does the trials.</summary>
    public static CutUncertainty Run(CutTrial trial, ErrorTerms errors, int trials, ulong seed)
    {
        var random = new TrialRandom(seed);
        trial.Run(default, ref random);
        var values = trial.Values.ToArray();
        var results = new double[values.Length][];
        for (var slot = 0; slot < results.Length; slot++)
        {
            results[slot] = new double[trials];
        }

        for (var i = 0; i < trials; i++)
        {
            trial.Run(CutErrors.Draw(errors, ref random), ref random);
            for (var slot = 0; slot < results.Length; slot++)
            {
                results[slot][i] = trial.Values[slot];
            }
        }

        var terms = SingleTermErrors.Of(errors).Select(single => (single.Term, Spread(trial, values, single.Draws, ref random))).ToArray();
        return new(values, results, terms, errors);
    }

    /// <summary>Gives the uncertainty of a figure of the cut; null where the trials say nothing about it.</summary>
    public Uncertainty? Of(Figure figure)
    {
        if (SlotOf(figure) is not { } slot)
        {
            return null;
        }

        var index = (int)slot;
        var budget = BudgetRules.StateOf(figure.Quantity, _errors.Given);

        // The mean over several cuts differs from this cut's own value: the spread is laid about the figure's value.
        var reading = ReadingOf(figure, index);
        var shift = reading - _values[index];
        if (slot is not (CutSlot.AxisCrossOverCo or CutSlot.PeakCrossOverCo))
        {
            var trials = Array.ConvertAll(_trials[index], value => value + shift);
            // An axis has no ends and a direction no seam: each trial is turned to lie about the value.
            var turn = figure.Quantity == QuantityCatalogue.TiltAngle ? 180.0 : figure.Quantity == QuantityCatalogue.PeakDirection ? 360.0 : 0.0;
            if (turn > 0.0)
            {
                trials = Array.ConvertAll(_trials[index], angle => figure.Value + Math.IEEERemainder(angle - figure.Value, turn));
            }

            return CoverageInterval.Of(trials) is { } interval
                ? TrialResult.Make(figure.Value, interval.Low, interval.High, interval.Standard, budget, Shares(index, 1.0))
                : null;
        }

        return TrialResult.Quotient(Array.ConvertAll(_trials[index], value => Math.Abs(value + shift)), reading) is { } quotient ? OfQuotient(figure, index, quotient, reading, budget) : null;
    }

    private static Uncertainty OfQuotientEnds(Figure figure, double low, double high, BudgetState budget, IReadOnlyList<UncertaintyShare> shares)
    {
        if (figure.Quantity == QuantityCatalogue.CrossPolarRatio)
        {
            var (least, most) = (-Decibels.OfAmplitude(high), low > 0.0 ? -Decibels.OfAmplitude(low) : double.PositiveInfinity);
            return TrialResult.Make(figure.Value, least, most, (most - least) / 3.92, budget, shares);
        }

        var (atLow, atHigh) = (PolarizationEllipse.AxialRatioDb(1.0, low), PolarizationEllipse.AxialRatioDb(1.0, high));
        return low <= 1.0 && high >= 1.0
            ? TrialResult.Make(figure.Value, Math.Min(atLow, atHigh), double.PositiveInfinity, double.NaN, budget, shares)
            : TrialResult.Make(figure.Value, Math.Min(atLow, atHigh), Math.Max(atLow, atHigh), Math.Abs(atHigh - atLow) / 3.92, budget, shares);
    }

    private static double[] Spread(CutTrial trial, double[] values, CutErrors[] draws, ref TrialRandom random)
    {
        var squares = new double[values.Length];
        var counts = new int[values.Length];
        foreach (var draw in draws)
        {
            trial.Run(draw, ref random);
            for (var slot = 0; slot < values.Length; slot++)
            {
                var difference = trial.Values[slot] - values[slot];
                if (double.IsFinite(difference))
                {
                    squares[slot] += difference * difference;
                    counts[slot]++;
                }
            }
        }

        return [.. squares.Zip(counts, (sum, count) => count == 0 ? double.NaN : Math.Sqrt(sum / count))];
    }

    private static CutSlot? SlotOf(Figure figure)
    {
        var isAxis = figure.At == FigurePlace.Axis;
        return figure.Quantity.Id switch
        {
            "peak-direction" => CutSlot.PeakDirection,
            "half-power-beamwidth" => figure.Component switch
            {
                FieldComponent.Right => CutSlot.RightWidth,
                FieldComponent.Left => CutSlot.LeftWidth,
                FieldComponent.None or FieldComponent.Total => CutSlot.TotalWidth,
                _ => null,
            },
            "sidelobe-level" => figure.BackLobe is true ? CutSlot.BackLobe : CutSlot.FrontLobe,
            "front-to-back-ratio" => CutSlot.FrontToBack,
            "axial-ratio-beamwidth" => CutSlot.AxialRatioWidth,
            "axial-ratio" or "cross-polar-ratio" => isAxis ? CutSlot.AxisCrossOverCo : CutSlot.PeakCrossOverCo,
            "tilt-angle" => isAxis ? CutSlot.AxisTilt : CutSlot.PeakTilt,
            "gain" or "level" => figure.Component switch
            {
                FieldComponent.Right => isAxis ? CutSlot.AxisRight : CutSlot.PeakRight,
                FieldComponent.Left => isAxis ? CutSlot.AxisLeft : CutSlot.PeakLeft,
                FieldComponent.Theta => isAxis ? CutSlot.AxisTheta : CutSlot.PeakTheta,
                FieldComponent.Phi => isAxis ? CutSlot.AxisPhi : CutSlot.PeakPhi,
                FieldComponent.Total => isAxis ? CutSlot.AxisTotal : CutSlot.PeakTotal,
                _ => null,
            },
            _ => null,
        };
    }

    /// <summary>Gives the value of the figure as the trials count it: decibels and degrees as they are, ratios of polarization as cross over co.</summary>
    private double ReadingOf(Figure figure, int index)
    {
        if (figure.Quantity == QuantityCatalogue.CrossPolarRatio)
        {
            return Decibels.ToAmplitude(-figure.Value);
        }

        if (figure.Quantity != QuantityCatalogue.AxialRatio)
        {
            return figure.Value;
        }

        // The axial ratio does not say which hand is the stronger; the trials do.
        var quotient = AxialRatioBeamwidthFigure.CrossOverCo(figure.Value);
        return _values[index] > 1.0 ? 1.0 / quotient : quotient;
    }

    private Uncertainty OfQuotient(Figure figure, int index, (double Low, double High) quotient, double q, BudgetState budget)
    {
        // What a small change of the quotient does to the figure in dB: 40/(ln 10 (1 − q²)) for the axial ratio, 20/(ln 10 q) for the cross-polar ratio.
        var slope = figure.Quantity == QuantityCatalogue.AxialRatio ? 40.0 / (Math.Log(10.0) * Math.Abs(1.0 - (q * q))) : 20.0 / (Math.Log(10.0) * q);
        return OfQuotientEnds(figure, quotient.Low, quotient.High, budget, Shares(index, slope));
    }

    /// <summary>Gives the terms that matter: one that brings less than a hundredth of the largest changes no digit that is printed.</summary>
    private UncertaintyShare[] Shares(int slot, double slope)
    {
        var shares = _terms.Select(term => new UncertaintyShare(term.Term, term.Spread[slot] * slope)).Where(share => double.IsFinite(share.Contribution)).ToArray();
        var least = shares.Length == 0 ? 0.0 : 0.01 * shares.Max(share => share.Contribution);
        return [.. shares.Where(share => share.Contribution > least)];
    }
}
