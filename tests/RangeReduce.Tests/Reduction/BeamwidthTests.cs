using CsCheck;
using RangeReduce.Quantities;
using RangeReduce.Reduction;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>Sources: closed forms of standard antenna texts, evaluated at half power (10 lg 2 = 3.0103 dB, IEEE Std 145).</summary>
public sealed class BeamwidthTests
{
    private static double Sin(double deg) => Math.Sin(double.DegreesToRadians(deg));

    private static double Cos(double deg) => Math.Cos(double.DegreesToRadians(deg));

    // Half-wave dipole along the pole: [cos(90° cos θ)/sin θ]², maximum at 90 degrees, beam 78.08 degrees wide in every standard text.
    private static double HalfWaveDipole(double deg) => Math.Abs(Sin(deg)) < 1e-9 ? 0.0 : Math.Pow(Cos(90.0 * Cos(deg)) / Sin(deg), 2.0);

    [Theory]
    [InlineData(1.0, 0.003)]
    [InlineData(2.0, 0.003)]
    [InlineData(5.0, 0.03)]
    public void A_half_wave_dipole_is_78_08_degrees_wide(double step, double within)
    {
        var beam = BeamOf(SyntheticCut.Grid(0.0, 180.0, step), HalfWaveDipole);
        Assert.Equal(78.078, beam.WidthDeg, within);
        Assert.Equal(90.0, beam.PeakDeg, 1e-6);
    }

    [Fact]
    public void A_hertzian_dipole_is_90_degrees_wide_and_its_two_equal_lobes_have_no_one_direction()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(-180.0, 180.0, 2.0), deg => Math.Pow(Sin(deg), 2.0))));
        Assert.Equal(90.0, reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value, 1e-3);
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.PeakDirection));
        Assert.True(reduced.Remarks("peak-not-unique"));
        Assert.Equal(0.0, reduced.Single(QuantityCatalogue.SidelobeLevel).Value, 1e-9);
        Assert.Equal(0.0, reduced.Single(QuantityCatalogue.FrontToBackRatio).Value, 1e-9);
    }

    // The grid meets the two lobes at different places: neither sample is the maximum.
    [Fact]
    public void Two_equal_lobes_are_equal_even_where_the_grid_meets_them_unequally()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(-177.0, 178.0, 5.0), deg => Math.Exp(-Math.Pow(Math.IEEERemainder(deg - 40.4, 180.0) / 10.0, 2.0)))));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.PeakDirection));
        Assert.True(reduced.Remarks("peak-not-unique"));
    }

    // cos^n θ power in a half space: 2 arccos 2^(−1/n).
    [Theory]
    [InlineData(1, 120.000)]
    [InlineData(2, 90.000)]
    [InlineData(3, 74.935)]
    [InlineData(4, 65.530)]
    [InlineData(10, 42.175)]
    [InlineData(50, 19.037)]
    [InlineData(100, 13.476)]
    public void A_cosine_power_beam_has_its_closed_form_width(int power, double widthDeg)
    {
        var beam = BeamOf(SyntheticCut.Grid(-89.0, 89.0, 1.0), deg => Math.Pow(Cos(deg), power));
        Assert.Equal(widthDeg, beam.WidthDeg, 2e-3);
    }

    // Uniform line of 10 wavelengths: half power at u = 0.442946 π (2 asin gives 5.0775 degrees), first sidelobe −13.2615 dB at u = 1.430297 π (8.223 degrees).
    [Fact]
    public void A_uniform_line_source_has_a_first_sidelobe_of_minus_13_26_dB()
    {
        var cut = SyntheticCut.OfPower(SyntheticCut.Grid(-90.0, 90.0, 0.5), deg => Math.Pow(Sinc(Math.PI * 10.0 * Sin(deg)), 2.0));
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cut));
        Assert.Equal(5.0775, reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value, 0.002);
        var sidelobe = reduced.Single(QuantityCatalogue.SidelobeLevel);
        Assert.Equal(-13.2615, sidelobe.Value, 0.02);
        Assert.Equal(8.2232, Math.Abs(sidelobe.DirectionDeg!.Value), 0.03);
        Assert.False(sidelobe.BackLobe);
        Assert.True(reduced.Remarks("no-back"));
    }

    // Uniform circular aperture of 10 wavelengths: 2 J1(u)/u, first sidelobe −17.5701 dB, half power at 1.028994 λ/D (5.8983 degrees).
    [Fact]
    public void A_uniform_circular_aperture_has_a_first_sidelobe_of_minus_17_57_dB()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(-90.0, 90.0, 0.5), deg => Math.Pow(Jinc(Math.PI * 10.0 * Sin(deg)), 2.0))));
        Assert.Equal(5.8983, reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value, 0.002);
        Assert.Equal(-17.5701, reduced.Single(QuantityCatalogue.SidelobeLevel).Value, 0.02);
    }

    [Theory]
    [InlineData(0.0, 359.0, 1.0)]
    [InlineData(0.0, 360.0, 1.0)]
    [InlineData(-180.0, 180.0, 1.0)]
    [InlineData(-180.0, 179.0, 1.0)]
    [InlineData(-179.5, 179.5, 1.0)]
    [InlineData(-180.0, 190.0, 1.0)]
    public void A_beam_is_the_same_wherever_the_positioner_starts(double first, double last, double step)
    {
        for (var centre = -180.0; centre < 180.0; centre += 22.7)
        {
            var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(first, last, step), deg => Lobed(deg - centre))));
            Assert.Equal(60.0, reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value, 0.01);
            var direction = reduced.Single(QuantityCatalogue.PeakDirection).Value;
            Assert.Equal(0.0, Math.IEEERemainder(direction - centre, 360.0), 1e-3);
            Assert.InRange(direction, first - 1e-9, first + 360.0);
            Assert.Equal(20.0, reduced.Single(QuantityCatalogue.FrontToBackRatio).Value, 0.01);
            var lobe = reduced.Single(QuantityCatalogue.SidelobeLevel);
            Assert.Equal(-20.0, lobe.Value, 0.01);
            Assert.True(lobe.BackLobe);
            Assert.Equal(0.0, reduced.Single(QuantityCatalogue.Level, figure => figure is { At: FigurePlace.Peak, Component: FieldComponent.Total }).Value, 1e-3);
        }
    }

    [Fact]
    public void The_axis_is_found_under_any_count_of_the_angles()
    {
        foreach (var axis in new[] { 180.0, -180.0, 179.5, -179.5 })
        {
            var run = SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(-180.0, 179.0, 1.0), deg => Lobed(deg - axis))) with { AxisDeg = axis };
            var reduced = RunReduction.Reduce(run);
            Assert.Equal(0.0, reduced.OnAxis(QuantityCatalogue.Level, FieldComponent.Total).Value, 1e-3);
            Assert.False(reduced.Remarks("axis-outside"));
        }
    }

    [Fact]
    public void A_round_cut_has_neither_beamwidth_nor_direction_and_both_are_remarked()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(0.0, 355.0, 5.0), deg => 1.0 + (0.02 * Cos(3.0 * deg)))));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.HalfPowerBeamwidth));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.PeakDirection));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.SidelobeLevel));
        Assert.True(reduced.Remarks("no-beamwidth"));
        Assert.True(reduced.Remarks("peak-not-unique"));
    }

    [Fact]
    public void A_maximum_at_the_end_of_the_data_has_no_direction_and_no_width()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(0.0, 90.0, 1.0), deg => Math.Pow(Cos(deg), 4.0) + 1e-9)));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.HalfPowerBeamwidth));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.PeakDirection));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.SidelobeLevel));
        Assert.Equal(0.0, reduced.Single(QuantityCatalogue.Level, figure => figure is { At: FigurePlace.Peak, Component: FieldComponent.Total }).Value, 1e-6);
    }

    [Fact]
    public void A_gap_in_the_flank_of_the_beam_is_no_sidelobe_and_leaves_the_width_unknown()
    {
        var angles = SyntheticCut.Grid(-90.0, 90.0, 1.0);
        var cut = SyntheticCut.OfPower(angles, deg => Math.Pow(Cos(deg), 4.0) + 1e-6).Without(Array.IndexOf(angles, 10.0));
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cut));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.SidelobeLevel));
        Assert.Empty(reduced.Table.Of(QuantityCatalogue.HalfPowerBeamwidth));
        Assert.True(reduced.Remarks("no-beamwidth"));
    }

    [Fact]
    public void A_hole_over_the_seam_is_not_closed_by_a_hole_elsewhere()
    {
        double[] angles = [.. SyntheticCut.Grid(-150.0, -30.0, 2.0), .. SyntheticCut.Grid(30.0, 150.0, 2.0)];
        Assert.False(TurnedSpan.ClosesTurn(angles));
        Assert.True(TurnedSpan.ClosesTurn(SyntheticCut.Grid(-180.0, 175.0, 5.0)));
        Assert.False(TurnedSpan.ClosesTurn(SyntheticCut.Grid(-180.0, 170.0, 5.0)));
    }

    [Fact]
    public void An_exact_null_behind_the_beam_gives_no_front_to_back_number_but_a_reason()
    {
        // Huygens source, field (1 + cos θ)/2 (standard texts): half-power beamwidth 131.06 degrees, nothing behind.
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.OfPower(SyntheticCut.Grid(-180.0, 180.0, 1.0), deg => Math.Abs(deg) > 179.9 ? 0.0 : Math.Pow((1.0 + Cos(deg)) / 2.0, 2.0))));
        Assert.Equal(131.0604, reduced.Single(QuantityCatalogue.HalfPowerBeamwidth, figure => figure.Component == FieldComponent.None).Value, 1e-3);
        var ratio = reduced.Single(QuantityCatalogue.FrontToBackRatio);
        Assert.False(double.IsFinite(ratio.Value));
        Assert.NotNull(ratio.Why);
    }

    [Fact]
    public void A_constant_on_the_level_changes_no_width_no_direction_and_no_ratio() => Gen.Double[-120.0, 60.0].Sample(
        offset =>
        {
            var angles = SyntheticCut.Grid(-180.0, 179.0, 3.0);
            var plain = Array.ConvertAll(angles, deg => 10.0 * Math.Log10(Lobed(deg - 17.0)));
            Assert.True(Beam.TryFind(angles, plain, out var one));
            Assert.True(Beam.TryFind(angles, Array.ConvertAll(plain, level => level + offset), out var other));
            Assert.Equal(one.WidthDeg, other.WidthDeg, 1e-8);
            Assert.Equal(one.PeakDeg, other.PeakDeg, 1e-8);
            Assert.Equal(one.PeakDb - one.BackDb, other.PeakDb - other.BackDb, 1e-8);
        },
        iter: 200,
        seed: "000000000012");

    // Two Gaussian lobes, 60 degrees wide at half power, the rear one 20 dB down.
    private static double Lobed(double deg)
    {
        double Lobe(double centre) => Math.Pow(2.0, -Math.Pow(Math.IEEERemainder(deg - centre, 360.0) / 30.0, 2.0));
        return Lobe(0.0) + (0.01 * Lobe(180.0));
    }

    private static Beam BeamOf(double[] angleDeg, Func<double, double> power)
    {
        Assert.True(Beam.TryFind(angleDeg, Array.ConvertAll(angleDeg, deg => 10.0 * Math.Log10(power(deg))), out var beam));
        return beam;
    }

    private static double Sinc(double u) => Math.Abs(u) < 1e-9 ? 1.0 : Math.Sin(u) / u;

    // 2 J1(u)/u by its integral (2/π) ∫ cos(u sin t) cos² t dt over half a turn (Abramowitz and Stegun 9.1.20).
    private static double Jinc(double u) => Enumerable.Range(0, 400).Sum(i =>
    {
        var t = Math.PI * ((i + 0.5) / 400.0 - 0.5);
        return Math.Cos(u * Math.Sin(t)) * Math.Pow(Math.Cos(t), 2.0);
    }) * 2.0 / 400.0;
}
