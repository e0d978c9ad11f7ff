using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>Figures in one direction of a cut at one frequency: levels by component and the ellipse.</summary>
internal static class DirectionFigures
{
    /// <summary>Adds the figures; none where the direction lies outside the cut or beside a missing sample.</summary>
    public static void Add(ReducedCut cut, CutSlice slice, double directionDeg, FigurePlace at, Hand? intended, CutKeys keys)
    {
        foreach (var component in cut.Components)
        {
            var amplitude = slice.AmplitudeAt(component, directionDeg);
            if (double.IsNaN(amplitude))
            {
                continue;
            }

            var level = Decibels.OfAmplitude(amplitude);
            keys.Context.Table.Add(Make(keys.LevelQuantity, double.IsFinite(level) ? level : double.NaN, "10 lg of the power of the component in the direction") with
            {
                Component = component,
                Why = double.IsFinite(level) ? null : "the component is zero there",
            });
        }

        if (!cut.HasEllipse)
        {
            return;
        }

        var right = slice.AmplitudeAt(FieldComponent.Right, directionDeg);
        var left = slice.AmplitudeAt(FieldComponent.Left, directionDeg);
        foreach (var figure in EllipseFigures.Of(right, left, intended, Make))
        {
            keys.Context.Table.Add(figure);
        }

        if (cut.HasTilt && PolarizationEllipse.AxialRatioDb(right, left) >= PolarizationEllipse.TiltFromDb && slice.TiltDegAt(directionDeg) is var tilt && !double.IsNaN(tilt))
        {
            keys.Context.Table.Add(Make(QuantityCatalogue.TiltAngle, tilt, EllipseFigures.TiltFormula));
        }

        Figure Make(Quantity quantity, double value, string formula) => keys.Figure(quantity, slice.FrequencyHz, value, formula) with { At = at, DirectionDeg = directionDeg };
    }
}
