using System.Numerics;
using MathNet.Numerics.Distributions;
using RangeReduce.Comparison;

namespace RangeReduce.Tests.Comparison;

/// <summary>The frequency scale against curves that were scaled by a known factor.</summary>
public sealed class FrequencyScaleFitTests
{
    private static readonly double[] Axis = [.. Enumerable.Range(0, 401).Select(n => 1.2e9 + (2.5e6 * n))];

    [Theory]
    [InlineData(CurveInterpolation.Linear, 1e-7, 1.63e-3)]
    [InlineData(CurveInterpolation.CubicSpline, 1e-7, 5.7e-5)]
    public void A_resonance_that_was_moved_by_one_percent_gives_the_worked_factor_and_residual(CurveInterpolation interpolation, double tolerance, double rmsAfter)
    {
        // Worked pair, computed from the closed form of one resonance; the residual is what interpolation leaves.
        var (x1, y1, x2, y2) = FsvExample.Curves("resonance-shift-dB");
        Assert.True(FrequencyScaleFit.TryFit(x1, y1, x2, y2, out var scale, out _, new FrequencyScaleOptions { Interpolation = interpolation }));
        Assert.Equal(1.01, scale!.Factor, tolerance);
        Assert.Equal(1.7813, scale.RmsBefore, 1e-4);
        Assert.Equal(rmsAfter, scale.RmsAfter, 0.02 * rmsAfter);
        Assert.InRange(1.01, scale.Low, scale.High);
        Assert.Empty(scale.Remarks);
    }

    [Theory]
    [InlineData(0.88)]
    [InlineData(0.995)]
    [InlineData(1.0)]
    [InlineData(1.13)]
    public void A_known_factor_comes_back_on_another_grid_and_window(double factor)
    {
        double[] other = [.. Enumerable.Range(0, 301).Select(n => 1.1e9 + (4.0e6 * n))];
        Assert.True(FrequencyScaleFit.TryFit(other, Match(other, 1.0, 0.0), Axis, Match(Axis, factor, 0.0), out var scale, out var reason), reason);
        Assert.Equal(factor, scale!.Factor, 1e-5);
    }

    [Theory]
    [InlineData(0.0, 198)]
    [InlineData(0.9, 200)] // the allowance for correlation errs on the wide side
    public void The_interval_holds_the_true_factor_in_at_least_95_of_100_noisy_trials(double correlation, int mostHits)
    {
        var random = new Random(20);
        var hits = 0;
        for (var trial = 0; trial < 200; trial++)
        {
            var (measured, noise) = (Match(Axis, 1.006, 0.0), 0.0);
            for (var n = 0; n < measured.Length; n++)
            {
                noise = (correlation * noise) + (0.3 * Math.Sqrt(1.0 - (correlation * correlation)) * Normal.Sample(random, 0.0, 1.0));
                measured[n] += noise;
            }

            Assert.True(FrequencyScaleFit.TryFit(Axis, Match(Axis, 1.0, 0.0), Axis, measured, out var scale, out _));
            hits += scale!.Low <= 1.006 && scale.High >= 1.006 ? 1 : 0;
        }

        Assert.InRange(hits, 182, mostHits);
    }

    [Fact]
    public void A_factor_beyond_the_searched_range_is_said_to_be_at_its_end()
    {
        Assert.True(FrequencyScaleFit.TryFit(Axis, Match(Axis, 1.0, 0.0), Axis, Match(Axis, 1.05, 0.0), out var scale, out _, new FrequencyScaleOptions { LargestDeparture = 0.03 }));
        Assert.Contains(scale!.Remarks, remark => string.Equals(remark.Code, "frequency-scale-at-end", StringComparison.Ordinal));
        Assert.True(double.IsNaN(scale.Low));
    }

    [Fact]
    public void Two_resonances_that_could_be_either_are_said_to_fit_nearly_alike()
    {
        // The measured curve has two like dips, 5 % to either side of the single simulated one.
        var simulated = Array.ConvertAll(Axis, hz => Dip(hz, 1.6e9));
        var measured = Array.ConvertAll(Axis, hz => Dip(hz, 1.6e9 / 1.05) + Dip(hz, 1.6e9 * 1.05));
        Assert.True(FrequencyScaleFit.TryFit(Axis, simulated, Axis, measured, out var scale, out _));
        Assert.Contains(scale!.Remarks, remark => string.Equals(remark.Code, "frequency-scale-two-minima", StringComparison.Ordinal));
    }

    [Fact]
    public void Curves_without_feature_or_without_common_band_are_refused_with_a_reason()
    {
        var flat = Array.ConvertAll(Axis, _ => -3.0);
        Assert.False(FrequencyScaleFit.TryFit(Axis, flat, Axis, Match(Axis, 1.0, 0.0), out _, out var constant));
        Assert.Contains("constant", constant, StringComparison.Ordinal);
        var far = Array.ConvertAll(Axis, hz => 3.0 * hz);
        Assert.False(FrequencyScaleFit.TryFit(far, Match(Axis, 1.0, 0.0), Axis, Match(Axis, 1.0, 0.0), out _, out var apart));
        Assert.Contains("70 %", apart, StringComparison.Ordinal);
    }

    private static double Dip(double hz, double centre) => 20.0 * Math.Log10((1.0 - (0.9 / new Complex(1.0, 60.0 * (hz - centre) / centre))).Magnitude);

    private static double[] Match(double[] axis, double factor, double offset) => Array.ConvertAll(axis, hz => Dip(hz / factor, 1.62e9) + (0.4 * Dip(hz / factor, 1.9e9)) + offset);
}
