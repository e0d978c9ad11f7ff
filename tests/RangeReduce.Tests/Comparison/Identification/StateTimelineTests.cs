using RangeReduce.Comparison.Identification;
using RangeReduce.Networks;

namespace RangeReduce.Tests.Comparison.Identification;

/// <summary>A switching endurance test with failures that were put in.</summary>
public sealed class StateTimelineTests
{
    [Fact]
    public void Stretches_switchings_and_failures_are_those_that_were_put_in()
    {
        var antenna = new SyntheticAntenna(31);
        Assert.True(SweepIdentifier.TryBuild(antenna.Run(4, 0.004), out var identifier, out _));
        string[] due = [.. Enumerable.Range(0, 40).Select(n => n / 5 % 2 == 0 ? "left" : "right")];
        string[] truth = [.. due];
        (truth[12], truth[28], truth[29]) = ("half-deployed", "left", "left");
        (due[28], due[29]) = ("right", "right");
        NetworkSweep[] sweeps = [.. truth.Select(state => antenna.Sweep(state, 0.004))];
        var timeline = StateTimeline.Make(identifier!.IdentifyAll(sweeps), due);
        Assert.Equal(truth.Count(state => string.Equals(state, "left", StringComparison.Ordinal)), timeline.Counts["left"]);
        Assert.Equal(truth.Count(state => string.Equals(state, "right", StringComparison.Ordinal)), timeline.Counts["right"]);
        var failed = Enumerable.Range(0, 40).Where(n => !string.Equals(truth[n], due[n], StringComparison.Ordinal)).ToArray();
        Assert.Equal(failed, timeline.Failures.Select(failure => failure.Index));
        Assert.Contains("no known state", timeline.Failures[0].Text, StringComparison.Ordinal);
        Assert.Contains("where right was due", timeline.Failures[1].Text, StringComparison.Ordinal);
        Assert.Equal(40, timeline.Runs.Sum(run => run.Count));
        Assert.Contains(timeline.Runs, run => run is { Answer: IdentificationAnswer.Unknown, First: 12, Last: 12 });
        Assert.Equal(7, timeline.Switchings);
    }

    [Fact]
    public void Expected_states_must_be_as_many_as_the_sweeps() =>
        Assert.Throws<ArgumentException>(() => StateTimeline.Make([], ["left"]));
}
