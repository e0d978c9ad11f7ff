namespace RangeReduce.Patterns;

/// <summary>One cut as a file gives it: channels by the name in the heading, before it is said which component each one is.</summary>
public sealed record RawCut
{
    /// <summary>Gets the angle that moves.</summary>
    public required CutAxis Axis { get; init; }

    /// <summary>Gets the fixed angle in degrees (phi of a theta cut, theta of a phi cut); NaN where the file does not say.</summary>
    public required double FixedDeg { get; init; }

    /// <summary>Gets the frequencies in hertz, strictly rising; one NaN where the file does not say.</summary>
    public required double[] FrequencyHz { get; init; }

    /// <summary>Gets the angles in degrees, strictly rising.</summary>
    public required double[] AngleDeg { get; init; }

    /// <summary>Gets the channels, each over [frequency, angle]. The name is the heading's, in lower case and without unit: <c>h</c>, <c>v</c>, <c>theta</c>, <c>phi</c>, <c>right</c>, <c>left</c>, or any other.</summary>
    public required IReadOnlyList<(string Name, PatternChannel Samples)> Channels { get; init; }

    /// <summary>Gets what 0 dB means.</summary>
    public LevelReference Reference { get; init; }

    /// <summary>Gets the first and last line of the samples in the file.</summary>
    public (int First, int Last) Lines { get; init; }

    /// <summary>Gets the readings beyond the first at a frequency and angle, for repeatability; null where there are none.</summary>
    public RepeatedReadings? Repeats { get; init; }
}
