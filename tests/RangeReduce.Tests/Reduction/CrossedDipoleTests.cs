using System.Numerics;
using RangeReduce.Quantities;
using RangeReduce.Reduction.Cuts;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>
/// Source: closed form of two short dipoles at right angles fed in quadrature (standard antenna texts). In a cut through the axis
/// E_θ = cos θ and E_φ = −j, so |R| = (1 + cos θ)/√2 and |L| = (1 − cos θ)/√2, and the axial ratio is exactly 1/|cos θ|:
/// 3 dB at arccos 10^(−3/20) = 44.932 degrees on either side. The right-hand part is a Huygens source, 131.06 degrees wide.
/// </summary>
public sealed class CrossedDipoleTests
{
    private static double Cos(double deg) => Math.Cos(double.DegreesToRadians(deg));

    [Theory]
    [InlineData(-180.0, 180.0, 1.0)]
    [InlineData(0.0, 358.0, 2.0)]
    [InlineData(-90.0, 90.0, 5.0)]
    public void Axial_ratio_beamwidth_and_partial_beamwidth_are_those_of_the_closed_form(double first, double last, double step)
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.Linear(SyntheticCut.Grid(first, last, step), deg => Cos(deg), _ => -Complex.ImaginaryOne)));
        var width = reduced.Single(QuantityCatalogue.AxialRatioBeamwidth);
        Assert.Equal(89.864, width.Value, 2e-3 * step);
        Assert.Equal(0.0, Math.IEEERemainder(width.DirectionDeg!.Value, 360.0), 1e-6);
        Assert.Null(width.Open);

        // The left-hand part is the same source turned round, and in a whole turn the two are equal.
        Assert.Equal(131.06, reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component is FieldComponent.Right or FieldComponent.Left).Value, 0.01);
        Assert.Equal(0.0, reduced.OnAxis(QuantityCatalogue.AxialRatio).Value, 1e-9);
        Assert.Equal(Hand.Right, reduced.OnAxis(QuantityCatalogue.Hand).Hand);
        var cross = reduced.OnAxis(QuantityCatalogue.CrossPolarRatio, FieldComponent.Right);
        Assert.True(!double.IsFinite(cross.Value) && cross.Why is not null);
        Assert.DoesNotContain(reduced.Table.Of(QuantityCatalogue.TiltAngle), figure => figure.At == FigurePlace.Axis);
    }

    [Fact]
    public void Off_the_axis_the_ratio_is_one_over_cosine_and_the_hand_turns_behind()
    {
        foreach (var (axis, hand) in new[] { (60.0, Hand.Right), (120.0, Hand.Left), (30.5, Hand.Right), (180.0, Hand.Left) })
        {
            var run = SyntheticRun.OfCuts(SyntheticCut.Linear(SyntheticCut.Grid(-180.0, 180.0, 1.0), deg => Cos(deg), _ => -Complex.ImaginaryOne)) with { AxisDeg = axis };
            var reduced = RunReduction.Reduce(run);
            Assert.Equal(-20.0 * Math.Log10(Math.Abs(Cos(axis))), reduced.OnAxis(QuantityCatalogue.AxialRatio).Value, 1e-3);
            Assert.Equal(hand, reduced.OnAxis(QuantityCatalogue.Hand).Hand);
            var component = hand == Hand.Right ? FieldComponent.Right : FieldComponent.Left;
            Assert.Equal(20.0 * Math.Log10((1.0 + Math.Abs(Cos(axis))) / Math.Sqrt(2.0)), reduced.OnAxis(QuantityCatalogue.Level, component).Value, 1e-3);
            if (axis is not 180.0)
            {
                // The smaller component lies along theta there, so the major axis lies along phi.
                Assert.Equal(90.0, reduced.Single(QuantityCatalogue.TiltAngle, figure => figure.At == FigurePlace.Axis).Value, 1e-6);
            }
        }
    }

    [Fact]
    public void The_intended_hand_is_co_polar_even_where_the_other_is_stronger()
    {
        var cut = SyntheticCut.Circular(SyntheticCut.Grid(-90.0, 90.0, 5.0), _ => 1.0, _ => 0.1);
        var right = RunReduction.Reduce(SyntheticRun.Of(new RangeReduce.Runs.ConfigurationState("a", Hand.Right)).With("a", cut));
        var left = RunReduction.Reduce(SyntheticRun.Of(new RangeReduce.Runs.ConfigurationState("a", Hand.Left)).With("a", cut));
        Assert.Equal(20.0, right.OnAxis(QuantityCatalogue.CrossPolarRatio, FieldComponent.Right).Value, 1e-9);
        Assert.Equal(-20.0, left.OnAxis(QuantityCatalogue.CrossPolarRatio, FieldComponent.Left).Value, 1e-9);
        Assert.Equal(1.7430, right.OnAxis(QuantityCatalogue.AxialRatio).Value, 1e-4);
    }

    [Fact]
    public void A_whole_turn_within_three_decibels_is_360_degrees_wide_and_not_open()
    {
        var turn = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.Circular(SyntheticCut.Grid(-180.0, 175.0, 5.0), _ => 1.0, _ => 0.1))).Single(QuantityCatalogue.AxialRatioBeamwidth);
        Assert.Equal(360.0, turn.Value, 1e-9);
        Assert.Null(turn.Open);
        var part = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.Circular(SyntheticCut.Grid(-40.0, 60.0, 5.0), _ => 1.0, _ => 0.1))).Single(QuantityCatalogue.AxialRatioBeamwidth);
        Assert.Equal(100.0, part.Value, 1e-9);
        Assert.Equal("both", part.Open);
        var none = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.Circular(SyntheticCut.Grid(-40.0, 60.0, 5.0), _ => 1.0, _ => 0.5))).Single(QuantityCatalogue.AxialRatioBeamwidth);
        Assert.Equal(0.0, none.Value);
    }

    // Cross over co 0.17100 is the axial ratio of 3 dB. It grows in proportion to the distance from 1.6 GHz and reaches that at ± 20 MHz.
    [Fact]
    public void The_axial_ratio_band_ends_where_the_closed_form_says()
    {
        double[] grid = SyntheticSweep.Grid(1.5e9, 1.7e9, 10e6);
        var limit = AxialRatioBeamwidthFigure.CrossOverCo(3.0);
        Assert.Equal(0.17100, limit, 1e-5);
        var cut = SyntheticCut.Complex(RangeReduce.Patterns.PolarizationBasis.RightLeft, grid, SyntheticCut.Grid(-10.0, 10.0, 5.0), (_, _) => 1.0, (hertz, _) => 0.03 + (limit - 0.03) * Math.Pow((hertz - 1.6e9) / 20e6, 2.0));
        var band = RunReduction.Reduce(SyntheticRun.OfCuts(cut)).Single(QuantityCatalogue.AxialRatioBand, figure => figure.Rank == 1);
        Assert.Equal(1.58e9, band.LowHz!.Value, 1e3);
        Assert.Equal(1.62e9, band.HighHz!.Value, 1e3);
        Assert.Equal(40e6, band.Value, 2e3);
    }
}
