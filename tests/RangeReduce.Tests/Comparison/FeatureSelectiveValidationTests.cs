using CsCheck;
using RangeReduce.Comparison;

namespace RangeReduce.Tests.Comparison;

/// <summary>Feature Selective Validation against worked pairs that were computed by three programs written apart.</summary>
public sealed class FeatureSelectiveValidationTests
{
    private static readonly Gen<double[]> Curve = Gen.Double[-5.0, 5.0].Array[40, 90];

    public static TheoryData<string> Pairs() => [.. FsvExample.Ids];

    [Theory]
    [MemberData(nameof(Pairs))]
    public void Totals_break_point_and_count_are_those_of_the_worked_pair(string id)
    {
        var stored = FsvExample.Stored(id);
        var result = Run(id);
        Assert.Equal(stored.GetProperty("break_point").GetInt32(), result.BreakPoint);
        Assert.Equal(stored.TryGetProperty("working_count", out var count) ? count.GetInt32() : stored.GetProperty("x").GetProperty("count").GetInt32(), result.Count);
        var totals = stored.GetProperty("totals");
        Assert.Equal(totals.GetProperty("ADM").GetDouble(), result.Amplitude.Total, 1e-5);
        Assert.Equal(totals.GetProperty("FDM").GetDouble(), result.Feature.Total, 1e-5);
        Assert.Equal(totals.GetProperty("GDM").GetDouble(), result.Global.Total, 1e-5);
    }

    public static TheoryData<string> PairsWithHistogram() => [.. FsvExample.Ids.Where(id => !string.Equals(id, "unequal-grids", StringComparison.Ordinal))];

    [Theory]
    [MemberData(nameof(PairsWithHistogram))]
    public void Histograms_grade_and_spread_are_those_of_the_worked_pair(string id)
    {
        var stored = FsvExample.Stored(id);
        var result = Run(id);
        foreach (var (name, measure) in new[] { ("ADM", result.Amplitude), ("FDM", result.Feature), ("GDM", result.Global) })
        {
            // A point on a boundary may change its bar by rounding, hence one point of tolerance.
            var bars = stored.GetProperty("histogram").GetProperty(name).EnumerateArray().Select(bar => bar.GetDouble()).ToArray();
            Assert.All(bars.Zip(measure.Histogram), bar => Assert.Equal(bar.First, bar.Second, (1.0 / result.Count) + 1e-6));
            Assert.Equal(1.0, measure.Histogram.Sum(), 1e-12);
            Assert.Equal(stored.GetProperty("grade").GetProperty(name).GetInt32(), measure.GradeNumber);
            Assert.Equal(stored.GetProperty("spread_largest_first").GetProperty(name).GetInt32(), measure.Spread);
        }
    }

    [Fact]
    public void A_constant_added_to_a_curve_of_mean_5_gives_the_closed_form_of_the_offset_term()
    {
        // (1/11) exp(1/11): offset parts 6 and 5 over their sum 11, exactly while the lowest bins hold the mean only.
        var result = Run("offset-only");
        Assert.Equal(Math.Exp(1.0 / 11.0) / 11.0, result.Amplitude.Total, 1e-12);
        Assert.Equal(result.Offset.Total, result.Amplitude.Total, 1e-12);
    }

    [Fact]
    public void A_change_of_sign_is_invisible_to_the_method_but_not_to_the_correlation()
    {
        var result = Run("sign-flip");
        Assert.Equal(0.0, result.Global.Total, 1e-12);
        Assert.Equal(-1.0, result.Correlation, 1e-12);
    }

    [Fact]
    public void Swapping_the_curves_or_scaling_both_leaves_every_point_alike()
    {
        Gen.Select(Curve, Curve, Gen.Double[0.01, 100.0]).Sample((a, b, factor) =>
        {
            var count = Math.Min(a.Length, b.Length);
            var x = Enumerable.Range(0, count).Select(n => (double)n).ToArray();
            var (first, second) = (a[..count], b[..count]);
            var result = FeatureSelectiveValidation.Compare(x, first, x, second);
            var swapped = FeatureSelectiveValidation.Compare(x, second, x, first);
            var scaled = FeatureSelectiveValidation.Compare(x, [.. first.Select(y => factor * y)], x, [.. second.Select(y => factor * y)]);
            Assert.All(result.Global.Points.Zip(swapped.Global.Points), pair => Assert.Equal(pair.First, pair.Second, 1e-9));
            Assert.All(result.Global.Points.Zip(scaled.Global.Points), pair => Assert.Equal(pair.First, pair.Second, 1e-9 * (1.0 + pair.First)));
        });
    }

    [Fact]
    public void Offset_slow_and_fast_part_add_up_to_the_curve()
    {
        Gen.Select(Curve, Gen.Int[5, 60]).Sample((y, breakPoint) =>
        {
            var bins = FsvFilter.Transform(y);
            var (offset, slow, fast) = (FsvFilter.OffsetPart(bins), FsvFilter.SlowPart(bins, breakPoint), FsvFilter.FastPart(bins, breakPoint));
            Assert.All(Enumerable.Range(0, y.Length), n => Assert.Equal(y[n], offset[n] + slow[n] + fast[n], 1e-11));
        });
    }

    [Theory]
    [InlineData(31, false)]
    [InlineData(32, true)]
    public void Fewer_than_32_points_are_refused_with_a_reason(int count, bool accepted)
    {
        var x = Enumerable.Range(0, count).Select(n => (double)n).ToArray();
        var y = Array.ConvertAll(x, Math.Sin);
        Assert.Equal(accepted, FeatureSelectiveValidation.TryCompare(x, y, x, y, out var result, out var reason));
        Assert.Equal(accepted, result is not null);
        Assert.Equal(accepted, reason.Length == 0);
    }

    [Fact]
    public void Curves_apart_and_curves_with_gaps_are_refused_with_a_reason()
    {
        var x = Enumerable.Range(0, 64).Select(n => (double)n).ToArray();
        var gap = Array.ConvertAll(x, value => value == 20.0 ? double.NaN : value);
        Assert.False(FeatureSelectiveValidation.TryCompare(x, x, Array.ConvertAll(x, value => value + 100.0), x, out _, out var apart));
        Assert.Contains("overlap", apart, StringComparison.Ordinal);
        Assert.False(FeatureSelectiveValidation.TryCompare(x, x, x, gap, out _, out var broken));
        Assert.Contains("not finite", broken, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => FeatureSelectiveValidation.Compare(x, x, x, gap));
    }

    [Fact]
    public void Two_constant_curves_differ_in_their_offset_only()
    {
        // 401 points: the transform of a length that is no power of two leaves rounding in every bin.
        var x = Enumerable.Range(0, 401).Select(n => (double)n).ToArray();
        var result = FeatureSelectiveValidation.Compare(x, [.. x.Select(_ => 5.0)], x, [.. x.Select(_ => 6.0)]);
        Assert.Equal(Math.Exp(1.0 / 11.0) / 11.0, result.Global.Total, 1e-9);
        Assert.Equal(0.0, result.Feature.Total, 1e-12);
    }

    private static FsvResult Run(string id)
    {
        var (x1, y1, x2, y2) = FsvExample.Curves(id);
        return FeatureSelectiveValidation.Compare(x1, y1, x2, y2);
    }
}
