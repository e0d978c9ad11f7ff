using RangeReduce.Quantities;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>
/// Source: closed form of the series resonator, R (1 + jQ (f/f0 − f0/f)); matched, |Γ| = T lies at f0 (±b + √(1 + b²)) with b = T/(Q √(1 − T²)),
/// so that √(f1 f2) = f0 and (f2 − f1)/f0 = 2b (Yaghjian and Best, IEEE Trans. AP 53(4), 2005: exact for this circuit).
/// </summary>
public sealed class ResonanceTests
{
    // Q 20 at 1 GHz, return loss 10 dB.
    private const double LowHz = 983.472e6;
    private const double HighHz = 1016.806e6;

    [Theory]
    [InlineData(10e6, 60e3)]
    [InlineData(5e6, 5e3)]
    [InlineData(2e6, 600.0)]
    [InlineData(1e6, 600.0)]
    public void Resonance_and_band_edges_of_a_matched_resonator_come_back_wherever_the_grid_falls(double step, double within)
    {
        for (var phase = 0.0; phase < 1.0; phase += 0.25)
        {
            var grid = SyntheticSweep.Grid(900e6 + (phase * step), 1100e6 + (phase * step), step);
            var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, SyntheticSweep.Resonator(1e9, 20.0))));
            Assert.Equal(1e9, reduced.Single(QuantityCatalogue.ResonanceFrequency).Value, within);
            var band = reduced.Single(QuantityCatalogue.MatchBand);
            Assert.Equal(LowHz, band.LowHz!.Value, within);
            Assert.Equal(HighHz, band.HighHz!.Value, within);
            Assert.Null(band.Open);
            Assert.Equal(3.33287, reduced.Single(QuantityCatalogue.MatchBandFraction).Value, 100.0 * 2.0 * within / 1e9);
        }
    }

    [Fact]
    public void An_unmatched_resonator_has_its_least_reflection_where_the_reactance_is_zero()
    {
        // R = 40 ohm in 50 ohm: Γ = −1/9, return loss 19.085 dB, VSWR 1.25, mismatch loss 0.0539 dB.
        var grid = SyntheticSweep.Grid(900.7e6, 1100.7e6, 2e6);
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, SyntheticSweep.Resonator(1e9, 20.0, 40.0))));
        Assert.Equal(1e9, reduced.Single(QuantityCatalogue.ResonanceFrequency).Value, 3e3);
        Assert.Equal(19.0849, reduced.Single(QuantityCatalogue.ReturnLoss).Value, 1e-3);
        Assert.Equal(1.25, reduced.Single(QuantityCatalogue.Vswr).Value, 1e-4);
        Assert.Equal(0.0539, reduced.Single(QuantityCatalogue.MismatchLoss).Value, 1e-4);
        Assert.Equal(40.0, reduced.Single(QuantityCatalogue.InputResistance).Value, 1e-2);
        Assert.Equal(0.0, reduced.Single(QuantityCatalogue.InputReactance).Value, 0.02);
    }

    [Fact]
    public void Without_phase_resonance_and_edges_are_found_and_impedance_is_not()
    {
        foreach (var resistance in new[] { 40.0, 50.0 })
        {
            var grid = SyntheticSweep.Grid(900.7e6, 1100.7e6, 2e6);
            var sweep = SyntheticSweep.Of(grid, SyntheticSweep.Resonator(1e9, 20.0, resistance));
            var known = RunReduction.Reduce(SyntheticRun.OfSweep(sweep));
            var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(sweep.WithoutPhase()));
            Assert.Equal(1e9, reduced.Single(QuantityCatalogue.ResonanceFrequency).Value, 50e3);
            Assert.Equal(known.Single(QuantityCatalogue.MatchBand).LowHz!.Value, reduced.Single(QuantityCatalogue.MatchBand).LowHz!.Value, 5e3);
            Assert.Empty(reduced.Table.Of(QuantityCatalogue.InputResistance));
            Assert.True(reduced.Remarks("no-phase"));
        }
    }

    [Fact]
    public void A_band_that_the_sweep_cuts_off_is_open_at_that_end_and_remarked()
    {
        foreach (var (first, last, open) in new[] { (900e6, 1010e6, "high"), (990e6, 1100e6, "low"), (990e6, 1010e6, "both") })
        {
            var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(SyntheticSweep.Grid(first, last, 2e6), SyntheticSweep.Resonator(1e9, 20.0))));
            var band = reduced.Single(QuantityCatalogue.MatchBand);
            Assert.Equal(open, band.Open);
            Assert.Equal(open is "high" ? LowHz : first, band.LowHz!.Value, 1e3);
            Assert.Equal(open is "low" ? HighHz : last, band.HighHz!.Value, 1e3);
            Assert.True(reduced.Remarks("open-band"));
        }
    }

    [Fact]
    public void The_deeper_of_two_resonances_is_first_and_so_is_its_band()
    {
        // Two resonators far apart: near each the other reflects all, so the product of their coefficients is that of each alone.
        var (lower, upper) = (SyntheticSweep.Resonator(1e9, 40.0, 35.0), SyntheticSweep.Resonator(2e9, 40.0, 45.0));
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(SyntheticSweep.Grid(0.8e9, 2.4e9, 2e6), hertz => lower(hertz) * upper(hertz))));
        Assert.Equal(2e9, reduced.Single(QuantityCatalogue.ResonanceFrequency, figure => figure.Rank == 1).Value, 1e6);
        Assert.Equal(1e9, reduced.Single(QuantityCatalogue.ResonanceFrequency, figure => figure.Rank == 2).Value, 1e6);
        var first = reduced.Single(QuantityCatalogue.MatchBand, figure => figure.Rank == 1);
        Assert.InRange(2e9, first.LowHz!.Value, first.HighHz!.Value);
        Assert.Equal(2, reduced.Table.Of(QuantityCatalogue.MatchBand).Count());
    }

    [Fact]
    public void A_sweep_without_a_dip_and_a_dip_at_its_end_have_no_resonance()
    {
        foreach (var last in new[] { 700e6, 1000e6 })
        {
            var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(SyntheticSweep.Grid(500e6, last, 2e6), SyntheticSweep.Resonator(1e9, 20.0))));
            Assert.Empty(reduced.Table.Of(QuantityCatalogue.ResonanceFrequency));
            Assert.True(reduced.Remarks("no-resonance"));
        }
    }

    [Fact]
    public void A_perfect_match_on_a_sample_has_no_finite_return_loss_and_says_why()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of([0.98e9, 0.99e9, 1e9, 1.01e9, 1.02e9], SyntheticSweep.Resonator(1e9, 20.0))));
        Assert.Equal(1e9, reduced.Single(QuantityCatalogue.ResonanceFrequency).Value);
        var loss = reduced.Single(QuantityCatalogue.ReturnLoss);
        Assert.True(double.IsPositiveInfinity(loss.Value) || double.IsNaN(loss.Value));
        Assert.Contains("perfect", loss.Why, StringComparison.Ordinal);
        Assert.Equal(1.0, reduced.Single(QuantityCatalogue.Vswr).Value);
        Assert.Equal(0.0, reduced.Single(QuantityCatalogue.MismatchLoss).Value);
    }

    [Fact]
    public void A_band_between_two_samples_is_found_with_its_resonance()
    {
        // Q 200: the band is 3.3 MHz wide, the step 6 MHz, and no sample reaches 10 dB.
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(SyntheticSweep.Grid(0.937e9, 1.063e9, 6e6), SyntheticSweep.Resonator(1e9, 200.0))));
        var resonance = reduced.Single(QuantityCatalogue.ResonanceFrequency);
        var band = reduced.Single(QuantityCatalogue.MatchBand);
        Assert.InRange(resonance.Value, band.LowHz!.Value, band.HighHz!.Value);
        Assert.InRange(band.Value, 1e6, 6e6);
    }

    [Fact]
    public void More_reflected_than_sent_is_remarked_with_count_and_size_and_not_clipped()
    {
        var resonator = SyntheticSweep.Resonator(1e9, 20.0);
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(SyntheticSweep.Grid(0.9e9, 1.1e9, 2e6), hertz => resonator(hertz) * 1.2)));
        var remark = Assert.Single(reduced.Remarks, remark => remark.Code is "not-passive");
        Assert.Contains("1.0", remark.Text, StringComparison.Ordinal);
        Assert.Contains(reduced.Table.TracesOf(QuantityCatalogue.ReturnLoss).Single().Y, value => value < 0.0);
        Assert.Contains(reduced.Table.TracesOf(QuantityCatalogue.Vswr).Single().Y, double.IsNaN);
    }

    [Fact]
    public void A_missing_sample_ends_a_band_and_hides_no_resonance_behind_it()
    {
        var resonator = SyntheticSweep.Resonator(1e9, 20.0);
        var grid = SyntheticSweep.Grid(0.9e9, 1.1e9, 2e6);
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, hertz => Math.Abs(hertz - 1.01e9) < 1e6 ? double.NaN : resonator(hertz))));
        Assert.Equal(1e9, reduced.Single(QuantityCatalogue.ResonanceFrequency).Value, 5e3);
        Assert.Equal("high", reduced.Single(QuantityCatalogue.MatchBand, figure => figure.Rank == 1).Open);
        Assert.All(reduced.Table.Figures, figure => Assert.True(double.IsFinite(figure.Value) || figure.Why is not null));
    }

    [Fact]
    public void Scaling_the_frequency_scales_resonance_and_band()
    {
        var resonator = SyntheticSweep.Resonator(1e9, 20.0, 42.0);
        var grid = SyntheticSweep.Grid(0.9013e9, 1.1013e9, 2e6);
        var plain = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, resonator)));
        CsCheck.Check.Sample(CsCheck.Gen.Double[0.1, 30.0], scale =>
        {
            var scaled = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(Array.ConvertAll(grid, hertz => hertz * scale), hertz => resonator(hertz / scale))));
            Assert.Equal(scale, scaled.Single(QuantityCatalogue.ResonanceFrequency).Value / plain.Single(QuantityCatalogue.ResonanceFrequency).Value, 1e-6 * scale);
            Assert.Equal(scale, scaled.Single(QuantityCatalogue.MatchBand).Value / plain.Single(QuantityCatalogue.MatchBand).Value, 1e-6 * scale);
        }, iter: 30, seed: "000000000013");
    }
}
