using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>A run that takes part in a comparison of runs.</summary>
/// <param name="Name">Name of the run.</param>
/// <param name="Date">Date of the run as YYYY-MM-DD; null where not stated.</param>
/// <param name="Figures">Its figures.</param>
public sealed record ComparedRun(string Name, string? Date, IReadOnlyList<Figure> Figures);
