namespace RangeReduce.Comparison;

/// <summary>Outcome of a Feature Selective Validation of two curves (IEEE Std 1597.1).</summary>
public sealed record FsvResult
{
    /// <summary>The readings of the method that this implementation takes; totals of two implementations compare only with equal readings.</summary>
    public const string Choices = "linear interpolation on a uniform axis over the overlap with the larger point count; bins 0 to 3 are the offset; "
        + "break point 5 bins above the lower 40 % bin; ramp of 7 bins; central differences of step 1; totals are means of the points";

    /// <summary>Gets the common axis, as many values as each measure has points.</summary>
    public required double[] X { get; init; }

    /// <summary>Gets the number of points N of the common axis.</summary>
    public int Count => X.Length;

    /// <summary>Gets whether the curves were interpolated.</summary>
    public required bool Resampled { get; init; }

    /// <summary>Gets the bin of the Fourier transform in whose midst the slow and the fast part of both curves part.</summary>
    public required int BreakPoint { get; init; }

    /// <summary>Gets the amplitude difference measure.</summary>
    public required FsvMeasure Amplitude { get; init; }

    /// <summary>Gets the feature difference measure.</summary>
    public required FsvMeasure Feature { get; init; }

    /// <summary>Gets the global difference measure.</summary>
    public required FsvMeasure Global { get; init; }

    /// <summary>Gets the offset difference measure: the term of the lowest four bins inside <see cref="Amplitude"/>.</summary>
    public required FsvMeasure Offset { get; init; }

    /// <summary>Gets the linear correlation coefficient of the two curves; NaN where a curve is constant.</summary>
    /// <remarks>The method takes absolute values and is blind to a change of sign; this number is not.</remarks>
    public required double Correlation { get; init; }
}
