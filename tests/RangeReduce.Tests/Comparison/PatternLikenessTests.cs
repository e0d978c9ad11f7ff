using System.Numerics;
using CsCheck;
using RangeReduce.Comparison;

namespace RangeReduce.Tests.Comparison;

/// <summary>Pattern likeness against the worked pair of two uniform apertures of 5 and 5.2 wavelengths, computed from the closed form.</summary>
public sealed class PatternLikenessTests
{
    [Fact]
    public void The_correlations_of_two_apertures_are_the_worked_ones()
    {
        var (angle, first, _, second) = FsvExample.Curves("aperture-pattern-dB");
        var likeness = PatternLikeness.Compare(angle, first, second, double.NegativeInfinity);
        Assert.Equal(0.99509, likeness.AmplitudeCorrelation, 5e-6);
        Assert.Equal(0.99303, likeness.PearsonAmplitude, 5e-6);
        Assert.Equal(0.80663, likeness.PearsonDb, 5e-6);
    }

    [Theory]
    [InlineData(double.NegativeInfinity, 5.648, 361)]
    [InlineData(-20.0, 1.399, 121)]
    [InlineData(-30.0, 5.695, 355)]
    public void The_difference_above_a_floor_is_the_worked_one(double floorDb, double rmsDb, int count)
    {
        var (angle, first, _, second) = FsvExample.Curves("aperture-pattern-dB");
        var likeness = PatternLikeness.Compare(angle, first, second, floorDb);
        Assert.Equal(rmsDb, likeness.RmsDb, 6e-4);
        Assert.Equal(count, likeness.CountAboveFloor);
        Assert.InRange(likeness.LargestDb, likeness.RmsDb, double.PositiveInfinity);
        var at = Array.FindIndex(angle, value => value == likeness.LargestAtDeg);
        Assert.Equal(likeness.LargestDb, Math.Abs(first[at] - second[at]), 1e-12);
    }

    [Fact]
    public void A_null_below_the_noise_floor_counts_as_the_noise_floor()
    {
        double[] angle = [0.0, 10.0];
        var likeness = PatternLikeness.Compare(angle, [0.0, -20.0], [0.0, -80.0], -30.0, noiseFloorDb: -45.0);
        Assert.Equal(25.0, likeness.LargestDb, 1e-12);
        Assert.Equal(10.0, likeness.LargestAtDeg);
    }

    [Fact]
    public void A_point_on_the_pole_has_no_weight_on_the_sphere()
    {
        double[] angle = [0.0, 90.0];
        Assert.Equal(4.0, PatternLikeness.Compare(angle, [0.0, 0.0], [-12.0, -4.0], -30.0, weight: PatternWeight.SolidAngle).RmsDb, 1e-12);
    }

    [Fact]
    public void A_common_level_leaves_every_correlation_alike_and_is_the_difference()
    {
        Gen.Select(Gen.Double[-40.0, 0.0].Array[8, 40], Gen.Double[-6.0, 6.0]).Sample((cut, shift) =>
        {
            var angle = Enumerable.Range(0, cut.Length).Select(n => 2.0 * n).ToArray();
            var likeness = PatternLikeness.Compare(angle, cut, Array.ConvertAll(cut, level => level + shift), double.NegativeInfinity);
            Assert.Equal(1.0, likeness.AmplitudeCorrelation, 1e-12);
            Assert.Equal(1.0, likeness.PearsonDb, 1e-6);
            Assert.Equal(Math.Abs(shift), likeness.RmsDb, 1e-9);
        });
    }

    [Fact]
    public void A_common_phase_does_not_lower_the_complex_correlation_but_a_phase_slope_does()
    {
        var first = Enumerable.Range(0, 20).Select(n => Complex.FromPolarCoordinates(1.0 + (0.1 * n), 0.3 * n)).ToArray();
        var weights = Enumerable.Repeat(1.0, 20).ToArray();
        Assert.Equal(1.0, PatternLikeness.ComplexCorrelation(first, Array.ConvertAll(first, value => value * Complex.FromPolarCoordinates(2.0, 1.1)), weights), 1e-12);
        Assert.True(PatternLikeness.ComplexCorrelation(first, [.. first.Select((value, n) => value * Complex.FromPolarCoordinates(1.0, 0.5 * n))], weights) < 0.5);
    }

    [Theory]
    [InlineData(0.0, -6.020599913279624, -6.020599913279624)]
    [InlineData(-20.0, -40.0, -20.915149811213503)]
    public void The_equivalent_error_level_is_the_level_of_the_difference(double firstDb, double secondDb, double expectedDb) =>
        Assert.Equal(expectedDb, PatternLikeness.EquivalentErrorLevelDb(firstDb, secondDb), 1e-12);
}
