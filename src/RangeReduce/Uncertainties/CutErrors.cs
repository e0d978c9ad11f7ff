namespace RangeReduce.Uncertainties;

/// <summary>One draw of all errors of a cut at one frequency; the default moves nothing.</summary>
internal struct CutErrors
{
    /// <summary>Common level error in dB: gain standard, mismatch, linearity, distance, repeatability.</summary>
    public double LevelDb;

    /// <summary>Level of the first port against the second in dB.</summary>
    public double BalanceDb;

    /// <summary>Phase of the first port against the second in degrees.</summary>
    public double BalancePhaseDeg;

    /// <summary>Leakage of the second component into the first port.</summary>
    public (double Re, double Im) FirstLeak;

    /// <summary>Leakage of the first component into the second port.</summary>
    public (double Re, double Im) SecondLeak;

    /// <summary>Stray ray on the first port against the peak, at the first angle.</summary>
    public (double Re, double Im) FirstStray;

    /// <summary>Stray ray on the second port against the peak, at the first angle.</summary>
    public (double Re, double Im) SecondStray;

    /// <summary>Whole turns of the phase of the stray ray over the cut, up to <see cref="StrayTable.MostTurns"/> either way.</summary>
    public int StrayTurns;

    /// <summary>Change of level from the first to the last angle in dB.</summary>
    public double DriftDb;

    /// <summary>Error of the angle in degrees.</summary>
    public double AngleDeg;

    /// <summary>Root mean square of the complex noise against the peak.</summary>
    public double Noise;

    /// <summary>Draws all errors.</summary>
    public static CutErrors Draw(ErrorTerms terms, ref TrialRandom random)
    {
        var errors = new CutErrors
        {
            LevelDb = ((terms.GainStandardDb ?? 0.0) * random.Normal())
                + ((terms.RepeatabilityDb ?? 0.0) * random.Normal())
                + random.Rectangular(terms.LinearityDb ?? 0.0)
                + random.Rectangular(terms.DistanceDb ?? 0.0)
                + ((terms.MismatchDb ?? 0.0) * Math.Sin(2.0 * Math.PI * random.Uniform())),
            BalanceDb = random.Rectangular(terms.BalanceDb ?? 0.0),
            BalancePhaseDeg = random.Rectangular(terms.BalancePhaseDeg ?? 0.0),
            StrayTurns = (int)Math.Floor(random.Uniform() * ((2 * StrayTable.MostTurns) + 1)) - StrayTable.MostTurns,
            DriftDb = random.Rectangular(terms.DriftDb ?? 0.0),
            AngleDeg = random.Rectangular(terms.AlignmentDeg ?? 0.0),
            Noise = terms.Noise ?? 0.0,
            FirstLeak = Phasor(terms.CrossPolar ?? 0.0, random.Uniform()),
            SecondLeak = Phasor(terms.CrossPolar ?? 0.0, random.Uniform()),
            FirstStray = Phasor(terms.Reflectivity ?? 0.0, random.Uniform()),
            SecondStray = Phasor(terms.Reflectivity ?? 0.0, random.Uniform()),
        };
        return errors;
    }

    /// <summary>Makes a phasor of an amplitude and a phase in turns.</summary>
    public static (double Re, double Im) Phasor(double amplitude, double turns)
    {
        var (sin, cos) = Math.SinCos(2.0 * Math.PI * turns);
        return (amplitude * cos, amplitude * sin);
    }
}
