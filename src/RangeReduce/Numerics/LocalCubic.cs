namespace RangeReduce.Numerics;

/// <summary>Interpolation between two neighbouring samples by the cubic through them and one more on each side.</summary>
/// <remarks>
/// Near a dip or on the flank of a beam a straight line between samples is off by the square of the step, the cubic by its fourth power.
/// At the ends of the data, and next to a missing sample, it falls back to the polynomial through the samples that are there.
/// </remarks>
public static class LocalCubic
{
    /// <summary>Interpolates at an abscissa between sample <paramref name="segment"/> and the next one.</summary>
    /// <param name="x">Abscissae, strictly rising.</param>
    /// <param name="y">Ordinates, as many as <paramref name="x"/>; NaN marks a missing one.</param>
    /// <param name="segment">Index of the sample to the left.</param>
    /// <param name="at">The abscissa, between x[segment] and x[segment + 1].</param>
    /// <returns>The ordinate; NaN if one of the two samples around is missing.</returns>
    public static double Interpolate(ReadOnlySpan<double> x, ReadOnlySpan<double> y, int segment, double at)
    {
        var first = segment > 0 && double.IsFinite(y[segment - 1]) ? segment - 1 : segment;
        var last = segment + 2 < x.Length && double.IsFinite(y[segment + 2]) ? segment + 2 : segment + 1;

        return LocalCubicKernel.Evaluate(x[first..(last + 1)], y[first..(last + 1)], at);
    }
}
