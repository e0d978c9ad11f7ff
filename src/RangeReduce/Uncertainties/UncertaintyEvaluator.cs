using System.Globalization;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Reduction;
using RangeReduce.Runs;

namespace RangeReduce.Uncertainties;

/// <summary>Gives every measured figure its uncertainty: Monte Carlo trials through the reducers (JCGM 101) with the terms that the manifest states.</summary>
public static class UncertaintyEvaluator
{
    /// <summary>Number of trials of an ordinary run: the ends of a 95 % interval are then known to about 11 % of its half width.</summary>
    public const int UsualTrials = 250;

    /// <summary>Evaluates a table.</summary>
    /// <param name="run">The run as corrected, whose cuts and sweeps the figures were made of.</param>
    /// <param name="table">The figures.</param>
    /// <param name="trials">Number of trials, at least 100.</param>
    /// <param name="cancellationToken">Stops the work.</param>
    /// <returns>A table with the same rows in the same order, measured figures with uncertainty; the table itself where the manifest states no term.</returns>
    public static FigureTable Evaluate(MeasurementRun run, FigureTable table, int trials, CancellationToken cancellationToken)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(table);
        ArgumentOutOfRangeException.ThrowIfLessThan(trials, 100);
        var terms = ErrorTerms.Of(run);
        if (terms.Given.Count == 0)
        {
            return table;
        }

        var measured = table.Figures.Where(figure => figure.Source == DataSource.Measured && double.IsFinite(figure.Value)).ToArray();
        var jobs = CutJobs(run, measured, terms, trials).Concat(SweepJobs(run, measured, terms, trials)).ToArray();
        var found = new Dictionary<string, Uncertainty>(StringComparer.Ordinal);
        Parallel.ForEach(jobs, new ParallelOptions { CancellationToken = cancellationToken }, job =>
        {
            var part = job();
            lock (found)
            {
                foreach (var (id, uncertainty) in part)
                {
                    found[id] = uncertainty;
                }
            }
        });

        var evaluated = new FigureTable();
        var open = table.Of(QuantityCatalogue.AxialRatio).Where(ratio => found.TryGetValue(ratio.Id, out var uncertainty) && uncertainty is { Low: not null, High: null }).Select(DirectionOf).ToHashSet();
        foreach (var figure in table.Figures)
        {
            // Where the interval of the axial ratio reaches infinity the ellipse may turn either way: no hand is named.
            var kept = figure.Hand is Hand.Right or Hand.Left && open.Contains(DirectionOf(figure))
                ? figure with { Hand = Hand.Linear, Origin = figure.Origin with { Formula = "linear: within its uncertainty the axial ratio is infinite, so neither hand is sure" } }
                : figure;
            evaluated.Add(found.TryGetValue(figure.Id, out var uncertainty) ? kept with { Uncertainty = uncertainty } : kept);
        }

        foreach (var trace in table.Traces)
        {
            evaluated.Add(trace);
        }

        return evaluated;
    }

    private static (string? State, DataSource? Source, double? FrequencyHz, double? PhiDeg, double? ThetaDeg, FigurePlace At, string? Method) DirectionOf(Figure figure) =>
        (figure.State, figure.Source, figure.FrequencyHz, figure.PhiDeg, figure.ThetaDeg, figure.At, figure.Method);

    private static IEnumerable<Func<IEnumerable<(string Id, Uncertainty Value)>>> CutJobs(MeasurementRun run, Figure[] measured, ErrorTerms terms, int trials)
    {
        var byInput = measured.Where(figure => figure.FrequencyHz is not null && figure.At is not FigurePlace.Resonance and not FigurePlace.Cone).ToLookup(figure => (figure.State, figure.FrequencyHz));
        var axisOwners = new HashSet<(string?, double?, string?)>();
        foreach (var source in run.Cuts.Where(cut => cut.Source == DataSource.Measured && cut.Cut is { First: not null, Second: not null }))
        {
            var cut = ReducedCut.Of(source);
            var noiseReference = NoiseReference.AmplitudeOf(run, source);
            for (var i = 0; i < source.Cut.FrequencyHz.Length; i++)
            {
                var (index, hertz) = (i, source.Cut.FrequencyHz[i]);
                var own = byInput[(source.State, hertz)].Where(figure => IsOf(figure, source)).ToArray();

                // What all cuts say together about the axis is given the uncertainty of one of them: their common errors do not average out.
                var axis = byInput[(source.State, hertz)].Where(figure => figure is { PhiDeg: null, ThetaDeg: null } && figure.Origin.Inputs.Contains(source.InputIds[0], StringComparer.Ordinal)).ToArray();
                var figures = axis.Length > 0 && axisOwners.Add((source.State, hertz, axis[0].Method)) ? [.. own, .. axis] : own;
                if (figures.Length > 0)
                {
                    yield return () => Job(cut, index, noiseReference, figures);
                }
            }
        }

        IEnumerable<(string, Uncertainty)> Job(ReducedCut cut, int index, double noiseReference, Figure[] figures)
        {
            var state = run.States.FirstOrDefault(state => string.Equals(state.Name, cut.Source.State, StringComparison.Ordinal));
            var front = figures.FirstOrDefault(figure => figure.Quantity == QuantityCatalogue.SidelobeLevel && figure.BackLobe is false)?.DirectionDeg ?? double.NaN;
            var back = figures.FirstOrDefault(figure => figure.Quantity == QuantityCatalogue.SidelobeLevel && figure.BackLobe is true)?.DirectionDeg ?? double.NaN;
            var trial = new CutTrial(cut, index, run.AxisDeg, front, back, noiseReference, state?.IntendedHand);
            var result = CutUncertainty.Run(trial, terms, trials, Seed(cut.Source.InputIds[0], cut.Cut.FixedDeg, index));
            foreach (var figure in figures)
            {
                if (result.Of(figure) is { } uncertainty)
                {
                    yield return (figure.Id, uncertainty);
                }
            }
        }
    }

    private static bool IsOf(Figure figure, StateCut source)
    {
        var fixedDeg = source.Cut.Axis == CutAxis.Theta ? figure.PhiDeg : figure.ThetaDeg;
        return fixedDeg is { } given && given.Equals(source.Cut.FixedDeg) && figure.Origin.Inputs.Contains(source.InputIds[0], StringComparer.Ordinal);
    }

    private static IEnumerable<Func<IEnumerable<(string Id, Uncertainty Value)>>> SweepJobs(MeasurementRun run, Figure[] measured, ErrorTerms terms, int trials)
    {
        if (terms.Directivity is not { } directivity)
        {
            yield break;
        }

        foreach (var source in run.Sweeps.Where(sweep => sweep.Source == DataSource.Measured && sweep.Sweep is { HasPhase: true, Ports: 1 }))
        {
            var figures = measured.Where(figure => figure.Origin.Inputs.Count == 1
                && string.Equals(figure.Origin.Inputs[0], source.InputId, StringComparison.Ordinal)
                && BudgetRules.TermsOf(figure.Quantity).Contains(ErrorTerms.DirectivityKey, StringComparer.Ordinal)).ToArray();
            if (figures.Length > 0)
            {
                yield return () => SweepUncertainty.Of(new(source.Sweep, 0), figures, directivity, trials, Seed(source.InputId, 0.0, 0))
                    .Select((uncertainty, k) => (figures[k].Id, uncertainty))
                    .Where(pair => pair.uncertainty is not null)
                    .Select(pair => (pair.Id, pair.uncertainty!));
            }
        }
    }

    /// <summary>Makes a seed of what is being tried, so that a figure has the same trials whatever else the run holds.</summary>
    private static ulong Seed(string inputId, double fixedDeg, int index)
    {
        // FNV-1a, 64 bit.
        var hash = 14695981039346656037UL;
        foreach (var letter in string.Create(CultureInfo.InvariantCulture, $"{inputId} {fixedDeg} {index}"))
        {
            hash = (hash ^ letter) * 1099511628211UL;
        }

        return hash;
    }
}
