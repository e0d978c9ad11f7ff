using RangeReduce.Numerics;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>The connected range of angles about the axis over which the axial ratio keeps its bound and the hand does not turn.</summary>
internal static class AxialRatioBeamwidthFigure
{
    /// <summary>The usual bound on the axial ratio in dB (common practice).</summary>
    public const double ThresholdDb = 3.0;

    private const string Formula = "connected range about the axis with axial ratio ≤ threshold and the hand of the axis; edges where cross over co, by a cubic between samples, crosses its bound";

    /// <summary>Gives cross-polar over co-polar amplitude at an axial ratio: (A − 1)/(A + 1).</summary>
    public static double CrossOverCo(double axialRatioDb)
    {
        var ratio = Decibels.ToAmplitude(axialRatioDb);
        return (ratio - 1.0) / (ratio + 1.0);
    }

    /// <summary>Adds the figure; 0 where the axis itself fails; none where the axis lies outside the cut or beside a missing sample.</summary>
    public static void Add(ReducedCut cut, CutSlice slice, double axisDeg, CutKeys keys)
    {
        var (rightAxis, leftAxis) = (slice.AmplitudeAt(FieldComponent.Right, axisDeg), slice.AmplitudeAt(FieldComponent.Left, axisDeg));
        if (cut.Cut.AngleDeg.Length < BeamFigures.LeastAngles || !(rightAxis + leftAxis > 0.0))
        {
            return;
        }

        var (co, cross) = rightAxis >= leftAxis
            ? (slice.LevelDb(FieldComponent.Right), slice.LevelDb(FieldComponent.Left))
            : (slice.LevelDb(FieldComponent.Left), slice.LevelDb(FieldComponent.Right));
        var quotient = new double[co.Length];
        for (var i = 0; i < quotient.Length; i++)
        {
            quotient[i] = Decibels.ToAmplitude(cross[i] - co[i]);
        }

        var nearest = 0;
        for (var i = 1; i < slice.AngleDeg.Length; i++)
        {
            nearest = Math.Abs(slice.AngleDeg[i] - axisDeg) < Math.Abs(slice.AngleDeg[nearest] - axisDeg) ? i : nearest;
        }

        var curve = TurnedCurve.About(slice.AngleDeg, quotient, nearest);
        var band = BandFinder.AtMost(curve.AngleDeg, curve.Y, CrossOverCo(ThresholdDb)).Cast<Band?>().FirstOrDefault(band => band!.Value.Contains(axisDeg));
        keys.Context.Table.Add(keys.Figure(QuantityCatalogue.AxialRatioBeamwidth, slice.FrequencyHz, band?.Width ?? 0.0, Formula) with
        {
            Threshold = ThresholdDb,
            DirectionDeg = band is { } found ? 0.5 * (found.Low + found.High) : null,
            Open = band?.Open,
            At = FigurePlace.Axis,
        });
    }
}
