using RangeReduce.Networks;
using RangeReduce.Quantities;

namespace RangeReduce.Runs;

/// <summary>A network sweep and whose it is.</summary>
/// <param name="InputId">Id of the input file.</param>
/// <param name="State">Configuration state.</param>
/// <param name="Source">Measured or simulated.</param>
/// <param name="Sweep">The data.</param>
public sealed record StateSweep(string InputId, string State, DataSource Source, NetworkSweep Sweep);
