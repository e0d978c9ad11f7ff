using System.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Corrections;

/// <summary>
/// Source: IEEE Std 149, gain-comparison method, on each port by itself; a linear wave puts half its power in each hand (10 lg 2 = 3.0103 dB).
/// The chamber here is made up: every port has a gain of its own, the standard has 15 dBi, the antenna a right-hand partial gain of 8 dBic with 1.5 dB axial ratio.
/// </summary>
public sealed class GainComparisonTests
{
    private const double StandardDbi = 15.0;
    private const double RightDbic = 8.0;

    private static readonly double[] Frequencies = [1.0e9, 1.1e9, 1.2e9];
    private static readonly double[] Angles = SyntheticCut.Grid(-60.0, 60.0, 5.0);

    // Cross over co of 1.5 dB axial ratio.
    private static readonly double LeftOverRight = (Math.Pow(10.0, 1.5 / 20.0) - 1.0) / (Math.Pow(10.0, 1.5 / 20.0) + 1.0);

    private static double Right(double deg) => Math.Pow(10.0, RightDbic / 20.0) * Math.Exp(-deg * deg / 2000.0);

    private static (Complex Theta, Complex Phi) Antenna(double deg)
    {
        var (right, left) = (new Complex(Right(deg), 0.0), Complex.FromPolarCoordinates(LeftOverRight * Right(deg), 1.1));
        return ((right + left) / Math.Sqrt(2.0), -Complex.ImaginaryOne * (right - left) / Math.Sqrt(2.0));
    }

    [Fact]
    public void Linear_ports_of_unequal_gain_give_the_partial_gain_of_the_hand_without_any_three_decibels()
    {
        // The phi port is 7 dB weaker; both turn slowly over frequency.
        static double Theta(double hertz) => 0.020 * hertz / 1e9;
        static double Phi(double hertz) => 0.020 * Math.Pow(10.0, -7.0 / 20.0) * Math.Sqrt(hertz / 1e9);
        var cut = SyntheticCut.Complex(PolarizationBasis.ThetaPhi, Frequencies, Angles, (hertz, deg) => Theta(hertz) * Antenna(deg).Theta, (hertz, deg) => Phi(hertz) * Antenna(deg).Phi);
        var horn = Math.Pow(10.0, StandardDbi / 20.0);
        var along = SyntheticCut.Complex(PolarizationBasis.ThetaPhi, Frequencies, [-1.0, 0.0, 1.0], (hertz, deg) => Theta(hertz) * horn * (1.0 - (0.01 * deg * deg)), (hertz, _) => 0.01 * Phi(hertz) * horn);
        var across = SyntheticCut.Complex(PolarizationBasis.ThetaPhi, Frequencies, [-1.0, 0.0, 1.0], (hertz, _) => 0.01 * Theta(hertz) * horn, (hertz, deg) => Phi(hertz) * horn * (1.0 - (0.01 * deg * deg)));

        var reduced = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(cut), along, across));
        Assert.Equal(["gain-standard"], reduced.Run.Corrections.Select(correction => correction.Name), StringComparer.Ordinal);
        foreach (var hertz in Frequencies)
        {
            double On(FieldComponent component) => reduced.Single(QuantityCatalogue.Gain, figure => figure is { At: FigurePlace.Axis, PhiDeg: null } && figure.FrequencyHz == hertz && figure.Component == component).Value;
            double OnCut(FieldComponent component) => reduced.Single(QuantityCatalogue.Gain, figure => figure is { At: FigurePlace.Axis, PhiDeg: 0.0 } && figure.FrequencyHz == hertz && figure.Component == component).Value;
            Assert.Equal(RightDbic, On(FieldComponent.Right), 1e-6);
            Assert.Equal(RightDbic + (20.0 * Math.Log10(LeftOverRight)), On(FieldComponent.Left), 1e-6);

            // Partial gains of either pair add to the gain (IEEE Std 145): forgetting or doubling the 3 dB breaks this.
            var circular = Power(On(FieldComponent.Right)) + Power(On(FieldComponent.Left));
            Assert.Equal(circular, Power(OnCut(FieldComponent.Theta)) + Power(OnCut(FieldComponent.Phi)), 1e-6);
            Assert.Equal(10.0 * Math.Log10(circular), On(FieldComponent.Total), 1e-6);
            Assert.Equal(1.5, reduced.Single(QuantityCatalogue.AxialRatio, figure => figure is { At: FigurePlace.Axis, PhiDeg: null } && figure.FrequencyHz == hertz).Value, 1e-6);
        }

        Assert.All(reduced.Table.Of(QuantityCatalogue.Gain), figure => Assert.True(figure.Realized));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.Level));
    }

    [Fact]
    public void Imperfect_circular_ports_give_the_partial_gain_when_the_standard_stood_in_two_positions_at_right_angles()
    {
        // Each port of 2 dB axial ratio (cross over co 0.1146) has a gain of its own. It answers to a linear wave at tilt t with co + cross e^(j 2t).
        const double Leak = 0.11462;
        static Complex PortRight(double tiltDeg) => 0.03 * (1.0 + (Leak * Complex.FromPolarCoordinates(1.0, 0.4 + (2.0 * double.DegreesToRadians(tiltDeg)))));
        static Complex PortLeft(double tiltDeg) => 0.05 * (1.0 + (Leak * Complex.FromPolarCoordinates(1.0, 0.9 - (2.0 * double.DegreesToRadians(tiltDeg)))));
        var half = Math.Pow(10.0, StandardDbi / 20.0) / Math.Sqrt(2.0);
        PatternCut Reading(double tiltDeg) => SyntheticCut.Complex(PolarizationBasis.RightLeft, Frequencies, [0.0], (_, _) => half * PortRight(tiltDeg), (_, _) => half * PortLeft(tiltDeg));

        // A purely right-hand antenna: the right port takes it whole; its effective gain is that of the port over all tilts.
        var port = 0.03 * Math.Sqrt(1.0 + (Leak * Leak));
        var cut = SyntheticCut.Complex(PolarizationBasis.RightLeft, Frequencies, Angles, (_, deg) => port * Right(deg), (_, deg) => 1e-6 * Right(deg));

        foreach (var tilt in new[] { 0.0, 17.0, 45.0 })
        {
            var reduced = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(cut), Reading(tilt), Reading(tilt + 90.0)));
            Assert.Equal(RightDbic, reduced.Single(QuantityCatalogue.Gain, figure => figure is { At: FigurePlace.Axis, PhiDeg: null, FrequencyHz: 1.1e9, Component: FieldComponent.Right }).Value, 1e-4);
            Assert.False(reduced.Remarks("standard-one-position"));
        }

        var one = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(cut), Reading(0.0)));
        Assert.True(one.Remarks("standard-one-position"));
        Assert.InRange(Math.Abs(one.Single(QuantityCatalogue.Gain, figure => figure is { At: FigurePlace.Axis, PhiDeg: null, FrequencyHz: 1.1e9, Component: FieldComponent.Right }).Value - RightDbic), 0.3, 1.0);
    }

    [Fact]
    public void Outside_the_table_of_the_standard_there_is_no_gain_and_a_remark()
    {
        var cut = Plain(PolarizationBasis.ThetaPhi);
        var run = WithStandard(SyntheticRun.OfCuts(cut), Standing(1.0, 0.01), Standing(0.01, 1.0));
        var reduced = RunReduction.Reduce(run with { GainStandard = run.GainStandard! with { FrequencyHz = [0.9e9, 1.15e9] } });
        Assert.True(reduced.Remarks("standard-range"));
        Assert.Contains(reduced.Table.Of(QuantityCatalogue.Gain), figure => figure.FrequencyHz == 1.1e9);
        Assert.DoesNotContain(reduced.Table.Figures, figure => figure.FrequencyHz == 1.2e9);
    }

    [Fact]
    public void A_port_that_the_standard_never_stood_along_is_not_calibrated_by_leakage()
    {
        var reduced = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(Plain(PolarizationBasis.ThetaPhi)), Standing(1.0, 0.01)));
        Assert.True(reduced.Remarks("no-standard-reading"));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.Gain));
        Assert.NotEmpty(reduced.Table.Of(QuantityCatalogue.Level));

        reduced = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(Plain(PolarizationBasis.RightLeft)), Standing(1.0, 0.01), Standing(0.01, 1.0)));
        Assert.True(reduced.Remarks("no-standard-reading"));
        Assert.Empty(reduced.Run.Corrections);
    }

    [Fact]
    public void A_missing_sample_in_a_reading_is_passed_over_unless_the_maximum_may_lie_there()
    {
        var cut = Plain(PolarizationBasis.ThetaPhi);
        PatternCut Swept(double theta, double phi) => SyntheticCut.Complex(PolarizationBasis.ThetaPhi, Frequencies, [-2.0, -1.0, 0.0, 1.0, 2.0], (_, deg) => theta * (1.0 - (0.01 * deg * deg)), (_, deg) => phi * (1.0 - (0.01 * deg * deg)));
        var away = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(cut), Swept(1.0, 0.01).Without(0), Swept(0.01, 1.0)));
        Assert.False(away.Remarks("standard-range"));
        Assert.Contains(away.Table.Of(QuantityCatalogue.Gain), figure => figure.FrequencyHz == 1.0e9);

        // With the top of the reading along theta missing, the leakage in the other reading must not stand in for it.
        var top = RunReduction.Reduce(WithStandard(SyntheticRun.OfCuts(cut), Swept(1.0, 0.01).Without(2), Swept(0.01, 1.0)));
        Assert.True(top.Remarks("standard-range"));
        Assert.DoesNotContain(top.Table.Of(QuantityCatalogue.Gain), figure => figure.FrequencyHz == 1.0e9 && figure.Component == FieldComponent.Theta);
        Assert.Contains(top.Table.Of(QuantityCatalogue.Gain), figure => figure.FrequencyHz == 1.1e9);
    }

    // Realized gain is gain times 1 − |Γ|² (IEEE Std 145): |Γ| = 1/3 costs 0.5115 dB.
    [Fact]
    public void Simulated_gain_becomes_realized_by_the_simulated_mismatch()
    {
        var cut = Plain(PolarizationBasis.ThetaPhi) with { Reference = LevelReference.Isotropic };
        var run = SyntheticRun.Of(new ConfigurationState("a")).With("a", cut, DataSource.Simulated);
        var plain = RunReduction.Reduce(run);
        Assert.True(plain.Remarks("gain-not-realized"));
        var realized = RunReduction.Reduce(run.With("a", SyntheticSweep.Of([0.9e9, 1.0e9, 1.3e9], _ => Complex.FromPolarCoordinates(1.0 / 3.0, 0.7)), DataSource.Simulated));
        double GainOf(ReducedRun reduced) => reduced.Single(QuantityCatalogue.Gain, figure => figure is { At: FigurePlace.Axis, PhiDeg: null, FrequencyHz: 1.1e9, Component: FieldComponent.Total }).Value;
        Assert.Equal(0.5115, GainOf(plain) - GainOf(realized), 1e-4);

        // A sweep of one point cannot tell about a band.
        Assert.True(RunReduction.Reduce(run.With("a", SyntheticSweep.Of([1.0e9], _ => 0.1), DataSource.Simulated)).Remarks("gain-not-realized"));
    }

    private static double Power(double decibels) => Math.Pow(10.0, decibels / 10.0);

    private static PatternCut Plain(PolarizationBasis basis) => SyntheticCut.Complex(basis, Frequencies, Angles, (_, deg) => Right(deg), (_, deg) => 0.5 * Right(deg));

    private static PatternCut Standing(double theta, double phi) => SyntheticCut.Complex(PolarizationBasis.ThetaPhi, Frequencies, [0.0], (_, _) => theta, (_, _) => phi);

    private static MeasurementRun WithStandard(MeasurementRun run, params PatternCut[] readings) => run with
    {
        GainStandard = new("i90", [0.5e9, 2.0e9], [StandardDbi, StandardDbi], [.. readings.Select((cut, i) => new StateCut([$"i{91 + i}"], string.Empty, DataSource.Measured, cut))]),
    };
}
