using System.Numerics;
using CsCheck;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>What the data cannot tell is absent and remarked (IEEE Std 145: the ellipse needs amplitudes and phase of two components, or the amplitudes of both hands for all but its tilt).</summary>
public sealed class MissingKnowledgeTests
{
    private static readonly double[] Angles = SyntheticCut.Grid(-180.0, 180.0, 5.0);

    private static readonly PatternCut Known = SyntheticCut.Linear(
        Angles,
        deg => new Complex(1.0, 0.2) * Math.Exp(-deg * deg / 2000.0),
        deg => new Complex(0.1, -0.8) * Math.Exp(-deg * deg / 2500.0));

    [Fact]
    public void Two_linear_levels_without_phase_have_total_and_components_but_no_ellipse()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(Known.WithoutPhase()));
        var known = RunReduction.Reduce(SyntheticRun.OfCuts(Known));
        AssertAbsent(reduced, QuantityCatalogue.AxialRatio, QuantityCatalogue.Hand, QuantityCatalogue.TiltAngle, QuantityCatalogue.CrossPolarRatio, QuantityCatalogue.AxialRatioBeamwidth);
        Assert.DoesNotContain(reduced.Table.Figures, figure => figure.Component is FieldComponent.Right or FieldComponent.Left);
        Assert.True(reduced.Remarks("no-phase"));
        Assert.Equal(known.OnAxis(QuantityCatalogue.Level, FieldComponent.Total).Value, reduced.OnAxis(QuantityCatalogue.Level, FieldComponent.Total).Value, 1e-9);
        Assert.Equal(
            known.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value,
            reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value,
            1e-9);
    }

    [Fact]
    public void Two_circular_levels_without_phase_have_axial_ratio_and_hand_but_no_tilt_and_no_linear_components()
    {
        var circular = SyntheticCut.Circular(Angles, deg => Math.Exp(-deg * deg / 2000.0), deg => 0.1 * Math.Exp(-deg * deg / 4000.0)).WithoutPhase();
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(circular));
        Assert.Equal(1.7430, reduced.OnAxis(QuantityCatalogue.AxialRatio).Value, 1e-4);
        Assert.Equal(Hand.Right, reduced.OnAxis(QuantityCatalogue.Hand).Hand);
        AssertAbsent(reduced, QuantityCatalogue.TiltAngle);
        Assert.DoesNotContain(reduced.Table.Figures, figure => figure.Component is FieldComponent.Theta or FieldComponent.Phi);
        Assert.True(reduced.Remarks("no-phase"));
    }

    [Fact]
    public void A_single_channel_has_its_level_and_its_own_beam_but_nothing_of_two_components()
    {
        foreach (var (cut, component) in new[]
        {
            (Known with { Second = null }, FieldComponent.Theta),
            (Known with { First = null }, FieldComponent.Phi),
            (Known with { Second = null, Basis = PolarizationBasis.RightLeft }, FieldComponent.Right),
        })
        {
            var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cut));
            AssertAbsent(reduced, QuantityCatalogue.AxialRatio, QuantityCatalogue.Hand, QuantityCatalogue.TiltAngle, QuantityCatalogue.CrossPolarRatio, QuantityCatalogue.AxialRatioBeamwidth);
            Assert.All(reduced.Table.Figures, figure => Assert.Equal(component, figure.Component));
            Assert.Single(reduced.Table.Of(QuantityCatalogue.HalfPowerBeamwidth));
            Assert.True(reduced.Remarks("single-channel"));
        }
    }

    [Fact]
    public void A_missing_sample_on_the_axis_gives_no_figure_there_and_its_neighbours_stay()
    {
        var axis = Array.IndexOf(Angles, 0.0);
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(Known.Without(axis)));
        Assert.DoesNotContain(reduced.Table.Figures, figure => figure.At == FigurePlace.Axis && figure.Quantity != QuantityCatalogue.AxialRatioBeamwidth);
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.AxialRatioBeamwidth));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.PeakDirection));
        Assert.All(reduced.Table.TracesOf(QuantityCatalogue.AxialRatio).Where(trace => trace.Axis == TraceAxis.Angle), trace =>
        {
            Assert.Equal(double.NaN, trace.Y[axis]);
            Assert.True(double.IsFinite(trace.Y[axis + 1]));
        });
    }

    [Fact]
    public void A_component_missing_at_one_frequency_does_not_turn_the_co_polar_hand_of_the_curve()
    {
        var cut = SyntheticCut.Complex(PolarizationBasis.RightLeft, [1e9, 1.1e9, 1.2e9], [-10.0, -5.0, 0.0, 5.0, 10.0], (_, _) => 1.0, (_, _) => 0.1).Without(2);
        var trace = Assert.Single(RunReduction.Reduce(SyntheticRun.OfCuts(cut)).Table.TracesOf(QuantityCatalogue.CrossPolarRatio));
        Assert.Equal(FieldComponent.Right, trace.Component);
        Assert.Equal(20.0, trace.Y[2], 1e-9);
        Assert.Equal(double.NaN, trace.Y[0]);
    }

    [Fact]
    public void Repeated_sweeps_and_cuts_are_named_and_the_first_counts()
    {
        var sweep = SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.1e9, 5e6), SyntheticSweep.Resonator(1e9, 20.0));
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(Known, Known).With("a", sweep).With("a", sweep));
        Assert.Equal("a/4.csv", Assert.Single(reduced.Remarks, remark => remark.Code is "sweep-not-reduced").Place!.Value.File);
        Assert.Equal("a/2.csv", Assert.Single(reduced.Remarks, remark => remark.Code is "cut-not-reduced").Place!.Value.File);
        Assert.Single(reduced.Table.Of(QuantityCatalogue.ResonanceFrequency));
    }

    // Whatever is missing: every figure has a number or says why it has none.
    [Fact]
    public void Any_cut_with_holes_reduces_and_every_figure_is_finite_or_says_why()
    {
        var sample = Gen.Frequency((6, Gen.Double[-1.0, 1.0]), (1, Gen.Const(double.NaN)), (1, Gen.Const(0.0)));
        var planes = Gen.Int[3, 30].SelectMany(angles => Gen.Select(sample.Array[2 * angles].Array[4], Gen.Bool, Gen.Bool, Gen.Double[0.5, 40.0], Gen.Int[0, 2])
            .Select((values, circular, phase, step, channels) => new PatternCut
            {
                Axis = CutAxis.Theta,
                FixedDeg = 0.0,
                FrequencyHz = [1e9, 2e9],
                AngleDeg = [.. Enumerable.Range(0, angles).Select(i => -180.0 + (i * Math.Min(step, 360.0 / (angles - 1))))],
                Basis = circular ? PolarizationBasis.RightLeft : PolarizationBasis.ThetaPhi,
                First = channels == 1 ? null : new(values[0], phase ? values[1] : null),
                Second = channels == 2 ? null : new(values[2], phase ? values[3] : null),
            }));
        planes.Sample(
            cut =>
            {
                var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cut));
                foreach (var figure in reduced.Table.Figures.Where(figure => figure.Quantity != QuantityCatalogue.Hand))
                {
                    Assert.True(double.IsFinite(figure.Value) || figure.Why is not null, $"{figure.Quantity} at {figure.At} of {figure.Component} is {figure.Value} without a reason");
                    Assert.False(double.IsFinite(figure.Value) && figure.Why is not null);
                }

                Assert.All(reduced.Table.Of(QuantityCatalogue.AxialRatio), figure => Assert.False(figure.Value < 0.0));
                Assert.All(reduced.Table.Of(QuantityCatalogue.HalfPowerBeamwidth), figure => Assert.InRange(figure.Value, 0.0, 360.0));
                Assert.All(reduced.Table.Of(QuantityCatalogue.SidelobeLevel), figure => Assert.True(figure.Value <= 1e-9));
            },
            iter: 1000,
            seed: "000000000011");
    }

    private static void AssertAbsent(ReducedRun reduced, params Quantity[] quantities)
    {
        foreach (var quantity in quantities)
        {
            Assert.Empty(reduced.Table.Of(quantity));
            Assert.Empty(reduced.Table.TracesOf(quantity));
        }
    }
}
