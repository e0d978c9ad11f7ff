using System.Numerics;
using RangeReduce.Comparison;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>Source: closed form of crossed short dipoles in quadrature, |R| ~ 1 + cos θ, |L| ~ 1 − cos θ: at 30 degrees 22.878 dB cross-polar ratio and 1.249 dB axial ratio, at 45 degrees 15.311 dB and 3.010 dB.</summary>
public sealed class ConeTests
{
    private static readonly PatternCut Dipoles = SyntheticCut.Linear(SyntheticCut.Grid(-180.0, 180.0, 2.0), deg => Math.Cos(double.DegreesToRadians(deg)), _ => -Complex.ImaginaryOne);

    [Fact]
    public void The_usual_cone_has_the_figures_of_its_rim()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(Dipoles));
        Assert.Equal(1.249, reduced.Single(QuantityCatalogue.AxialRatio, figure => figure.At == FigurePlace.Cone).Value, 1e-3);
        var cross = reduced.Single(QuantityCatalogue.CrossPolarRatio, figure => figure.At == FigurePlace.Cone);
        Assert.Equal(22.878, cross.Value, 1e-3);
        Assert.Equal(FieldComponent.Right, cross.Component);
    }

    [Theory]
    [InlineData(15.0, RequirementVerdict.Met)]
    [InlineData(15.5, RequirementVerdict.NotMet)]
    public void A_requirement_over_a_cone_is_answered_by_the_cone(double atLeast, RequirementVerdict verdict)
    {
        var requirement = new Requirement { Id = "r1", Quantity = QuantityCatalogue.CrossPolarRatio, ConeDeg = 45.0, AtLeast = atLeast };
        var outcome = RunReduction.Reduce(SyntheticRun.OfCuts(Dipoles) with { Requirements = [requirement] }).Requirements.Single();
        Assert.Equal(verdict, outcome.Verdict);
        Assert.Equal(15.311, outcome.Worst, 2e-3);
    }

    [Fact]
    public void A_cut_that_ends_inside_the_cone_gives_no_figure_over_it()
    {
        var reduced = RunReduction.Reduce(SyntheticRun.OfCuts(SyntheticCut.Circular(SyntheticCut.Grid(-20.0, 40.0, 5.0), _ => 1.0, _ => 0.1)));
        Assert.DoesNotContain(reduced.Table.Figures, figure => figure.At == FigurePlace.Cone);
        Assert.True(reduced.Remarks("cone-not-covered"));
    }
}
