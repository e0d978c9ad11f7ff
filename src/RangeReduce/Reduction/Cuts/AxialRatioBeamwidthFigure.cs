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

        var (low, high, open) = Edges(slice.AngleDeg, quotient, axisDeg, CrossOverCo(ThresholdDb));
        keys.Context.Table.Add(keys.Figure(QuantityCatalogue.AxialRatioBeamwidth, slice.FrequencyHz, high - low, Formula) with
        {
            Threshold = ThresholdDb,
            DirectionDeg = 0.5 * (low + high),
            Open = open,
            At = FigurePlace.Axis,
        });
    }

    /// <summary>Finds the connected range about the axis over which a curve is at most a limit; nothing is allocated.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="y">Ordinates, as many.</param>
    /// <param name="axisDeg">Direction of the axis in degrees.</param>
    /// <param name="limit">The limit.</param>
    /// <returns>Both edges in degrees, and which of them the data cut off; both edges at the axis where the axis itself fails, half a turn to either side where the whole turn keeps the limit.</returns>
    public static (double LowDeg, double HighDeg, string? Open) Edges(ReadOnlySpan<double> angleDeg, ReadOnlySpan<double> y, double axisDeg, double limit)
    {
        axisDeg = TurnedSpan.InTurn(angleDeg, axisDeg);
        var curve = new TurnedSpan(angleDeg, y);
        var nearest = 0;
        for (var i = 1; i < curve.Count; i++)
        {
            nearest = Math.Abs(angleDeg[i] - axisDeg) < Math.Abs(angleDeg[nearest] - axisDeg) ? i : nearest;
        }

        if (!(y[nearest] <= limit))
        {
            return (axisDeg, axisDeg, null);
        }

        var (low, high) = (curve.EdgeDeg(nearest, -1, limit, isUpper: true), curve.EdgeDeg(nearest, +1, limit, isUpper: true));
        if (double.IsNaN(low) && double.IsNaN(high) && curve.IsClosed && !HoldsNaN(y[..curve.Count]))
        {
            return (axisDeg - 180.0, axisDeg + 180.0, null);
        }

        var open = (double.IsNaN(low), double.IsNaN(high)) switch
        {
            (true, true) => "both",
            (true, false) => "low",
            (false, true) => "high",
            _ => null,
        };
        return (double.IsNaN(low) ? Farthest(curve, nearest, -1) : low, double.IsNaN(high) ? Farthest(curve, nearest, +1) : high, open);
    }

    private static bool HoldsNaN(ReadOnlySpan<double> y)
    {
        foreach (var value in y)
        {
            if (double.IsNaN(value))
            {
                return true;
            }
        }

        return false;
    }

    // Where an edge was not seen the range reaches to the last sample before the gap.
    private static double Farthest(TurnedSpan curve, int from, int step)
    {
        var index = from;
        for (var walked = 0; walked < curve.Count && !double.IsNaN(curve.Y(index + step)); walked++)
        {
            index += step;
        }

        return curve.AngleDeg(index);
    }
}
