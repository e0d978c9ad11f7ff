using RangeReduce.Comparison;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>Sources: closed forms (parabola of gain over frequency, shifted Gaussian beam, polarization efficiency of two ellipses) and the far-field conditions of IEEE Std 149 and common practice.</summary>
public sealed class AxisAndRangeTests
{
    [Fact]
    public void Gain_bands_of_a_parabola_end_where_it_has_fallen_by_one_and_three_decibels()
    {
        // 7 dBi less 1 dB at 50 MHz off: 3 dB at 50 √3 MHz, which the upper end of the data cuts off.
        double[] grid = SyntheticSweep.Grid(1.5e9, 1.66e9, 10e6);
        var cut = SyntheticCut.Complex(PolarizationBasis.RightLeft, grid, SyntheticCut.Grid(-10.0, 10.0, 5.0), (hertz, _) => Math.Pow(10.0, (7.0 - Math.Pow((hertz - 1.6e9) / 50e6, 2.0)) / 20.0), (_, _) => 0.01) with { Reference = LevelReference.Isotropic };
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cut));
        var one = reduced.Single(QuantityCatalogue.GainBand, figure => figure.Threshold == 1.0);
        Assert.Equal(1.55e9, one.LowHz!.Value, 1e3);
        Assert.Equal(1.65e9, one.HighHz!.Value, 1e3);
        var three = reduced.Single(QuantityCatalogue.GainBand, figure => figure.Threshold == 3.0);
        Assert.Equal(1.6e9 - (50e6 * Math.Sqrt(3.0)), three.LowHz!.Value, 1e3);
        Assert.Equal("high", three.Open);
    }

    [Fact]
    public void A_beam_beside_the_axis_squints_by_its_distance()
    {
        var cut = SyntheticCut.Circular(SyntheticCut.Grid(-60.0, 60.0, 2.0), deg => Math.Pow(10.0, -12.0 * Math.Pow((deg - 5.3) / 30.0, 2.0) / 20.0), _ => 0.0001);
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cut) with { AxisDeg = 2.0 });
        foreach (var method in new[] { "maximum", "half-power middle" })
        {
            Assert.Equal(3.3, reduced.Single(QuantityCatalogue.BeamSquint, figure => string.Equals(figure.Method, method, StringComparison.Ordinal)).Value, 1e-2);
        }
    }

    [Theory]
    [InlineData(3.0, 3.0, 0.0, 1.0)]
    [InlineData(3.0, 3.0, 90.0, 0.889591)]
    [InlineData(3.0, -3.0, 0.0, 0.110409)]
    [InlineData(3.0, 6.0, 90.0, 0.778378)]
    [InlineData(1.0, 3.0, 0.0, 0.987526)]
    public void Polarization_efficiency_is_that_of_the_closed_form(double oneDb, double otherDb, double tiltDeg, double expected)
    {
        Assert.Equal(expected, PolarizationMatch.Efficiency(Chi(oneDb), Chi(otherDb), tiltDeg), 1e-6);

        static double Chi(double axialRatioDb) => Math.Sign(axialRatioDb) * Math.Atan(Math.Pow(10.0, -Math.Abs(axialRatioDb) / 20.0));
    }

    [Fact]
    public void A_linear_state_takes_half_the_power_of_a_circular_one()
    {
        var angles = SyntheticCut.Grid(-10.0, 10.0, 5.0);
        var run = SyntheticRun.Of(new ConfigurationState("a"), new ConfigurationState("b"))
            .With("a", SyntheticCut.Circular(angles, _ => 1.0, _ => 0.0))
            .With("b", SyntheticCut.Linear(angles, _ => 1.0, _ => 0.0));
        var figure = RunReduction.Reduce(run).Single(QuantityCatalogue.PolarizationEfficiency);
        Assert.Equal(-3.0103, figure.Value, 1e-3);
        Assert.Equal("b", figure.OtherState);
    }

    // 1.6 GHz: ten wavelengths are 1.874 m.
    [Theory]
    [InlineData(4.2, 0.18, false)]
    [InlineData(1.8, 0.10, true)]
    [InlineData(4.2, 0.50, true)]
    public void A_range_that_is_too_short_is_named(double length, double dimension, bool near)
    {
        var cut = SyntheticCut.Complex(PolarizationBasis.RightLeft, [1.6e9], SyntheticCut.Grid(-10.0, 10.0, 5.0), (_, _) => 1.0, (_, _) => 0.1);
        var run = SyntheticRun.OfCuts(cut) with { RangeLengthM = length, LargestDimensionM = dimension };
        Assert.Equal(near, RunReduction.Reduce(run).Remarks("near-field"));
    }

    [Theory]
    [InlineData(1.0, false)]
    [InlineData(1.05, true)]
    public void A_turn_that_does_not_come_back_to_its_level_is_named(double last, bool open)
    {
        var cut = SyntheticCut.Circular(SyntheticCut.Grid(-180.0, 180.0, 5.0), deg => deg > 179.0 ? last : 1.0, _ => 0.01);
        Assert.Equal(open, RunReduction.Reduce(SyntheticRun.OfCuts(cut)).Remarks("cut-not-closed"));
    }
}
