namespace RangeReduce.Numerics;

/// <summary>Refines a maximum between samples by the parabola through the highest sample and its two neighbours.</summary>
public static class ParabolicPeak
{
    /// <summary>Refines a maximum.</summary>
    /// <param name="x">Abscissae of the three samples, strictly rising.</param>
    /// <param name="y">Ordinates; the middle one is the highest.</param>
    /// <returns>Abscissa and ordinate of the vertex; those of the middle sample where a neighbour is missing or the three lie on a line.</returns>
    public static (double X, double Y) Refine(ReadOnlySpan<double> x, ReadOnlySpan<double> y)
    {
        var (before, after) = (x[1] - x[0], x[2] - x[1]);
        var slopeBefore = (y[1] - y[0]) / before;
        var slopeAfter = (y[2] - y[1]) / after;
        var bend = (slopeAfter - slopeBefore) / (before + after);
        if (!(bend < 0.0) || !double.IsFinite(bend))
        {
            return (x[1], y[1]);
        }

        // Newton's form about the middle sample: y = y1 + slope t + bend t², with the slope there from both sides.
        var slope = ((slopeBefore * after) + (slopeAfter * before)) / (before + after);
        var shift = -slope / (2.0 * bend);
        return (x[1] + shift, y[1] + (0.5 * slope * shift));
    }
}
