using RangeReduce.Quantities;
using RangeReduce.Reporting.Plots;
using RangeReduce.Runs;

namespace RangeReduce.Reporting.Sections;

/// <summary>What every section asks for: the table by its keys, the styles of the states, and the frequency at which each state's pattern is shown.</summary>
internal sealed class ReportContext
{
    private readonly Dictionary<string, StateFrequency> _frequencies;
    private readonly Lookup<(string Quantity, string? State), Figure> _figures;
    private readonly Lookup<(string Quantity, string? State), Trace> _traces;

    /// <summary>Prepares the queries.</summary>
    public ReportContext(ReducedRun reduced, ReportOptions options)
    {
        (Reduced, Options) = (reduced, options);
        States = [.. reduced.Run.States.Select(state => state.Name)
            .Concat(reduced.Table.Figures.Where(figure => figure.State is not null).Select(figure => figure.State!)).Distinct(StringComparer.Ordinal)];
        Styles = new StateStyles(States);
        _figures = (Lookup<(string, string?), Figure>)reduced.Table.Figures.ToLookup(figure => (figure.Quantity.Id, figure.State));
        _traces = (Lookup<(string, string?), Trace>)reduced.Table.Traces.ToLookup(trace => (trace.Quantity.Id, trace.State));
        _frequencies = States.ToDictionary(state => state, state => StateFrequency.Choose(this, state), StringComparer.Ordinal);
    }

    /// <summary>Gets the reduced run.</summary>
    public ReducedRun Reduced { get; }

    /// <summary>Gets the run.</summary>
    public MeasurementRun Run => Reduced.Run;

    /// <summary>Gets the options.</summary>
    public ReportOptions Options { get; }

    /// <summary>Gets the names of the states in order.</summary>
    public IReadOnlyList<string> States { get; }

    /// <summary>Gets the styles of the states.</summary>
    public StateStyles Styles { get; }

    /// <summary>Gives the frequency at which the pattern of a state is shown.</summary>
    public StateFrequency FrequencyOf(string state) => _frequencies[state];

    /// <summary>Gives the figures of a quantity and a state, in order.</summary>
    public IEnumerable<Figure> Figures(Quantity quantity, string? state) => _figures[(quantity.Id, state)];

    /// <summary>Gives the traces of a quantity and a state, in order.</summary>
    public IEnumerable<Trace> Traces(Quantity quantity, string? state) => _traces[(quantity.Id, state)];

    /// <summary>Gives the first figure that satisfies a condition: measured where there is one, of the first kind of probe, over all cuts before that of one cut, at the lowest fixed angle.</summary>
    public Figure? Find(Quantity quantity, string state, Func<Figure, bool> condition) => Figures(quantity, state)
        .Where(figure => condition(figure) && figure.OtherState is null)
        .OrderBy(figure => figure.Source switch { DataSource.Measured => 0, null => 1, _ => 2 })
        .ThenBy(figure => figure.Method is null ? 0 : 1)
        .ThenBy(figure => figure.PhiDeg ?? figure.ThetaDeg ?? double.NegativeInfinity)
        .ThenBy(figure => figure.Rank ?? 0)
        .FirstOrDefault();

    /// <summary>Gives the first figure of a state at the frequency at which its pattern is shown.</summary>
    public Figure? FindAtCut(Quantity quantity, string state, Func<Figure, bool> condition) =>
        FrequencyOf(state).CutHz is { } cut ? Find(quantity, state, figure => Same(figure.FrequencyHz, cut) && condition(figure)) : null;

    /// <summary>Gives whether two frequencies are the same but for rounding.</summary>
    public static bool Same(double? oneHz, double otherHz) => oneHz is { } value && Math.Abs(value - otherHz) <= 1e-9 * Math.Abs(otherHz);

    /// <summary>Gives gain where the cuts of a state are calibrated, else level.</summary>
    public Quantity LevelQuantity(string state) => Traces(QuantityCatalogue.Gain, state).Any() ? QuantityCatalogue.Gain : QuantityCatalogue.Level;

    /// <summary>Gives the hand that a state is meant to have; null where that was not stated.</summary>
    public Hand? IntendedHand(string state) => Run.States.FirstOrDefault(known => string.Equals(known.Name, state, StringComparison.Ordinal))?.IntendedHand;

    /// <summary>Gives the co-polar and the cross-polar component of a state: by the intended hand, else by the hand that was found; null where neither is known.</summary>
    public (FieldComponent Co, FieldComponent Cross)? CoCross(string state)
    {
        var hand = IntendedHand(state) ?? FindAtCut(QuantityCatalogue.Hand, state, figure => figure.At == FigurePlace.Axis)?.Hand;
        return hand switch
        {
            Hand.Right => (FieldComponent.Right, FieldComponent.Left),
            Hand.Left => (FieldComponent.Left, FieldComponent.Right),
            _ => null,
        };
    }
}
