using RangeReduce.Networks;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Tests.Synthetic;

/// <summary>Runs in memory, for tests of what comes after reading.</summary>
internal static class SyntheticRun
{
    /// <summary>An empty run with the states named.</summary>
    public static MeasurementRun Of(params ConfigurationState[] states) => new()
    {
        Information = new() { Name = "synthetic", Folder = "synthetic" },
        States = states,
    };

    /// <summary>A run of one state with measured cuts.</summary>
    public static MeasurementRun OfCuts(params PatternCut[] cuts) => cuts.Aggregate(Of(new ConfigurationState("a")), (run, cut) => run.With("a", cut));

    /// <summary>A run of one state with one measured sweep.</summary>
    public static MeasurementRun OfSweep(NetworkSweep sweep) => Of(new ConfigurationState("a")).With("a", sweep);

    /// <summary>Adds a cut and its input file.</summary>
    public static MeasurementRun With(this MeasurementRun run, string state, PatternCut cut, DataSource source = DataSource.Measured)
    {
        var input = InputOf(run, InputKind.Cut, state, source);
        return run with { Inputs = [.. run.Inputs, input], Cuts = [.. run.Cuts, new([input.Id], state, source, cut)] };
    }

    /// <summary>Adds a sweep and its input file.</summary>
    public static MeasurementRun With(this MeasurementRun run, string state, NetworkSweep sweep, DataSource source = DataSource.Measured)
    {
        var input = InputOf(run, InputKind.Sweep, state, source);
        return run with { Inputs = [.. run.Inputs, input], Sweeps = [.. run.Sweeps, new(input.Id, state, source, sweep)] };
    }

    /// <summary>Gives the only figure that fits.</summary>
    public static Figure Single(this ReducedRun reduced, Quantity quantity, Func<Figure, bool>? fits = null) =>
        Assert.Single(reduced.Table.Of(quantity), figure => fits?.Invoke(figure) ?? true);

    /// <summary>Gives the only figure of the axis as all cuts see it.</summary>
    public static Figure OnAxis(this ReducedRun reduced, Quantity quantity, FieldComponent component = FieldComponent.None, string? state = null) =>
        reduced.Single(quantity, figure => figure is { At: FigurePlace.Axis, PhiDeg: null } && figure.Component == component && (state is null || string.Equals(figure.State, state, StringComparison.Ordinal)));

    /// <summary>Says whether a remark of a code is there.</summary>
    public static bool Remarks(this ReducedRun reduced, string code) => reduced.Remarks.Any(remark => string.Equals(remark.Code, code, StringComparison.Ordinal));

    private static InputFile InputOf(MeasurementRun run, InputKind kind, string state, DataSource source)
    {
        var number = run.Inputs.Count + 1;
        return new($"i{number}", $"{state}/{number}.csv", new('0', 64), 1, kind, state, source, "made up");
    }
}
