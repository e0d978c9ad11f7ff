using RangeReduce.Comparison;
using RangeReduce.Corrections;
using RangeReduce.Diagnostics;
using RangeReduce.Reduction;
using RangeReduce.Runs;
using RangeReduce.Uncertainties;

namespace RangeReduce;

/// <summary>The way of a run through the house: corrections, reduction, comparison.</summary>
public static class RunReduction
{
    /// <summary>Reduces a run that was read.</summary>
    /// <param name="run">The run as read.</param>
    /// <param name="options">Options; null for the usual ones.</param>
    /// <param name="progress">Told the share that is done, from 0 to 1; may be null.</param>
    /// <param name="cancellationToken">Stops the work.</param>
    /// <returns>The run as corrected, the table, the outcome of the requirements, and all remarks with faults first.</returns>
    /// <exception cref="OperationCanceledException">The work was stopped.</exception>
    public static ReducedRun Reduce(MeasurementRun run, ReductionOptions? options = null, IProgress<double>? progress = null, CancellationToken cancellationToken = default)
    {
        // The order is fixed: levels become gain before anything is taken from them.
        var corrected = SimulatedMismatchCorrection.Apply(GainStandardCorrection.Apply(run));
        var reduced = RunReducer.Reduce(corrected, progress, cancellationToken);
        HandAudit.Add(corrected, reduced);
        RangeAudit.Add(corrected, reduced);
        var table = UncertaintyEvaluator.Evaluate(corrected, reduced.Table, (options ?? new()).Trials, cancellationToken);
        StateComparison.Add(table);
        PolarizationMatch.Add(table);
        SimulationComparison.Add(table);
        var curveRemarks = CurveComparison.Add(table);
        var requirements = RequirementEvaluator.Evaluate(corrected, table);
        Remark[] remarks = [.. corrected.Remarks.Concat(reduced.Remarks.Remarks).Concat(curveRemarks).Distinct().OrderByDescending(remark => remark.Severity)];
        return new(corrected, table, requirements, remarks);
    }
}
