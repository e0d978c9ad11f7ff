namespace RangeReduce.Numerics;

/// <summary>Finds the runs over which a sampled curve is at most a limit, with edges interpolated between samples.</summary>
public static class BandFinder
{
    /// <summary>Finds all runs with y &lt;= limit, in rising order; the edges by <see cref="LocalCubic"/>.</summary>
    /// <param name="x">Abscissae, strictly rising.</param>
    /// <param name="y">Ordinates, as many; NaN marks a missing sample, which ends a run.</param>
    /// <param name="limit">The limit.</param>
    public static IReadOnlyList<Band> AtMost(double[] x, double[] y, double limit) =>
        AtMost(x, y, limit, (segment, at) => LocalCubic.Interpolate(x, y, segment, at));

    /// <summary>Finds all runs with y &lt;= limit, in rising order; the edges by a given interpolation.</summary>
    /// <param name="x">Abscissae, strictly rising.</param>
    /// <param name="y">Ordinates at the samples.</param>
    /// <param name="limit">The limit.</param>
    /// <param name="between">The curve between sample number (first argument) and the next one, at an abscissa (second argument).</param>
    /// <exception cref="ArgumentException">There are not as many ordinates as abscissae.</exception>
    public static IReadOnlyList<Band> AtMost(double[] x, double[] y, double limit, Func<int, double, double> between)
    {
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        ArgumentNullException.ThrowIfNull(between);
        if (x.Length != y.Length)
        {
            throw new ArgumentException("There must be as many ordinates as abscissae.", nameof(y));
        }

        var bands = new List<Band>();
        for (var i = 0; i < x.Length; i++)
        {
            if (!(y[i] <= limit))
            {
                continue;
            }

            var first = i;
            while (i + 1 < x.Length && y[i + 1] <= limit)
            {
                i++;
            }

            var openLow = first == 0 || double.IsNaN(y[first - 1]);
            var openHigh = i == x.Length - 1 || double.IsNaN(y[i + 1]);
            var low = openLow ? x[first] : Edge(first - 1);
            var high = openHigh ? x[i] : Edge(i);
            bands.Add(new(low, high, openLow, openHigh, first, i));
        }

        return bands;

        double Edge(int segment) => Bisection.Root(at => between(segment, at) - limit, x[segment], x[segment + 1]);
    }
}
