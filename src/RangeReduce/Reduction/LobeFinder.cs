namespace RangeReduce.Reduction;

/// <summary>Finds the lobes of a level along a cut: maxima that rise above their surroundings by a stated amount.</summary>
public static class LobeFinder
{
    /// <summary>A lobe rises by more than this in dB; smaller waves are ripple (the contract of the results).</summary>
    public const double LeastRiseDb = 0.5;

    /// <summary>Finds the lobes, the highest first.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="levelDb">Levels in dB; a missing sample ends a lobe like the end of the data.</param>
    /// <param name="leastRiseDb">Least rise in dB.</param>
    /// <param name="floorDb">Level in dB below which nothing is a lobe, such as 10 dB above the noise floor; −∞ where none is known.</param>
    public static IReadOnlyList<Lobe> Find(double[] angleDeg, double[] levelDb, double leastRiseDb = LeastRiseDb, double floorDb = double.NegativeInfinity)
    {
        ArgumentNullException.ThrowIfNull(angleDeg);
        ArgumentNullException.ThrowIfNull(levelDb);
        var closed = TurnedCurve.ClosesTurn(angleDeg);
        var count = closed && angleDeg[^1] - angleDeg[0] > 360.0 - 1e-6 ? angleDeg.Length - 1 : angleDeg.Length;
        var lobes = new List<Lobe>();
        for (var i = 0; i < count; i++)
        {
            var level = levelDb[i];
            if (!double.IsFinite(level) || level < floorDb || !IsMaximum(i))
            {
                continue;
            }

            var (minimumLeft, endsLeft) = Descend(i, -1);
            var (minimumRight, endsRight) = Descend(i, +1);

            // At the end of open data the level might still rise: only the seen side counts there.
            var saddle = endsLeft && endsRight ? Math.Min(minimumLeft, minimumRight) : endsLeft ? minimumRight : endsRight ? minimumLeft : Math.Max(minimumLeft, minimumRight);
            if (level - saddle > leastRiseDb)
            {
                lobes.Add(new(angleDeg[i], level, level - saddle));
            }
        }

        return [.. lobes.OrderByDescending(lobe => lobe.LevelDb).ThenBy(lobe => lobe.AngleDeg)];

        double At(int i) => closed ? levelDb[((i % count) + count) % count] : i < 0 || i >= count ? double.NaN : levelDb[i];

        // A plateau counts once, at its first sample.
        bool IsMaximum(int i)
        {
            var before = At(i - 1);
            if (before >= levelDb[i])
            {
                return false;
            }

            var next = i + 1;
            while (At(next) == levelDb[i] && next - i < count)
            {
                next++;
            }

            return !(At(next) > levelDb[i]) && !(double.IsNaN(before) && double.IsNaN(At(i + 1)));
        }

        // Goes down one side until something higher stands there; tells the lowest level on the way and whether the data ended first.
        (double Minimum, bool Ends) Descend(int from, int step)
        {
            var minimum = levelDb[from];
            for (var k = 1; k < count; k++)
            {
                var level = At(from + (k * step));
                if (double.IsNaN(level))
                {
                    return (minimum, true);
                }

                if (level > levelDb[from])
                {
                    return (minimum, false);
                }

                minimum = Math.Min(minimum, level);
            }

            return (minimum, !closed);
        }
    }
}
