namespace RangeReduce.Comparison;

/// <summary>How a frequency scale is looked for.</summary>
public sealed record FrequencyScaleOptions
{
    /// <summary>Gets how the simulated curve is read between its points.</summary>
    public CurveInterpolation Interpolation { get; init; } = CurveInterpolation.CubicSpline;

    /// <summary>Gets the largest departure of the scale from 1, as a ratio: 0.2 looks from 1/1.2 to 1.2.</summary>
    public double LargestDeparture { get; init; } = 0.2;

    /// <summary>Gets the least share of the measured points that the scaled simulated curve must cover.</summary>
    public double LeastCover { get; init; } = 0.7;
}
