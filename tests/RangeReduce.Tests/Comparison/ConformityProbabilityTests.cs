using CsCheck;
using MathNet.Numerics.Distributions;
using RangeReduce.Comparison;

namespace RangeReduce.Tests.Comparison;

/// <summary>Conformance probabilities against JCGM 106 and values computed from the normal distribution.</summary>
public sealed class ConformityProbabilityTests
{
    private const double None = double.PositiveInfinity;

    [Theory]
    [InlineData(1.80, 0.15, -None, 2.00, 0.90879)]
    [InlineData(1.95, 0.15, -None, 2.00, 0.63056)]
    [InlineData(2.10, 0.15, -None, 2.00, 0.25249)]
    [InlineData(15.2, 0.2, 14.5, 15.5, 0.93296)]
    [InlineData(13.6, 1.8, 12.5, 16.3, 0.66263)] // the two-sided case of JCGM 106:2012, 7.4
    public void The_worked_probabilities_come_back(double value, double u, double low, double high, double expected) =>
        Assert.Equal(expected, ConformityProbability.OfNormal(value, u, low, high).Probability, 5e-6);

    [Fact]
    public void The_capability_index_is_that_of_JCGM_106() =>
        Assert.Equal(0.528, ConformityProbability.CapabilityIndex(1.8, 12.5, 16.3), 5e-4);

    [Fact]
    public void A_tiny_probability_above_the_limit_keeps_its_digits()
    {
        // Phi(-10) = 7.6199e-24, a tabulated value of the normal distribution.
        Assert.Equal(7.6199e-24, ConformityProbability.OfNormal(10.0, 1.0, -None, 0.0).Probability, 1e-27);
        Assert.Equal(7.6199e-24, ConformityProbability.OfNormal(-10.0, 1.0, 0.0, None).Probability, 1e-27);
    }

    [Fact]
    public void Inside_and_outside_add_up_to_one()
    {
        Gen.Select(Gen.Double[-5.0, 5.0], Gen.Double[0.01, 3.0], Gen.Double[-5.0, 5.0], Gen.Double[0.0, 4.0]).Sample((value, u, low, width) =>
        {
            var below = ConformityProbability.OfNormal(value, u, -None, low).Probability;
            var inside = ConformityProbability.OfNormal(value, u, low, low + width).Probability;
            var above = ConformityProbability.OfNormal(value, u, low + width, None).Probability;
            Assert.Equal(1.0, below + inside + above, 1e-12);
        });
    }

    [Fact]
    public void Draws_of_a_normal_quantity_agree_with_the_normal_probability_within_their_standard_error()
    {
        var random = new Random(7);
        var draws = new double[40_000];
        Normal.Samples(random, draws, 1.95, 0.15);
        var conformity = ConformityProbability.OfDraws(draws, -None, 2.0);
        Assert.Equal(Math.Sqrt(0.63056 * 0.36944 / 40_000), conformity.StandardError, 1e-5);
        Assert.Equal(0.63056, conformity.Probability, 4.0 * conformity.StandardError);
        Assert.Null(conformity.Bound);
    }

    [Fact]
    public void Draws_that_are_all_inside_give_a_bound_and_not_certainty() =>
        Assert.Equal(0.003, ConformityProbability.OfDraws(new double[1000], -1.0, 1.0).Bound);

    [Fact]
    public void Fully_correlated_requirements_are_met_together_more_often_than_the_product_says()
    {
        double[] draws = [.. Enumerable.Range(0, 1000).Select(n => n / 1000.0)];
        (double, double)[] limits = [(-None, 0.4995), (-None, 0.4995)];
        Assert.Equal(0.5, ConformityProbability.OfJointDraws([draws, draws], limits).Probability, 1e-12);
        Assert.Equal(0.0, ConformityProbability.OfJointDraws([draws, [.. draws.Select(draw => 0.999 - draw)]], limits).Probability, 1e-12);
    }

    [Fact]
    public void Crossed_limits_and_negative_uncertainty_are_refused()
    {
        Assert.Throws<ArgumentException>(() => ConformityProbability.OfNormal(0.0, 1.0, 2.0, 1.0));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConformityProbability.OfNormal(0.0, -1.0, 1.0, 2.0));
        Assert.Throws<ArgumentException>(() => ConformityProbability.OfDraws([], 1.0, 2.0));
    }
}
