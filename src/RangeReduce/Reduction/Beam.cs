using RangeReduce.Numerics;

namespace RangeReduce.Reduction;

/// <summary>The main beam of a level along a cut: maximum, half-power directions, level behind it.</summary>
/// <param name="PeakDeg">Direction of the maximum in degrees, refined by a parabola through three levels in dB.</param>
/// <param name="PeakDb">Level of the maximum in dB.</param>
/// <param name="LowDeg">Half-power direction below the peak; NaN where the level never falls so far on that side.</param>
/// <param name="HighDeg">Half-power direction above the peak; NaN likewise.</param>
/// <param name="BackDb">Level 180 degrees from the peak; NaN where the cut is not a closed turn.</param>
/// <param name="SpanDb">Largest less smallest level of the cut in dB.</param>
public readonly record struct Beam(double PeakDeg, double PeakDb, double LowDeg, double HighDeg, double BackDb, double SpanDb)
{
    /// <summary>Gives the half-power beamwidth in degrees; NaN where an edge is missing.</summary>
    public double WidthDeg => HighDeg - LowDeg;

    /// <summary>Finds the main beam.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="levelDb">Levels in dB; NaN where a sample is missing.</param>
    /// <param name="beam">The beam; all NaN if no level is finite.</param>
    /// <returns>Whether there is a finite level at all.</returns>
    public static bool TryFind(double[] angleDeg, double[] levelDb, out Beam beam)
    {
        ArgumentNullException.ThrowIfNull(angleDeg);
        ArgumentNullException.ThrowIfNull(levelDb);
        var (highest, lowest) = (-1, double.PositiveInfinity);
        for (var i = 0; i < levelDb.Length; i++)
        {
            if (!double.IsFinite(levelDb[i]))
            {
                continue;
            }

            lowest = Math.Min(lowest, levelDb[i]);
            if (highest < 0 || levelDb[i] > levelDb[highest])
            {
                highest = i;
            }
        }

        if (highest < 0)
        {
            beam = new(double.NaN, double.NaN, double.NaN, double.NaN, double.NaN, double.NaN);
            return false;
        }

        var curve = TurnedCurve.About(angleDeg, levelDb, highest);
        var middle = curve.Middle;
        var (peakDeg, peakDb) = middle > 0 && middle + 1 < curve.Y.Length
            ? ParabolicPeak.Refine(curve.AngleDeg.AsSpan(middle - 1, 3), curve.Y.AsSpan(middle - 1, 3))
            : (curve.AngleDeg[middle], curve.Y[middle]);
        var edge = peakDb - Decibels.HalfPower;
        beam = new(peakDeg, peakDb, EdgeDeg(curve, edge, -1), EdgeDeg(curve, edge, +1), BackLevelDb(curve, peakDeg), peakDb - lowest);
        return true;
    }

    /// <summary>Walks from the peak outward to where the level first falls below the edge; a missing sample on the way leaves the edge unknown.</summary>
    private static double EdgeDeg(TurnedCurve curve, double edgeDb, int step)
    {
        for (var i = curve.Middle; i + step >= 0 && i + step < curve.Y.Length; i += step)
        {
            var next = curve.Y[i + step];
            if (double.IsNaN(next))
            {
                return double.NaN;
            }

            if (next <= edgeDb)
            {
                var segment = Math.Min(i, i + step);
                return Bisection.Root(at => Between(curve, segment, at) - edgeDb, curve.AngleDeg[segment], curve.AngleDeg[segment + 1]);
            }
        }

        return double.NaN;
    }

    private static double BackLevelDb(TurnedCurve curve, double peakDeg)
    {
        if (!curve.IsClosed)
        {
            return double.NaN;
        }

        var back = peakDeg + 180.0;
        if (back > curve.AngleDeg[^1])
        {
            back -= 360.0;
        }

        var found = Array.BinarySearch(curve.AngleDeg, back);
        if (found >= 0)
        {
            return curve.Y[found];
        }

        var segment = Math.Clamp(~found - 1, 0, curve.AngleDeg.Length - 2);
        return Between(curve, segment, Math.Clamp(back, curve.AngleDeg[0], curve.AngleDeg[^1]));
    }

    // A level of −∞ (an exact null) has no cubic; a straight line through it would be −∞ too, so the finite neighbour stands for it.
    private static double Between(TurnedCurve curve, int segment, double at)
    {
        var (left, right) = (curve.Y[segment], curve.Y[segment + 1]);
        return double.IsFinite(left) && double.IsFinite(right)
            ? LocalCubic.Interpolate(curve.AngleDeg, curve.Y, segment, at)
            : double.IsFinite(left) ? left : right;
    }
}
