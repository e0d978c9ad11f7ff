namespace RangeReduce.Patterns;

/// <summary>One pattern cut in a stated polarization basis: planar samples over [frequency, angle].</summary>
public sealed record PatternCut
{
    /// <summary>Gets the angle that moves.</summary>
    public required CutAxis Axis { get; init; }

    /// <summary>Gets the fixed angle in degrees: phi of a theta cut, theta of a phi cut; NaN where it was not given.</summary>
    public required double FixedDeg { get; init; }

    /// <summary>Gets the frequencies in hertz, strictly rising.</summary>
    public required double[] FrequencyHz { get; init; }

    /// <summary>Gets the angles in degrees, strictly rising.</summary>
    public required double[] AngleDeg { get; init; }

    /// <summary>Gets the basis.</summary>
    public required PolarizationBasis Basis { get; init; }

    /// <summary>Gets the first component (theta or right) over [frequency, angle]; null where it was not taken.</summary>
    public PatternChannel? First { get; init; }

    /// <summary>Gets the second component (phi or left) over [frequency, angle]; null where it was not taken.</summary>
    public PatternChannel? Second { get; init; }

    /// <summary>Gets what 0 dB means.</summary>
    public LevelReference Reference { get; init; }

    /// <summary>Gets whether the mismatch of the antenna is inside the levels, so that they are realized gain; only of use with <see cref="LevelReference.Isotropic"/>.</summary>
    public bool IsRealized { get; init; }

    /// <summary>Gives whether both components with phase are there, so that every polarization figure can be made.</summary>
    public bool IsComplex => First is { HasPhase: true } && Second is { HasPhase: true };
}
