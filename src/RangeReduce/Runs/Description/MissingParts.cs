using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Runs.Description;

/// <summary>Says what a run lacks and what that costs.</summary>
internal static class MissingParts
{
    /// <summary>Gives one sentence for each part that is missing.</summary>
    public static IEnumerable<string> Of(MeasurementRun run)
    {
        foreach (var state in run.States.Select(state => state.Name))
        {
            if (!run.Sweeps.Any(sweep => IsMeasured(sweep.State, sweep.Source, state)))
            {
                yield return $"State {state} has no measured sweep: no return loss, match band or input impedance.";
            }

            if (!run.Cuts.Any(cut => IsMeasured(cut.State, cut.Source, state)))
            {
                yield return $"State {state} has no measured cut: no level, beamwidth, axial ratio or hand.";
            }
        }

        if (!run.Sweeps.Any(sweep => sweep.Source == DataSource.Simulated) && !run.Cuts.Any(cut => cut.Source == DataSource.Simulated))
        {
            yield return "Nothing simulated: no comparison of measured with simulated.";
        }

        if (run.GainStandard is null or { Readings.Count: 0 } && run.Cuts.Any(cut => cut.Cut.Reference == LevelReference.Receiver))
        {
            yield return "No gain standard with table and levels: levels, but no gain.";
        }

        if (run.Cuts.Count > 0 && run.Cuts.All(cut => cut.Cut is { IsComplex: false, Basis: PolarizationBasis.ThetaPhi }))
        {
            yield return "No cut with the phase of both linear components: no hand, axial ratio or tilt.";
        }

        if (run.Cuts.Count > 0 && (run.RangeLengthM is null || run.LargestDimensionM is null))
        {
            yield return "Range length or largest dimension of the antenna not stated: the far-field distance cannot be checked.";
        }

        if (run.UncertaintyTerms.Count == 0)
        {
            yield return "No term of the uncertainty budget stated: figures come without uncertainty, or with the part that the data give.";
        }

        if (run.Requirements.Count == 0)
        {
            yield return "No requirement stated: figures without a verdict.";
        }
    }

    private static bool IsMeasured(string state, DataSource source, string wanted) => source == DataSource.Measured && string.Equals(state, wanted, StringComparison.Ordinal);
}
