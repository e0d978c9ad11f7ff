using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Runs;

/// <summary>A pattern cut and whose it is.</summary>
/// <param name="InputIds">Ids of the input files that the cut was put together from.</param>
/// <param name="State">Configuration state.</param>
/// <param name="Source">Measured or simulated.</param>
/// <param name="Cut">The data, by the conventions of the run: exp(+jwt), theta and phi components or right and left.</param>
public sealed record StateCut(IReadOnlyList<string> InputIds, string State, DataSource Source, PatternCut Cut);
