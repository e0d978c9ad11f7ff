using RangeReduce.Comparison;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Comparison;

/// <summary>Rule: simple acceptance (ILAC-G8:09/2019), and nothing is met where the data do not reach.</summary>
public sealed class RequirementEvaluatorTests
{
    private static readonly double[] Frequencies = [1.58e9, 1.60e9, 1.62e9, 1.64e9];
    private static readonly double[] Angles = SyntheticCut.Grid(-90.0, 90.0, 10.0);

    // The cross-polar part grows with frequency and away from the axis; the axial ratio on the axis is (1 + q)/(1 − q) with q = 0.05, 0.10, 0.15, 0.20.
    private static readonly PatternCut Cut = SyntheticCut.Complex(
        PolarizationBasis.RightLeft,
        Frequencies,
        Angles,
        (_, deg) => Math.Exp(-deg * deg / 4000.0),
        (hertz, deg) => Math.Exp(-deg * deg / 4000.0) * ((2.5 * ((hertz / 1e9) - 1.56)) + (0.005 * Math.Abs(deg))));

    private static readonly Requirement AxialRatio = new() { Id = "r1", Quantity = QuantityCatalogue.AxialRatio, State = "a", BandLowHz = 1.58e9, BandHighHz = 1.62e9, AtMost = 3.0 };

    private static double AxialRatioOf(double crossOverCo) => 20.0 * Math.Log10((1.0 + crossOverCo) / (1.0 - crossOverCo));

    [Fact]
    public void A_bound_over_a_band_is_judged_by_the_worst_value_and_says_where_it_is()
    {
        var met = Evaluate(AxialRatio);
        Assert.Equal(RequirementVerdict.Met, met.Verdict);
        Assert.Equal(AxialRatioOf(0.15), met.Worst, 1e-9);
        Assert.Equal(3.0 - AxialRatioOf(0.15), met.Margin, 1e-9);
        Assert.Equal("worst at 1.62 GHz", met.Reason);
        Assert.StartsWith("axial ratio of state a at most 3 dB from 1.58 to 1.62 GHz", met.Text, StringComparison.Ordinal);

        var failed = Evaluate(AxialRatio with { AtMost = 2.5 });
        Assert.Equal(RequirementVerdict.NotMet, failed.Verdict);
        Assert.Equal(2.5 - AxialRatioOf(0.15), failed.Margin, 1e-9);

        // Exactly on the bound is met.
        Assert.Equal(RequirementVerdict.Met, Evaluate(AxialRatio with { AtMost = met.Worst }).Verdict);
    }

    [Fact]
    public void Between_two_frequencies_the_end_of_the_band_counts_too()
    {
        var outcome = Evaluate(AxialRatio with { BandHighHz = 1.63e9 });
        Assert.Equal("worst at 1.63 GHz", outcome.Reason);
        Assert.InRange(outcome.Worst, AxialRatioOf(0.15), AxialRatioOf(0.20));
    }

    [Fact]
    public void A_band_that_the_data_do_not_cover_is_undecided_unless_what_is_there_already_fails()
    {
        var undecided = Evaluate(AxialRatio with { BandLowHz = 1.5e9, BandHighHz = 1.60e9 });
        Assert.Equal(RequirementVerdict.Undecided, undecided.Verdict);
        Assert.Contains("only from 1.58", undecided.Reason, StringComparison.Ordinal);
        Assert.Equal(RequirementVerdict.NotMet, Evaluate(AxialRatio with { BandLowHz = 1.5e9, AtMost = 1.0 }).Verdict);
    }

    [Fact]
    public void A_missing_sample_inside_the_band_leaves_it_undecided()
    {
        var hole = Cut.Without([.. Enumerable.Range(Angles.Length, Angles.Length)]);
        var outcome = Evaluate(AxialRatio, hole);
        Assert.Equal(RequirementVerdict.Undecided, outcome.Verdict);
        Assert.Contains("1.6 GHz is missing", outcome.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void What_was_not_measured_is_undecided()
    {
        var outcome = Evaluate(AxialRatio with { Quantity = QuantityCatalogue.Gain, AtMost = null, AtLeast = 3.0 });
        Assert.Equal(RequirementVerdict.Undecided, outcome.Verdict);
        Assert.Empty(outcome.FigureIds);
        Assert.Equal(RequirementVerdict.Undecided, Evaluate(AxialRatio with { State = "other" }).Verdict);
    }

    [Fact]
    public void A_hand_is_met_where_all_of_the_band_was_measured_so()
    {
        var hand = new Requirement { Id = "r1", Quantity = QuantityCatalogue.Hand, State = "a", BandLowHz = 1.58e9, BandHighHz = 1.64e9, EqualTo = Hand.Right };
        Assert.Equal(RequirementVerdict.Met, Evaluate(hand).Verdict);
        Assert.Equal(RequirementVerdict.NotMet, Evaluate(hand with { EqualTo = Hand.Left }).Verdict);
        Assert.Equal(RequirementVerdict.Undecided, Evaluate(hand with { BandLowHz = 1.4e9 }).Verdict);
        Assert.Equal(RequirementVerdict.Undecided, Evaluate(hand, Cut with { Second = null }).Verdict);
        Assert.Equal(RequirementVerdict.Undecided, Evaluate(hand with { ConeDeg = 10.0 }).Verdict);
    }

    [Fact]
    public void A_bound_over_a_cone_is_judged_over_the_cone_and_not_on_the_axis()
    {
        var inside = Evaluate(AxialRatio with { ConeDeg = 20.0, AtMost = 5.0 });
        Assert.Equal(RequirementVerdict.Met, inside.Verdict);
        Assert.Equal(AxialRatioOf(0.15 + (0.005 * 20.0)), inside.Worst, 1e-9);
        Assert.Contains("1.62 GHz, ", inside.Reason, StringComparison.Ordinal);
        Assert.Equal(RequirementVerdict.NotMet, Evaluate(AxialRatio with { ConeDeg = 20.0 }).Verdict);

        // Its rim counts between samples, and beyond the cut nothing is decided.
        Assert.InRange(Evaluate(AxialRatio with { ConeDeg = 15.0 }).Worst, AxialRatioOf(0.20), AxialRatioOf(0.25));
        Assert.Equal(RequirementVerdict.Undecided, Evaluate(AxialRatio with { ConeDeg = 120.0, AtMost = 30.0 }).Verdict);
    }

    [Fact]
    public void A_requirement_without_a_state_asks_every_state_that_was_measured()
    {
        var run = Run(Cut).With("b", SyntheticCut.Complex(PolarizationBasis.RightLeft, [1.60e9], Angles, (_, _) => 1.0, (_, _) => 0.01));
        var outcome = Evaluate(AxialRatio with { State = null }, run with { States = [.. run.States, new("b"), new("c")] });
        Assert.Equal(RequirementVerdict.Undecided, outcome.Verdict);
        Assert.Contains("worst at 1.62 GHz in state a", outcome.Reason, StringComparison.Ordinal);
        Assert.Equal(RequirementVerdict.NotMet, Evaluate(AxialRatio with { State = null, AtMost = 2.0 }, run with { States = [.. run.States, new("b")] }).Verdict);
    }

    [Fact]
    public void A_beamwidth_without_a_component_is_that_of_all_the_power()
    {
        var reduced = RunReduction.Reduce(Run(Cut) with { Requirements = [new() { Id = "r1", Quantity = QuantityCatalogue.HalfPowerBeamwidth, State = "a", AtLeast = 10.0 }] });
        var outcome = Assert.Single(reduced.Requirements);
        var worst = Assert.Single(reduced.Table.Figures, figure => outcome.FigureIds.Contains(figure.Id, StringComparer.Ordinal));
        Assert.Equal(FieldComponent.None, worst.Component);
        Assert.Equal(reduced.Table.Of(QuantityCatalogue.HalfPowerBeamwidth).Where(figure => figure.Component == FieldComponent.None).Min(figure => figure.Value), outcome.Worst);
    }

    [Fact]
    public void A_match_band_and_a_return_loss_over_a_band_are_judged_from_the_sweep()
    {
        var run = SyntheticRun.OfSweep(SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.1e9, 2e6), SyntheticSweep.Resonator(1e9, 20.0)));
        var width = new Requirement { Id = "r1", Quantity = QuantityCatalogue.MatchBand, State = "a", AtLeast = 30e6 };
        Assert.Equal(RequirementVerdict.Met, Evaluate(width, run).Verdict);
        Assert.Equal(RequirementVerdict.NotMet, Evaluate(width with { AtLeast = 34e6 }, run).Verdict);

        // The edges at 10 dB are 983.472 and 1016.806 MHz (closed form of the series resonator).
        var loss = new Requirement { Id = "r1", Quantity = QuantityCatalogue.ReturnLoss, State = "a", BandLowHz = 0.984e9, BandHighHz = 1.016e9, AtLeast = 10.0 };
        Assert.Equal(RequirementVerdict.Met, Evaluate(loss, run).Verdict);
        Assert.Equal(RequirementVerdict.NotMet, Evaluate(loss with { BandHighHz = 1.018e9 }, run).Verdict);
    }

    private static MeasurementRun Run(PatternCut cut) => SyntheticRun.OfCuts(cut);

    private static RequirementOutcome Evaluate(Requirement requirement, PatternCut? cut = null) => Evaluate(requirement, Run(cut ?? Cut));

    private static RequirementOutcome Evaluate(Requirement requirement, MeasurementRun run) => Assert.Single(RunReduction.Reduce(run with { Requirements = [requirement] }).Requirements);
}
