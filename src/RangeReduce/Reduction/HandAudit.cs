using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction;

/// <summary>Holds the measured hand of each state against the hand it is meant or known to have.</summary>
/// <remarks>A sign error turns right into left and nobody notices: when every state is turned it is a convention, when one of several is, its files are swapped or mislabelled.</remarks>
public static class HandAudit
{
    private const string Conventions = "the time factor (exp(+jwt) or exp(-iwt)), the sign or the order of the two probe ports, the sense in which the angle is counted";

    /// <summary>Adds a remark for every state whose measured hand is not the expected one.</summary>
    public static void Add(MeasurementRun run, ReductionContext context)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(context);
        var judged = run.States
            .Select(state => (State: state, Expected: state.KnownHand ?? state.IntendedHand, Found: MainHand(context.Table, state.Name)))
            .Where(row => row.Expected is Hand.Right or Hand.Left && row.Found is not null)
            .ToArray();
        var turned = judged.Where(row => row.Found is Hand.Right or Hand.Left && row.Found != row.Expected).ToArray();
        foreach (var (state, expected, found) in turned)
        {
            var cause = judged.Length == 1
                ? $"No other state tells, so it may be the conventions ({Conventions}) or a swapped or mislabelled file."
                : turned.Length == judged.Length
                ? $"Every state is turned, so look at the conventions first: {Conventions}. Files of two states that were exchanged look the same."
                : judged.Any(row => row.Found == row.Expected)
                ? "Other states have the hand that they should, so look first for swapped or mislabelled files of this state."
                : $"The other states are linear, so it may be the conventions ({Conventions}) or a swapped or mislabelled file.";
            context.Remarks.Add(
                RemarkSeverity.Fault,
                state.KnownHand is null ? "hand-not-intended" : "hand-not-known",
                $"State {state.Name} measures {found!.Value.Word()}-hand on the axis where {expected!.Value.Word()}-hand is {(state.KnownHand is null ? "intended" : "known for certain")}. {cause}",
                state.Name);
        }
    }

    /// <summary>Gives the hand that most frequencies show on the axis; null where none was measured.</summary>
    private static Hand? MainHand(FigureTable table, string state) => table.Of(QuantityCatalogue.Hand)
        .Where(figure => figure is { Source: DataSource.Measured, At: FigurePlace.Axis, PhiDeg: null, ThetaDeg: null, Method: null } && string.Equals(figure.State, state, StringComparison.Ordinal))
        .GroupBy(figure => figure.Hand)
        .OrderByDescending(group => group.Count())
        .FirstOrDefault()?.Key;
}
