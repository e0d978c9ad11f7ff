namespace RangeReduce.Comparison.Identification;

/// <summary>The states that an antenna went through over many sweeps, such as a switching endurance test.</summary>
public sealed class StateTimeline
{
    private StateTimeline(IReadOnlyList<TimelineRun> runs, IReadOnlyList<TimelineFailure> failures, IReadOnlyDictionary<string, int> counts)
    {
        (Runs, Failures, Counts) = (runs, failures, counts);
    }

    /// <summary>Gets the stretches of sweeps with one answer, in order.</summary>
    public IReadOnlyList<TimelineRun> Runs { get; }

    /// <summary>Gets the sweeps that were unknown, ambiguous, refused, or in another state than was due.</summary>
    public IReadOnlyList<TimelineFailure> Failures { get; }

    /// <summary>Gets the number of sweeps of each state that occurred.</summary>
    public IReadOnlyDictionary<string, int> Counts { get; }

    /// <summary>Gets the number of changes from one known state straight to another.</summary>
    public int Switchings => Runs.Zip(Runs.Skip(1)).Count(pair => pair.First.State is not null && pair.Second.State is not null);

    /// <summary>Makes the timeline.</summary>
    /// <param name="answers">The answers, in the order of time.</param>
    /// <param name="expected">The state that was due at each sweep, null where none was stated; null as a whole where nothing was stated.</param>
    /// <exception cref="ArgumentException">There are not as many expected states as answers.</exception>
    public static StateTimeline Make(IReadOnlyList<SweepIdentification> answers, IReadOnlyList<string?>? expected = null)
    {
        ArgumentNullException.ThrowIfNull(answers);
        if (expected is not null && expected.Count != answers.Count)
        {
            throw new ArgumentException("Each sweep needs its expected state.", nameof(expected));
        }

        var (runs, failures, counts) = (new List<TimelineRun>(), new List<TimelineFailure>(), new SortedDictionary<string, int>(StringComparer.Ordinal));
        for (var n = 0; n < answers.Count; n++)
        {
            var answer = answers[n];
            if (runs.Count > 0 && runs[^1].Answer == answer.Answer && string.Equals(runs[^1].State, answer.State, StringComparison.Ordinal))
            {
                runs[^1] = runs[^1] with { Last = n };
            }
            else
            {
                runs.Add(new TimelineRun(answer.Answer, answer.State, n, n));
            }

            if (answer.State is { } state)
            {
                counts[state] = counts.GetValueOrDefault(state) + 1;
            }

            if (Fault(answer, expected?[n]) is { } text)
            {
                failures.Add(new TimelineFailure(n, expected?[n], answer, text));
            }
        }

        return new StateTimeline(runs, failures, counts);
    }

    private static string? Fault(SweepIdentification answer, string? due) => answer.Answer switch
    {
        IdentificationAnswer.Refused => answer.Reason,
        IdentificationAnswer.Unknown => $"The sweep fits no known state; {answer.Nearest} is the nearest.",
        IdentificationAnswer.Ambiguous => $"The sweep fits {answer.Nearest} and {answer.RunnerUp} about alike.",
        _ when due is not null && !string.Equals(due, answer.State, StringComparison.Ordinal) => $"The antenna is in state {answer.State} where {due} was due.",
        _ => null,
    };
}
