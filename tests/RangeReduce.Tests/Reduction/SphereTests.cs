using System.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Reduction.Sphere;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>Sources: closed forms of standard antenna texts (Huygens source D = 3, short dipole D = 1.5, cos² power in a half space D = 6); weights of Clenshaw and Curtis.</summary>
public sealed class SphereTests
{
    private static double Cos(double deg) => Math.Cos(double.DegreesToRadians(deg));

    private static double Sin(double deg) => Math.Sin(double.DegreesToRadians(deg));

    [Fact]
    public void The_weights_of_four_intervals_are_the_published_ones()
    {
        double[] expected = [1.0 / 15.0, 8.0 / 15.0, 4.0 / 5.0, 8.0 / 15.0, 1.0 / 15.0];
        foreach (var (weight, wanted) in ClenshawCurtis.Weights(4).Zip(expected))
        {
            Assert.Equal(wanted, weight, 1e-14);
        }

        Assert.Equal(2.0, ClenshawCurtis.Weights(36).Sum(), 1e-12);
    }

    [Theory]
    [InlineData(-180.0, 180.0, 5.0)]
    [InlineData(0.0, 350.0, 10.0)]
    public void A_sphere_of_a_short_dipole_across_the_axis_has_1_761_decibels(double first, double last, double step)
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(Cuts(first, last, step, 0.0, 45.0, 90.0, 135.0)));
        var directivity = Directivity(reduced, FieldComponent.Total);
        Assert.Equal("sphere", directivity.Method);
        Assert.Equal(10.0 * Math.Log10(1.5), directivity.Value, 2e-3);

        // A linear wave is half right and half left.
        Assert.Equal(10.0 * Math.Log10(0.75), Directivity(reduced, FieldComponent.Right).Value, 2e-3);
    }

    [Fact]
    public void Two_principal_cuts_are_exact_for_a_dipole_and_say_that_they_are_an_estimate()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(Cuts(-180.0, 180.0, 5.0, 0.0, 90.0)));
        var directivity = Directivity(reduced, FieldComponent.Total);
        Assert.Equal("principal cuts", directivity.Method);
        Assert.Equal(10.0 * Math.Log10(1.5), directivity.Value, 2e-3);
        Assert.True(directivity.Uncertainty.Expanded >= 1.0);
        Assert.True(reduced.Remarks("directivity-estimated"));
    }

    [Fact]
    public void One_cut_gives_no_directivity() =>
        Assert.Empty(RunReduction.Reduce(SyntheticRun.OfCuts(Cuts(-180.0, 180.0, 5.0, 0.0))).Table.Of(QuantityCatalogue.Directivity));

    [Theory]
    [InlineData(0.8, false)]
    [InlineData(1.4, true)]
    public void Efficiency_is_gain_over_directivity_and_doubted_above_one(double efficiency, bool doubted)
    {
        var cuts = Array.ConvertAll(
            new[] { 0.0, 45.0, 90.0, 135.0 },
            phi => SyntheticCut.Linear(SyntheticCut.Grid(-180.0, 180.0, 5.0), deg => Math.Sqrt(efficiency * 3.0) * 0.5 * (1.0 + Cos(deg)) * Cos(phi), deg => -Math.Sqrt(efficiency * 3.0) * 0.5 * (1.0 + Cos(deg)) * Sin(phi)) with { FixedDeg = phi, Reference = LevelReference.Isotropic });
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(cuts));
        Assert.Equal(10.0 * Math.Log10(3.0), Directivity(reduced, FieldComponent.Total).Value, 2e-3);
        Assert.Equal(100.0 * efficiency, reduced.Single(QuantityCatalogue.RadiationEfficiency).Value, 0.05);
        Assert.Equal(doubted, reduced.Remarks("gain-above-directivity"));
    }

    private static Figure Directivity(ReducedRun reduced, FieldComponent component) => reduced.Single(QuantityCatalogue.Directivity, figure => figure.Component == component);

    // Short dipole along x.
    private static PatternCut[] Cuts(double first, double last, double step, params double[] phiDeg) =>
        Array.ConvertAll(phiDeg, phi => SyntheticCut.Linear(SyntheticCut.Grid(first, last, step), deg => new Complex(Cos(deg) * Cos(phi), 0.0), _ => new Complex(-Sin(phi), 0.0)) with { FixedDeg = phi });
}
