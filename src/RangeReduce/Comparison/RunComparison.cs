using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>Runs side by side: the same antenna tested again, two units of one design, before and after a test of the environment.</summary>
/// <remarks>
/// Uncertainties of the two runs are added in squares as if nothing were shared. Runs that share a gain standard share its error, which then cancels:
/// the uncertainty given is an upper bound.
/// </remarks>
public static class RunComparison
{
    /// <summary>Joins the figures of the runs.</summary>
    /// <param name="runs">The runs, at least one; differences are taken from the first.</param>
    /// <returns>One row for each thing that at least one run has a number or a hand for, in the order in which the runs bring them.</returns>
    public static IReadOnlyList<ComparedFigure> Compare(IReadOnlyList<ComparedRun> runs)
    {
        ArgumentNullException.ThrowIfNull(runs);
        var tables = runs.Select(run => run.Figures.Where(IsCompared).GroupBy(FigureKey.Of).ToDictionary(group => group.Key, group => group.First())).ToArray();
        return [.. tables.SelectMany(table => table.Keys).Distinct().Select(key => Row(key, [.. tables.Select(table => table.GetValueOrDefault(key))]))];
    }

    /// <summary>Gives the rows that a reader looks at first: the match at the deepest resonance, and the axis at the frequency nearest to it.</summary>
    /// <param name="rows">All rows.</param>
    public static IEnumerable<ComparedFigure> Headlines(IReadOnlyList<ComparedFigure> rows)
    {
        ArgumentNullException.ThrowIfNull(rows);
        var nearest = rows.Where(row => row.Key is { At: FigurePlace.Axis, PhiDeg: null, ThetaDeg: null, FrequencyHz: not null }).GroupBy(row => row.Key.State, StringComparer.Ordinal)
            .ToDictionary(group => group.Key ?? string.Empty, group => Nearest(rows, group.Key, group.Select(row => row.Key.FrequencyHz!.Value)), StringComparer.Ordinal);
        return rows.Where(row => row.Key.Method is null && row.Key.Rank is null or 1 && (row.Key.FrequencyHz is null
            || (row.Key is { PhiDeg: null, ThetaDeg: null } && row.Key.FrequencyHz.Equals(nearest.GetValueOrDefault(row.Key.State ?? string.Empty)))));
    }

    private static bool IsCompared(Figure figure) =>
        figure.Source == DataSource.Measured && figure.Quantity != QuantityCatalogue.Deviation && (double.IsFinite(figure.Value) || figure.Hand is not null);

    private static ComparedFigure Row(FigureKey key, Figure?[] figures)
    {
        var (differences, expanded) = (new double[figures.Length], new double[figures.Length]);
        var first = figures[0];
        for (var i = 1; i < figures.Length; i++)
        {
            var both = first is not null && figures[i] is not null;
            differences[i] = both ? FigureKey.Difference(first!.Quantity, figures[i]!.Value, first.Value) : double.NaN;
            expanded[i] = both ? Math.Sqrt(Square(first!.Uncertainty.Expanded) + Square(figures[i]!.Uncertainty.Expanded)) : double.NaN;
        }

        return new(key, figures, differences, expanded);
    }

    private static double Square(double value) => value * value;

    private static double? Nearest(IReadOnlyList<ComparedFigure> rows, string? state, IEnumerable<double> frequencies)
    {
        var all = frequencies.Distinct().Order().ToArray();
        var resonance = rows.FirstOrDefault(row => row.Key is { Quantity: "resonance-frequency", Rank: 1 } && string.Equals(row.Key.State, state, StringComparison.Ordinal))?.Figures.OfType<Figure>().First().Value;
        return resonance is { } hertz ? all.MinBy(frequency => Math.Abs(frequency - hertz)) : all[all.Length / 2];
    }
}
