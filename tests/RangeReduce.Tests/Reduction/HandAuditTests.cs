using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Tests.Synthetic;

namespace RangeReduce.Tests.Reduction;

/// <summary>Source: IEEE Std 145 hand; an odd number of sign errors in the chain turns every state, swapped files turn theirs (common practice).</summary>
public sealed class HandAuditTests
{
    private static readonly double[] Angles = SyntheticCut.Grid(-20.0, 20.0, 5.0);

    [Fact]
    public void When_every_state_is_turned_the_conventions_are_named()
    {
        var remarks = Remarks(("one", Hand.Right, 0.1), ("two", Hand.Left, 10.0), ("three", Hand.Right, 0.2));
        Assert.Equal(3, remarks.Length);
        Assert.All(remarks, remark => Assert.Contains("conventions", remark, StringComparison.Ordinal));
        Assert.All(remarks, remark => Assert.Contains("Every state", remark, StringComparison.Ordinal));
    }

    [Fact]
    public void When_one_state_of_several_is_turned_its_files_are_named()
    {
        var remark = Assert.Single(Remarks(("one", Hand.Right, 10.0), ("two", Hand.Left, 10.0), ("three", Hand.Right, 5.0)));
        Assert.Contains("State two measures right-hand", remark, StringComparison.Ordinal);
        Assert.Contains("mislabelled", remark, StringComparison.Ordinal);
        Assert.DoesNotContain("conventions", remark, StringComparison.Ordinal);
    }

    [Fact]
    public void A_single_turned_state_does_not_claim_that_others_are_right()
    {
        var remark = Assert.Single(Remarks(("one", Hand.Right, 0.1)));
        Assert.DoesNotContain("Other states have", remark, StringComparison.Ordinal);
        Assert.Contains("conventions", remark, StringComparison.Ordinal);
        remark = Assert.Single(Remarks(("one", Hand.Right, 0.1), ("two", Hand.Left, 1.0)));
        Assert.DoesNotContain("Other states have", remark, StringComparison.Ordinal);
    }

    [Fact]
    public void States_as_they_should_be_are_not_remarked() => Assert.Empty(Remarks(("one", Hand.Right, 10.0), ("two", Hand.Left, 0.1), ("three", Hand.Linear, 1.0)));

    [Fact]
    public void A_referee_of_known_hand_is_held_to_it()
    {
        var run = SyntheticRun.Of(new ConfigurationState("helix", KnownHand: Hand.Right)).With("helix", SyntheticCut.Circular(Angles, _ => 0.1, _ => 1.0));
        Assert.True(RunReduction.Reduce(run).Remarks("hand-not-known"));
    }

    /// <summary>Gives the remarks of states with an intended hand and a ratio of right over left amplitude.</summary>
    private static string[] Remarks(params (string Name, Hand Intended, double RightOverLeft)[] states)
    {
        var run = SyntheticRun.Of([.. states.Select(state => new ConfigurationState(state.Name, state.Intended))]);
        run = states.Aggregate(run, (soFar, state) => soFar.With(state.Name, SyntheticCut.Circular(Angles, _ => state.RightOverLeft, _ => 1.0)));
        return [.. RunReduction.Reduce(run).Remarks.Where(remark => remark.Code is "hand-not-intended").Select(remark => remark.Text)];
    }
}
