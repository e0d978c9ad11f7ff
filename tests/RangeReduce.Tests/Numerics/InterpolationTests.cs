using RangeReduce.Numerics;

namespace RangeReduce.Tests.Numerics;

/// <summary>Closed forms: a cubic is met exactly by a cubic, a parabola by its vertex, a root by halving.</summary>
public sealed class InterpolationTests
{
    [Fact]
    public void A_cubic_is_met_exactly_inside_and_a_parabola_at_the_ends_of_uneven_data()
    {
        double[] x = [-2.0, -1.5, 0.0, 1.0, 3.0];
        double Cubic(double at) => (((0.5 * at) - 2.0) * at * at) + (3.0 * at) - 1.0;
        double Parabola(double at) => (((-2.0 * at) + 3.0) * at) - 1.0;
        Assert.Equal(Cubic(0.3), LocalCubic.Interpolate(x, Array.ConvertAll(x, Cubic), 2, 0.3), 1e-12);
        Assert.Equal(Parabola(-1.8), LocalCubic.Interpolate(x, Array.ConvertAll(x, Parabola), 0, -1.8), 1e-12);
        Assert.Equal(Parabola(2.2), LocalCubic.Interpolate(x, Array.ConvertAll(x, Parabola), 3, 2.2), 1e-12);
    }

    [Fact]
    public void A_missing_neighbour_lowers_the_order_and_a_missing_end_gives_nothing()
    {
        double[] x = [0.0, 1.0, 2.0, 3.0];
        Assert.Equal(1.5, LocalCubic.Interpolate(x, [double.NaN, 1.0, 2.0, double.NaN], 1, 1.5), 1e-12);
        Assert.Equal(double.NaN, LocalCubic.Interpolate(x, [0.0, double.NaN, 2.0, 3.0], 1, 1.5));
    }

    [Fact]
    public void The_vertex_of_a_parabola_comes_back_from_uneven_samples()
    {
        double[] x = [-1.0, 0.2, 0.9];
        var (at, top) = ParabolicPeak.Refine(x, Array.ConvertAll(x, t => 5.0 - (2.0 * (t - 0.3) * (t - 0.3))));
        Assert.Equal(0.3, at, 1e-12);
        Assert.Equal(5.0, top, 1e-12);
        Assert.Equal((0.2, 1.0), ParabolicPeak.Refine(x, [double.NaN, 1.0, 0.5]));
    }

    [Fact]
    public void Root_and_minimum_are_found_inside_their_bracket()
    {
        Assert.Equal(Math.Sqrt(2.0), Bisection.Root(t => (t * t) - 2.0, 0.0, 2.0), 1e-14);
        Assert.Equal(Math.Sqrt(2.0), Bisection.Root(t => 2.0 - (t * t), 0.0, 2.0), 1e-14);
        Assert.Equal(0.3, Bisection.Minimum(t => Math.Abs(t - 0.3), 0.0, 1.0), 1e-8);
    }

    [Fact]
    public void Runs_under_a_limit_are_parted_by_missing_samples_and_open_at_the_ends()
    {
        double[] x = [0.0, 1.0, 2.0, 3.0, 4.0, 5.0, 6.0];
        var bands = BandFinder.AtMost(x, [1.0, 3.0, 1.0, double.NaN, 1.0, 1.0, 3.0], 2.0);
        Assert.Equal(3, bands.Count);
        Assert.Equal("low", bands[0].Open);
        Assert.Equal("high", bands[1].Open);
        Assert.Equal("low", bands[2].Open);
        Assert.Equal(2.0, bands[1].High);
        Assert.Equal(4.0, bands[2].Low);
        Assert.InRange(bands[2].High, 5.0, 6.0);
    }

    [Fact]
    public void A_gain_table_is_straight_over_the_logarithm_of_frequency_and_never_goes_beyond_its_ends()
    {
        double[] x = [1e9, 4e9];
        double[] y = [10.0, 16.0];
        Assert.Equal(13.0, LinearTable.InterpolateOverLogarithm(x, y, 2e9), 1e-12);
        Assert.Equal(16.0, LinearTable.InterpolateOverLogarithm(x, y, 4e9));
        Assert.Equal(double.NaN, LinearTable.InterpolateOverLogarithm(x, y, 0.99e9));
        Assert.Equal(double.NaN, LinearTable.InterpolateOverLogarithm(x, y, 4.01e9));
    }
}
