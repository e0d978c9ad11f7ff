using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Reduction.Cuts;
using RangeReduce.Reduction.Sphere;
using RangeReduce.Reduction.Sweeps;
using RangeReduce.Runs;

namespace RangeReduce.Reduction;

/// <summary>Runs every reducer over a corrected run.</summary>
public static class RunReducer
{
    /// <summary>Makes all figures and traces that one state and source give by themselves.</summary>
    /// <param name="run">The run as corrected.</param>
    /// <param name="progress">Told the share that is done, from 0 to 1; may be null.</param>
    /// <param name="cancellationToken">Stops the work between two cuts.</param>
    /// <returns>The table and the remarks, in the same order for the same run.</returns>
    /// <exception cref="OperationCanceledException">The work was stopped.</exception>
    public static ReductionContext Reduce(MeasurementRun run, IProgress<double>? progress, CancellationToken cancellationToken)
    {
        ArgumentNullException.ThrowIfNull(run);

        // One task a state and source, each with a table of its own; the tables are joined in order, so that two cores give the same rows as one.
        var parts = run.States
            .SelectMany(state => new[] { DataSource.Measured, DataSource.Simulated, DataSource.Expected }.Select(source => (State: state.Name, Source: source)))
            .ToArray();
        var contexts = new ReductionContext[parts.Length];
        var done = 0;
        Parallel.For(0, parts.Length, new ParallelOptions { CancellationToken = cancellationToken }, index =>
        {
            contexts[index] = ReducePart(run, parts[index].State, parts[index].Source, cancellationToken);
            progress?.Report((double)Interlocked.Increment(ref done) / parts.Length);
        });

        var joined = new ReductionContext(run);
        foreach (var context in contexts)
        {
            joined.Table.AddAll(context.Table);
            foreach (var remark in context.Remarks.Remarks)
            {
                joined.Remarks.Add(remark);
            }
        }

        return joined;
    }

    private static ReductionContext ReducePart(MeasurementRun run, string state, DataSource source, CancellationToken cancellationToken)
    {
        var context = new ReductionContext(run);

        // Two sweeps or two like cuts of one state would give every figure twice: the first one gives the figures, and the others are named.
        var sweeps = run.Sweeps.Where(sweep => sweep.Source == source && string.Equals(sweep.State, state, StringComparison.Ordinal)).ToArray();
        foreach (var (sweep, index) in sweeps.Select((sweep, index) => (sweep, index)))
        {
            if (index == 0)
            {
                ReflectionReducer.Reduce(sweep, context);
                continue;
            }

            context.Remarks.Add(RemarkSeverity.Doubt, "sweep-not-reduced", $"State {state} has more than one {source.Word()} sweep: figures are made of the first, not of this one.", state, context.PlaceOf(sweep.InputId));
        }

        var all = run.Cuts.Where(cut => cut.Source == source && string.Equals(cut.State, state, StringComparison.Ordinal)).ToArray();
        var cuts = all.DistinctBy(CutKey).ToArray();
        foreach (var repeat in all.Except(cuts))
        {
            context.Remarks.Add(RemarkSeverity.Doubt, "cut-not-reduced", $"State {state} has the same {source.Word()} cut more than once: figures are made of the first, not of this one.", state, context.PlaceOf(repeat.InputIds[0]));
        }

        // Two linear components with phase tell everything, so they give the figures without a method; other kinds stand beside them.
        var kinds = cuts.GroupBy(cut => (cut.Cut.Basis, cut.Cut.Reference))
            .OrderByDescending(kind => kind.All(cut => cut.Cut.IsComplex))
            .ThenBy(kind => kind.Key.Basis)
            .ToArray();
        foreach (var kind in kinds)
        {
            // Only where a state was taken with two kinds of probe must its figures say which.
            var method = kinds.Length == 1 || kind.Key == kinds[0].Key ? null : kind.Key.Basis == PolarizationBasis.RightLeft ? "dual-circular probe" : "dual-linear probe";
            var reduced = new List<ReducedCut>();
            foreach (var cut in kind)
            {
                cancellationToken.ThrowIfCancellationRequested();
                reduced.Add(CutReducer.Reduce(cut, method, context));
            }

            foreach (var grid in reduced.GroupBy(cut => cut.Cut.FrequencyHz, FrequencyGridComparer.Instance))
            {
                ReducedCut[] together = [.. grid];
                AxisReducer.Reduce(together, method, context);
                if (method is null)
                {
                    ConeReducer.Reduce(together, context);
                    DirectivityReducer.Reduce(together, context);
                }
            }
        }

        return context;
    }

    private static (CutAxis Axis, double FixedDeg, PolarizationBasis Basis, double Low, double High) CutKey(StateCut cut) =>
        (cut.Cut.Axis, cut.Cut.FixedDeg, cut.Cut.Basis, cut.Cut.FrequencyHz[0], cut.Cut.FrequencyHz[^1]);
}
