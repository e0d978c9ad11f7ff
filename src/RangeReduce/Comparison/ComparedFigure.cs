using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>One row of a comparison of runs.</summary>
/// <param name="Key">What the row is about.</param>
/// <param name="Figures">The figure of each run, in the order of the runs; null where a run has none.</param>
/// <param name="Differences">Difference of each run's figure from that of the first run; NaN where one of them is missing, and 0 for the first.</param>
/// <param name="Expanded">Expanded uncertainty of each difference, in the unit of the quantity; NaN where it is not known.</param>
public sealed record ComparedFigure(FigureKey Key, IReadOnlyList<Figure?> Figures, IReadOnlyList<double> Differences, IReadOnlyList<double> Expanded)
{
    /// <summary>Gives whether the difference of a run is larger than its uncertainty; null where that cannot be told.</summary>
    public bool? IsSignificant(int run) => double.IsFinite(Differences[run]) && double.IsFinite(Expanded[run]) ? Math.Abs(Differences[run]) > Expanded[run] : null;
}
