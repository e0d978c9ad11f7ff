namespace RangeReduce.Reduction;

/// <summary>Finds the lobes of a level along a cut: maxima that rise above their surroundings by a stated amount.</summary>
public static class LobeFinder
{
    /// <summary>A lobe rises by more than this in dB; smaller waves are ripple (the contract of the results).</summary>
    public const double LeastRiseDb = 0.5;

    /// <summary>Finds the lobes, the highest first. A level that is highest at the end of the data or beside a missing sample is none: its maximum was not seen.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="levelDb">Levels in dB; a missing sample is like the end of the data.</param>
    /// <param name="leastRiseDb">Least rise in dB.</param>
    /// <param name="floorDb">Level in dB below which nothing is a lobe, such as 10 dB above the noise floor; −∞ where none is known.</param>
    public static IReadOnlyList<Lobe> Find(ReadOnlySpan<double> angleDeg, ReadOnlySpan<double> levelDb, double leastRiseDb = LeastRiseDb, double floorDb = double.NegativeInfinity)
    {
        var curve = new TurnedSpan(angleDeg, levelDb);
        var lobes = new List<Lobe>();
        for (var i = 0; i < curve.Count; i++)
        {
            var level = levelDb[i];
            if (!double.IsFinite(level) || level < floorDb || !IsMaximum(curve, i))
            {
                continue;
            }

            var (minimumLeft, endsLeft) = Descend(curve, i, -1);
            var (minimumRight, endsRight) = Descend(curve, i, +1);

            // At the end of open data the level might still rise: only the seen side counts there.
            var saddle = endsLeft && endsRight ? Math.Min(minimumLeft, minimumRight) : endsLeft ? minimumRight : endsRight ? minimumLeft : Math.Max(minimumLeft, minimumRight);
            if (level - saddle > leastRiseDb)
            {
                // The same refinement as for the main beam: levels at samples would make two equal lobes unequal where the grid meets them unequally.
                var (peakDeg, peakDb) = curve.PeakOfLevel(i);
                lobes.Add(new(peakDeg, peakDb, level - saddle));
            }
        }

        return [.. lobes.OrderByDescending(lobe => lobe.LevelDb).ThenBy(lobe => lobe.AngleDeg)];
    }

    // A plateau counts once, at its first sample.
    private static bool IsMaximum(TurnedSpan curve, int index)
    {
        var (before, level) = (curve.Y(index - 1), curve.Y(index));
        if (!(before < level))
        {
            return false;
        }

        var next = index + 1;
        while (curve.Y(next) == level && next - index < curve.Count)
        {
            next++;
        }

        return curve.Y(next) < level;
    }

    // Goes down one side until something higher stands there; tells the lowest level on the way and whether the data ended first.
    private static (double Minimum, bool Ends) Descend(TurnedSpan curve, int from, int step)
    {
        var (minimum, top) = (curve.Y(from), curve.Y(from));
        for (var k = 1; k < curve.Count; k++)
        {
            var level = curve.Y(from + (k * step));
            if (double.IsNaN(level))
            {
                return (minimum, true);
            }

            if (level > top)
            {
                return (minimum, false);
            }

            minimum = Math.Min(minimum, level);
        }

        return (minimum, !curve.IsClosed);
    }
}
