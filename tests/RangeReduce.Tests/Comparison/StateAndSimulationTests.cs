using System.Numerics;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Comparison;

public sealed class StateAndSimulationTests
{
    private static readonly double[] Angles = SyntheticCut.Grid(-40.0, 40.0, 5.0);

    // Common practice: 6 dB less is a reduction of power by 75 %, 10 dB by 90 %, 20 dB by 99 %.
    [Theory]
    [InlineData(6.0206, 75.0)]
    [InlineData(10.0, 90.0)]
    [InlineData(20.0, 99.0)]
    [InlineData(0.0, 0.0)]
    public void A_contrast_in_decibels_is_a_reduction_in_percent(double contrastDb, double percent)
    {
        var weaker = Math.Pow(10.0, -contrastDb / 20.0);
        var run = SyntheticRun.Of(new ConfigurationState("first"), new ConfigurationState("second"))
            .With("first", SyntheticCut.Circular(Angles, _ => weaker, _ => 1.0))
            .With("second", SyntheticCut.Circular(Angles, _ => 1.0, _ => weaker));
        var reduced = RunReduction.Reduce(run);
        var right = reduced.Single(QuantityCatalogue.SwitchingContrast, figure => figure.Component == FieldComponent.Right);
        Assert.Equal(contrastDb, right.Value, 1e-9);
        Assert.Equal(percent, reduced.Single(QuantityCatalogue.SwitchingReduction, figure => figure.Component == FieldComponent.Right).Value, 1e-4);
        if (contrastDb > 0.0)
        {
            Assert.Equal(("second", "first"), (right.State, right.OtherState));
            var left = reduced.Single(QuantityCatalogue.SwitchingContrast, figure => figure.Component == FieldComponent.Left);
            Assert.Equal(("first", "second"), (left.State, left.OtherState));
        }
    }

    [Fact]
    public void Every_figure_of_both_sides_has_a_deviation_and_a_tilt_turns_by_half_a_turn_only()
    {
        // Elliptical waves with major axes at +88 and −87 degrees: 5 degrees apart, not 175.
        static (Func<double, Complex> Theta, Func<double, Complex> Phi) Wave(double tiltDeg, double scale)
        {
            var (sin, cos) = Math.SinCos(double.DegreesToRadians(tiltDeg));
            var (major, minor) = (scale * Complex.One, scale * -0.5 * Complex.ImaginaryOne);
            return (deg => Beam(deg) * ((cos * major) - (sin * minor)), deg => Beam(deg) * ((sin * major) + (cos * minor)));
        }

        var (measured, simulated) = (Wave(88.0, 2.0), Wave(-87.0, 1.0));
        var run = SyntheticRun.Of(new ConfigurationState("a"))
            .With("a", SyntheticCut.Linear(Angles, measured.Theta, measured.Phi))
            .With("a", SyntheticCut.Linear(Angles, simulated.Theta, simulated.Phi), DataSource.Simulated)
            .With("a", SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.1e9, 2e6), SyntheticSweep.Resonator(1.005e9, 20.0)))
            .With("a", SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.1e9, 5e6), SyntheticSweep.Resonator(1e9, 20.0)), DataSource.Simulated);
        var reduced = RunReduction.Reduce(run);
        Figure Of(Quantity quantity, Func<Figure, bool>? fits = null) => reduced.Single(QuantityCatalogue.Deviation, figure => string.Equals(figure.Of, quantity.Id, StringComparison.Ordinal) && (fits?.Invoke(figure) ?? true));
        Assert.Equal(-5.0, Of(QuantityCatalogue.TiltAngle, figure => figure.At == FigurePlace.Axis).Value, 1e-6);
        Assert.Equal(6.0206, Of(QuantityCatalogue.Level, figure => figure is { At: FigurePlace.Axis, PhiDeg: null, Component: FieldComponent.Right }).Value, 1e-4);
        Assert.Equal(0.0, Of(QuantityCatalogue.AxialRatio, figure => figure is { At: FigurePlace.Axis, PhiDeg: null }).Value, 1e-9);
        var shift = Of(QuantityCatalogue.ResonanceFrequency);
        Assert.Equal(5e6, shift.Value, 10e3);
        Assert.Equal("Hz", shift.Unit);
        Assert.Null(shift.Source);
        Assert.Equal(2, shift.Origin.Inputs.Count);
        Assert.Equal(0.005 * 33.33e6, Of(QuantityCatalogue.MatchBand).Value, 20e3);
    }

    [Fact]
    public void A_band_that_the_data_cut_off_has_no_deviation()
    {
        var resonator = SyntheticSweep.Resonator(1e9, 20.0);
        var run = SyntheticRun.Of(new ConfigurationState("a"))
            .With("a", SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.01e9, 2e6), resonator))
            .With("a", SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.1e9, 2e6), resonator), DataSource.Simulated);
        var reduced = RunReduction.Reduce(run);
        Assert.DoesNotContain(reduced.Table.Of(QuantityCatalogue.Deviation), figure => figure.Of is "match-band" or "match-band-fraction");
        Assert.Contains(reduced.Table.Of(QuantityCatalogue.Deviation), figure => figure.Of is "resonance-frequency");
    }

    private static double Beam(double deg) => Math.Exp(-deg * deg / 1000.0);
}
