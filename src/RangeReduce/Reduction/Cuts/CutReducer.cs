using RangeReduce.Diagnostics;
using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction.Cuts;

/// <summary>Makes the figures and traces of one cut at each of its frequencies.</summary>
public static class CutReducer
{
    // A cut whose peak is nearer to the noise than this has no figure that noise does not touch (noise alone then moves a level by 0.3 dB and more).
    private const double NearNoiseDb = 30.0;

    /// <summary>Reduces one cut into the context's table.</summary>
    /// <param name="source">The cut.</param>
    /// <param name="method">The method, where the same state has cuts by more than one kind of probe; else null.</param>
    /// <param name="context">The run and its table.</param>
    /// <returns>The cut in its components, for figures that need several cuts.</returns>
    public static ReducedCut Reduce(StateCut source, string? method, ReductionContext context)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(context);
        var cut = ReducedCut.Of(source);
        var keys = new CutKeys(source, method, context);
        RemarkWhatCannotBeKnown(cut, keys);
        var intended = context.Run.States.FirstOrDefault(state => string.Equals(state.Name, source.State, StringComparison.Ordinal))?.IntendedHand;
        for (var frequency = 0; frequency < cut.Cut.FrequencyHz.Length; frequency++)
        {
            var slice = new CutSlice(cut, frequency);
            foreach (var component in cut.Components)
            {
                context.Table.Add(keys.Trace(keys.LevelQuantity, slice.FrequencyHz, slice.LevelDb(component), component, "10 lg of the power of the component"));
            }

            if (cut.HasEllipse)
            {
                context.Table.Add(keys.Trace(QuantityCatalogue.AxialRatio, slice.FrequencyHz, slice.AxialRatioDb(), FieldComponent.None, EllipseFigures.AxialRatioFormula));
            }

            if (cut.HasTilt)
            {
                context.Table.Add(keys.Trace(QuantityCatalogue.TiltAngle, slice.FrequencyHz, slice.TiltDeg(), FieldComponent.None, EllipseFigures.TiltFormula));
            }

            // A beam needs more than a few directions; a reading at one angle still gives the figures on the axis.
            var peakDeg = cut.Cut.AngleDeg.Length >= BeamFigures.LeastAngles ? BeamFigures.Add(cut, slice, keys) : double.NaN;
            if (cut.Cut.Axis == CutAxis.Theta)
            {
                DirectionFigures.Add(cut, slice, context.Run.AxisDeg, FigurePlace.Axis, intended, keys);
            }

            if (!double.IsNaN(peakDeg))
            {
                DirectionFigures.Add(cut, slice, peakDeg, FigurePlace.Peak, intended, keys);
            }

            if (cut.HasEllipse && cut.Cut.Axis == CutAxis.Theta)
            {
                AxialRatioBeamwidthFigure.Add(cut, slice, context.Run.AxisDeg, keys);
            }
        }

        return cut;
    }

    private static void RemarkWhatCannotBeKnown(ReducedCut cut, CutKeys keys)
    {
        var place = keys.Context.PlaceOf(keys.Source.InputIds[0]);
        if (!cut.HasTotal)
        {
            Say("single-channel", $"In {keys.Words} only one component was taken: there is no total power, axial ratio, tilt or hand.");
        }
        else if (!cut.HasEllipse)
        {
            Say("no-phase", $"In {keys.Words} the two linear components have levels without phase: axial ratio, tilt and hand cannot be known from them.");
        }
        else if (!cut.HasTilt)
        {
            Say("no-phase", $"In {keys.Words} the two circular components have levels without phase: axial ratio and hand are given, tilt and linear components cannot be known.");
        }

        var peakDb = PeakDb(cut);
        if (peakDb - keys.NoiseFloorDb < NearNoiseDb)
        {
            Say("near-noise", FormattableString.Invariant($"The strongest sample of {keys.Words} lies only {peakDb - keys.NoiseFloorDb:0} dB above the stated noise floor: its shape and its polarization are those of the noise in part."));
        }

        var axis = keys.Context.Run.AxisDeg;
        if (cut.Cut.Axis == CutAxis.Theta && !TurnedSpan.ClosesTurn(cut.Cut.AngleDeg) && (axis < cut.Cut.AngleDeg[0] - 1e-6 || axis > cut.Cut.AngleDeg[^1] + 1e-6))
        {
            Say("axis-outside", FormattableString.Invariant($"The axis at {axis:0.##} deg lies outside {keys.Words}, so it has no figures on the axis."));
        }

        void Say(string code, string text) => keys.Context.Remarks.Add(RemarkSeverity.Doubt, code, text, keys.Source.State, place);
    }

    private static double PeakDb(ReducedCut cut)
    {
        var strongest = 0.0;
        foreach (var channel in new[] { cut.Cut.First, cut.Cut.Second })
        {
            for (var i = 0; i < (channel?.Re.Length ?? 0); i++)
            {
                strongest = channel!.Power(i) > strongest ? channel.Power(i) : strongest;
            }
        }

        return Decibels.OfPower(strongest);
    }
}
