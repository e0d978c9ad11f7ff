using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction.Cuts;

/// <summary>The keys that all figures and traces of one cut share.</summary>
/// <param name="source">The cut and whose it is.</param>
/// <param name="method">The method, where the same state has cuts by more than one kind of probe; else null.</param>
/// <param name="context">The run and its table.</param>
internal sealed class CutKeys(StateCut source, string? method, ReductionContext context)
{
    /// <summary>Gets the cut and whose it is.</summary>
    public StateCut Source { get; } = source;

    /// <summary>Gets the run and its table.</summary>
    public ReductionContext Context { get; } = context;

    /// <summary>Gets the stated noise floor in the decibels of the cut; −∞ where none is stated.</summary>
    public double NoiseFloorDb { get; } = NoiseReference.FloorDb(context.Run, source);

    /// <summary>Gives <c>gain</c> where 0 dB is an isotropic radiator, else <c>level</c>.</summary>
    public Quantity LevelQuantity => LevelQuantityOf(Source);

    /// <summary>Gives <c>gain</c> where 0 dB is an isotropic radiator, else <c>level</c>.</summary>
    public static Quantity LevelQuantityOf(StateCut cut) => cut.Cut.Reference == LevelReference.Isotropic ? QuantityCatalogue.Gain : QuantityCatalogue.Level;

    /// <summary>Gives the words that name the cut in a remark.</summary>
    public string Words => FormattableString.Invariant($"the {Source.Source.Word()} cut {FixedName} of state {Source.State}");

    private string FixedName => double.IsNaN(Source.Cut.FixedDeg)
        ? "(fixed angle not given)"
        : FormattableString.Invariant($"{(Source.Cut.Axis == CutAxis.Theta ? "phi" : "theta")} = {Source.Cut.FixedDeg:0.##} deg");

    /// <summary>Gives whether the cut stands beside others of the same state that give the figures without a method.</summary>
    public bool IsBeside => method is not null;

    /// <summary>Makes a figure with the keys of the cut.</summary>
    public Figure Figure(Quantity quantity, double frequencyHz, double value, string formula) => new()
    {
        Quantity = quantity,
        Value = value,
        State = Source.State,
        Source = Source.Source,
        FrequencyHz = frequencyHz,
        PhiDeg = Fixed(CutAxis.Theta),
        ThetaDeg = Fixed(CutAxis.Phi),
        Method = method,
        Realized = quantity == QuantityCatalogue.Gain ? Source.Cut.IsRealized : null,
        Origin = Context.OriginOfCut(Source.InputIds, formula),
    };

    /// <summary>Makes a trace along the angle with the keys of the cut.</summary>
    public Trace Trace(Quantity quantity, double frequencyHz, double[] y, FieldComponent component, string formula) => new()
    {
        Quantity = quantity,
        Axis = TraceAxis.Angle,
        X = Source.Cut.AngleDeg,
        Y = y,
        State = Source.State,
        Source = Source.Source,
        FrequencyHz = frequencyHz,
        PhiDeg = Fixed(CutAxis.Theta),
        ThetaDeg = Fixed(CutAxis.Phi),
        Component = component,
        Method = method,
        Origin = Context.OriginOfCut(Source.InputIds, formula),
    };

    private double? Fixed(CutAxis axis) => Source.Cut.Axis == axis && !double.IsNaN(Source.Cut.FixedDeg) ? Source.Cut.FixedDeg : null;
}
