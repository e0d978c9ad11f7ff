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
    /// <summary>Gets whether samples on both sides of the highest one are there; if not, the true maximum may lie beyond the data or in a gap.</summary>
    public bool IsPeakSeen { get; init; }

    /// <summary>Gives the half-power beamwidth in degrees; NaN where an edge is missing.</summary>
    public double WidthDeg => HighDeg - LowDeg;

    /// <summary>Finds the main beam; nothing is allocated.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="levelDb">Levels in dB; NaN where a sample is missing, −∞ for an exact null.</param>
    /// <param name="beam">The beam; all NaN if no level is finite.</param>
    /// <returns>Whether there is a finite level at all.</returns>
    public static bool TryFind(ReadOnlySpan<double> angleDeg, ReadOnlySpan<double> levelDb, out Beam beam)
    {
        // A direction given at both ends of a turn counts by its first sample.
        var curve = new TurnedSpan(angleDeg, levelDb);
        var (highest, lowest) = (-1, double.PositiveInfinity);
        for (var i = 0; i < curve.Count; i++)
        {
            if (double.IsFinite(levelDb[i]))
            {
                lowest = Math.Min(lowest, levelDb[i]);
                highest = highest < 0 || levelDb[i] > levelDb[highest] ? i : highest;
            }
        }

        if (highest < 0)
        {
            beam = new(double.NaN, double.NaN, double.NaN, double.NaN, double.NaN, double.NaN);
            return false;
        }

        var (peakDeg, peakDb) = curve.PeakOfLevel(highest);

        // Of two lobes nearly alike the higher one may have the lower sample.
        for (var i = 0; i < curve.Count; i++)
        {
            if (curve.Y(i) > levelDb[highest] - TurnedSpan.LargestRefinementDb && !(curve.Y(i - 1) > curve.Y(i)) && !(curve.Y(i + 1) > curve.Y(i)) && curve.PeakOfLevel(i) is var rival && rival.LevelDb > peakDb)
            {
                (highest, peakDeg, peakDb) = (i, rival.AngleDeg, rival.LevelDb);
            }
        }

        var edge = peakDb - Decibels.HalfPower;
        beam = new(
            peakDeg,
            peakDb,
            curve.EdgeDeg(highest, -1, edge, isUpper: false),
            curve.EdgeDeg(highest, +1, edge, isUpper: false),
            BackLevelDb(curve, highest, peakDeg),
            peakDb - lowest)
        {
            IsPeakSeen = !double.IsNaN(curve.Y(highest - 1)) && !double.IsNaN(curve.Y(highest + 1)),
        };
        return true;
    }

    private static double BackLevelDb(TurnedSpan curve, int highest, double peakDeg)
    {
        if (!curve.IsClosed)
        {
            return double.NaN;
        }

        // Going on from the peak, the first sample at or beyond 180 degrees closes the segment that holds the back.
        var back = peakDeg + 180.0;
        for (var i = highest; i <= highest + curve.Count; i++)
        {
            if (curve.AngleDeg(i) >= back)
            {
                return curve.AngleDeg(i) == back ? curve.Y(i) : curve.Between(i - 1, back);
            }
        }

        return double.NaN;
    }
}
