using RangeReduce.Comparison;
using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce;

/// <summary>Everything that a report needs: the run as corrected, the table, the outcomes of the requirements and all remarks.</summary>
/// <param name="Run">The run after all corrections.</param>
/// <param name="Table">Figures and traces.</param>
/// <param name="Requirements">Outcome of each requirement, in the order of the manifest.</param>
/// <param name="Remarks">Remarks of reading, correcting and reducing, faults first, otherwise in order.</param>
public sealed record ReducedRun(MeasurementRun Run, FigureTable Table, IReadOnlyList<RequirementOutcome> Requirements, IReadOnlyList<Remark> Remarks);
