namespace RangeReduce.Comparison;

/// <summary>How a sampled curve is read between its points.</summary>
public enum CurveInterpolation
{
    /// <summary>Natural cubic spline.</summary>
    CubicSpline,

    /// <summary>Straight lines.</summary>
    Linear,
}
