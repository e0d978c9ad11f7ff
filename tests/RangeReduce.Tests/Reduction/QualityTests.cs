using System.Numerics;
using RangeReduce.Networks;
using RangeReduce.Quantities;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>
/// Sources: Yaghjian and Best, IEEE Trans. AP 53(4), 2005 (quality factor, exact for the series resonator); Blanch, Romeu and Corbella,
/// Electron. Lett. 39, 2003 (envelope correlation); McLean, IEEE Trans. AP 44(5), 1996 (size limit).
/// </summary>
public sealed class QualityTests
{
    [Theory]
    [InlineData(20.0)]
    [InlineData(80.0)]
    public void A_series_resonator_gives_its_quality_factor_back_and_predicts_its_band(double quality)
    {
        var grid = SyntheticSweep.Grid(900.3e6, 1100.3e6, 1e6);
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, SyntheticSweep.Resonator(1e9, quality))));
        Assert.Equal(quality, reduced.Single(QuantityCatalogue.QualityFactor).Value, quality * 2e-3);
        Assert.Equal(1e9 * 2.0 / 3.0 / quality, reduced.Single(QuantityCatalogue.PredictedMatchBand).Value, 2e-3 * 1e9 / quality);
        Assert.False(reduced.Remarks("quality-against-band"));
    }

    [Fact]
    public void A_band_of_a_mismatched_resonator_contradicts_its_quality_factor()
    {
        var grid = SyntheticSweep.Grid(900.3e6, 1100.3e6, 1e6);
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, SyntheticSweep.Resonator(1e9, 20.0, 28.0))));
        Assert.True(reduced.Remarks("quality-against-band"));
    }

    [Fact]
    public void More_bandwidth_than_the_sphere_allows_is_doubted_and_enough_room_is_not()
    {
        // ka = 0.3: at 1 GHz a sphere of 28.6 mm, least Q 21.85.
        Assert.Equal(21.85, RangeReduce.Reduction.Sweeps.QualityReducer.LeastQuality(0.3), 0.01);
        var grid = SyntheticSweep.Grid(900.3e6, 1100.3e6, 1e6);
        Assert.True(Sized(20.0).Remarks("size-limit"));
        Assert.False(Sized(24.0).Remarks("size-limit"));

        ReducedRun Sized(double quality) => RunReduction.Reduce(SyntheticRun.OfSweep(SyntheticSweep.Of(grid, SyntheticSweep.Resonator(1e9, quality))) with { LargestDimensionM = 0.0286278 });
    }

    [Fact]
    public void Two_ports_give_isolation_and_envelope_correlation_by_the_closed_form()
    {
        Complex[] cells = [new(0.2, 0.1), new(0.15, -0.2), new(0.15, -0.2), new(0.1, -0.25)];
        double[] re = [.. cells.Concat(cells).Select(cell => cell.Real)];
        double[] im = [.. cells.Concat(cells).Select(cell => cell.Imaginary)];
        var reduced = RunReduction.Reduce(SyntheticRun.OfSweep(new NetworkSweep([1e9, 1.1e9], 2, [50.0, 50.0], re, im)));
        Assert.Equal(-20.0 * Math.Log10(0.25), reduced.Single(QuantityCatalogue.Isolation).Value, 1e-9);
        Assert.Equal(0.0141741, reduced.Single(QuantityCatalogue.EnvelopeCorrelation).Value, 1e-7);
        Assert.True(reduced.Remarks("envelope-correlation"));
    }
}
