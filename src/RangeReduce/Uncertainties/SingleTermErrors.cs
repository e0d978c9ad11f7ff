namespace RangeReduce.Uncertainties;

/// <summary>The errors that show what each term alone brings: a first-order share needs no random draws (JCGM 100, 5.1).</summary>
internal static class SingleTermErrors
{
    // A phasor shows its spread when its phase goes once round; the two ports and the course of a stray ray take other steps, so that they do not go together.
    private const int Phases = 16;

    // Noise differs at every angle: a few draws of the whole cut give its spread to a quarter, which is a small term's due.
    private const int NoiseDraws = 8;

    private static readonly double RootThree = Math.Sqrt(3.0);
    private static readonly double RootTwo = Math.Sqrt(2.0);

    /// <summary>Gives the errors to try for each term that is stated.</summary>
    public static IEnumerable<(string Term, CutErrors[] Draws)> Of(ErrorTerms terms)
    {
        (string Term, double? Standard, Func<double, CutErrors> Error)[] scalars =
        [
            (ErrorTerms.GainStandardKey, terms.GainStandardDb, db => new() { LevelDb = db }),
            (ErrorTerms.LinearityKey, terms.LinearityDb / RootThree, db => new() { LevelDb = db }),
            (ErrorTerms.MismatchKey, terms.MismatchDb / RootTwo, db => new() { LevelDb = db }),
            (ErrorTerms.DistanceKey, terms.DistanceDb / RootThree, db => new() { LevelDb = db }),
            (ErrorTerms.RepeatabilityKey, terms.RepeatabilityDb, db => new() { LevelDb = db }),
            (ErrorTerms.DriftKey, terms.DriftDb / RootThree, db => new() { DriftDb = db }),
            (ErrorTerms.BalanceKey, terms.BalanceDb / RootThree, db => new() { BalanceDb = db }),
            (ErrorTerms.BalancePhaseKey, terms.BalancePhaseDeg / RootThree, deg => new() { BalancePhaseDeg = deg }),
            (ErrorTerms.AlignmentKey, terms.AlignmentDeg / RootThree, deg => new() { AngleDeg = deg }),
        ];
        foreach (var (term, standard, error) in scalars)
        {
            if (standard is { } size)
            {
                yield return (term, [error(size), error(-size)]);
            }
        }

        if (terms.Reflectivity is { } stray)
        {
            yield return (ErrorTerms.ReflectivityKey, [.. Enumerable.Range(0, Phases).Select(k => new CutErrors
            {
                FirstStray = CutErrors.Phasor(stray, (double)k / Phases),
                SecondStray = CutErrors.Phasor(stray, 5.0 * k / Phases),
                StrayTurns = ((7 * k) % ((2 * StrayTable.MostTurns) + 1)) - StrayTable.MostTurns,
            })]);
        }

        if (terms.CrossPolar is { } leak)
        {
            yield return (ErrorTerms.CrossPolarKey, [.. Enumerable.Range(0, Phases).Select(k => new CutErrors
            {
                FirstLeak = CutErrors.Phasor(leak, (double)k / Phases),
                SecondLeak = CutErrors.Phasor(leak, 5.0 * k / Phases),
            })]);
        }

        if (terms.Noise is { } noise)
        {
            yield return (ErrorTerms.NoiseFloorKey, [.. Enumerable.Repeat(new CutErrors { Noise = noise }, NoiseDraws)]);
        }
    }
}
