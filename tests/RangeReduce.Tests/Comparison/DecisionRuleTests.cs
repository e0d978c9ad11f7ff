using RangeReduce.Comparison;

namespace RangeReduce.Tests.Comparison;

/// <summary>Decision rules of JCGM 106 and ILAC-G8 on worked cases.</summary>
public sealed class DecisionRuleTests
{
    private const double None = double.PositiveInfinity;

    [Theory]
    [InlineData(1.80, RequirementVerdict.Met, RequirementVerdict.Undecided, RequirementVerdict.Undecided)]
    [InlineData(1.95, RequirementVerdict.Met, RequirementVerdict.Undecided, RequirementVerdict.Undecided)]
    [InlineData(2.10, RequirementVerdict.NotMet, RequirementVerdict.Undecided, RequirementVerdict.Undecided)]
    [InlineData(2.25, RequirementVerdict.NotMet, RequirementVerdict.Undecided, RequirementVerdict.NotMet)]
    [InlineData(1.69, RequirementVerdict.Met, RequirementVerdict.Met, RequirementVerdict.Met)]
    [InlineData(2.31, RequirementVerdict.NotMet, RequirementVerdict.NotMet, RequirementVerdict.NotMet)]
    public void An_axial_ratio_against_2_dB_with_u_of_0_15_dB(double value, RequirementVerdict simple, RequirementVerdict expanded, RequirementVerdict oneSided)
    {
        Assert.Equal(simple, DecisionRule.Simple.Decide(value, 0.15, -None, 2.0).Verdict);
        Assert.Equal(expanded, DecisionRule.GuardedByExpanded.Decide(value, 0.15, -None, 2.0).Verdict);
        Assert.Equal(oneSided, DecisionRule.GuardedAt95Percent.Decide(value, 0.15, -None, 2.0).Verdict);
    }

    [Fact]
    public void The_acceptance_limits_are_the_worked_ones()
    {
        Assert.Equal(1.70, DecisionRule.GuardedByExpanded.Decide(1.8, 0.15, -None, 2.0).AcceptanceHigh, 1e-12);
        Assert.Equal(1.75325, DecisionRule.GuardedAt95Percent.Decide(1.8, 0.15, -None, 2.0).AcceptanceHigh, 1e-12);
        var gain = DecisionRule.GuardedByExpanded.Decide(15.2, 0.2, 14.5, 15.5);
        Assert.Equal((14.9, 15.1), (gain.AcceptanceLow, gain.AcceptanceHigh));
        Assert.Equal(DecisionZone.ConditionalPass, gain.Zone);
        Assert.Equal(RequirementVerdict.Met, DecisionRule.Simple.Decide(15.2, 0.2, 14.5, 15.5).Verdict);
    }

    [Theory]
    [InlineData(2.0, 0.02275)] // w = U: 2.3 %, ILAC-G8:09/2019
    [InlineData(1.645, 0.04998)]
    [InlineData(0.0, 0.5)]
    public void The_risk_at_the_acceptance_limit_is_that_of_the_rule(double guardFactor, double risk)
    {
        var decision = DecisionRule.Guarded(guardFactor).Decide(2.0 - (guardFactor * 0.125), 0.125, -None, 2.0);
        Assert.Equal(RequirementVerdict.Met, decision.Verdict);
        Assert.Equal(risk, decision.Risk, 1e-5);
    }

    [Fact]
    public void Without_an_uncertainty_only_simple_acceptance_decides()
    {
        Assert.Equal(RequirementVerdict.Met, DecisionRule.Simple.Decide(1.0, double.NaN, -None, 2.0).Verdict);
        Assert.True(double.IsNaN(DecisionRule.Simple.Decide(1.0, double.NaN, -None, 2.0).Risk));
        var guarded = DecisionRule.GuardedByExpanded.Decide(1.0, double.NaN, -None, 2.0);
        Assert.Equal(RequirementVerdict.Undecided, guarded.Verdict);
        Assert.NotEmpty(guarded.Reason);
    }

    [Fact]
    public void Guard_bands_wider_than_the_tolerance_leave_nothing_to_accept()
    {
        var decision = DecisionRule.GuardedByExpanded.Decide(15.0, 0.5, 14.5, 15.5);
        Assert.Equal(RequirementVerdict.Undecided, decision.Verdict);
        Assert.True(decision.AcceptanceLow > decision.AcceptanceHigh);
    }
}
