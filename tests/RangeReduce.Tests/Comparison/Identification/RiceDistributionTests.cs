using MathNet.Numerics.Distributions;
using RangeReduce.Comparison.Identification;

namespace RangeReduce.Tests.Comparison.Identification;

/// <summary>The magnitude of a noisy complex value: Rice 1945, limits of Rayleigh and normal distribution.</summary>
public sealed class RiceDistributionTests
{
    [Fact]
    public void Without_signal_it_is_the_Rayleigh_distribution()
    {
        var (mean, variance) = RiceDistribution.Moments(0.0, 0.02);
        Assert.Equal(0.02 * Math.Sqrt(Math.PI / 2.0), mean, 1e-12);
        Assert.Equal(0.0004 * (2.0 - (Math.PI / 2.0)), variance, 1e-12);
    }

    [Fact]
    public void The_two_forms_meet()
    {
        var edge = Math.Sqrt(600.0);
        var (below, above) = (RiceDistribution.Moments(edge * (1.0 - 1e-9), 1.0), RiceDistribution.Moments(edge * (1.0 + 1e-9), 1.0));
        Assert.Equal(below.Mean, above.Mean, 1e-6);
        Assert.Equal(below.Variance, above.Variance, 1e-5);
    }

    [Fact]
    public void Draws_have_the_mean_and_variance()
    {
        var random = new Random(1);
        double[] draws = [.. Enumerable.Range(0, 200_000).Select(_ => Math.Sqrt(Math.Pow(Normal.Sample(random, 1.5, 1.0), 2.0) + Math.Pow(Normal.Sample(random, 0.0, 1.0), 2.0)))];
        var (mean, variance) = RiceDistribution.Moments(1.5, 1.0);
        Assert.Equal(mean, draws.Average(), 0.01);
        Assert.Equal(variance, draws.Select(draw => Math.Pow(draw - mean, 2.0)).Average(), 0.01);
    }
}
