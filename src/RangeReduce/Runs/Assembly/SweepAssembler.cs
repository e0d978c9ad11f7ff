using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs.Assembly;

/// <summary>Brings sweeps to the time factor of the house and tells the ones to use from repeats.</summary>
internal static class SweepAssembler
{
    /// <summary>Assembles the sweeps.</summary>
    /// <param name="sweeps">Files and their sweeps, in order.</param>
    /// <param name="time">Time factor of the files.</param>
    /// <param name="remarks">Takes what was remarked.</param>
    /// <returns>The sweeps to use, and those that repeat one of them.</returns>
    public static (List<StateSweep> Used, List<StateSweep> Repeats) Assemble(IEnumerable<(PlannedFile File, string State, NetworkSweep Sweep)> sweeps, TimeFactor time, List<Remark> remarks)
    {
        var (used, repeats) = (new List<(StateSweep Sweep, string Path)>(), new List<StateSweep>());
        foreach (var (file, state, raw) in sweeps)
        {
            var sweep = new StateSweep(file.Input.Id, state, file.Input.Source ?? Quantities.DataSource.Measured, time == TimeFactor.MinusI ? Conjugate(raw) : raw);
            var same = used.Find(known => string.Equals(known.Sweep.State, state, StringComparison.Ordinal) && known.Sweep.Source == sweep.Source && Overlap(known.Sweep.Sweep, raw));
            if (same.Sweep is null)
            {
                used.Add((sweep, file.Input.Path));
                continue;
            }

            repeats.Add(sweep);
            remarks.Add(new(RemarkSeverity.Doubt, "repeated-sweep", $"A sweep over these frequencies was already given by {same.Path}; this one is kept as a repeat and the figures are made of the first.", new(file.Input.Path), file.Input.State));
        }

        return (used.ConvertAll(each => each.Sweep), repeats);
    }

    // Two sweeps that only touch at a band edge complete each other.
    private static bool Overlap(NetworkSweep a, NetworkSweep b) =>
        a.Count > 0 && b.Count > 0 && ((a.FrequencyHz[0] < b.FrequencyHz[^1] && b.FrequencyHz[0] < a.FrequencyHz[^1]) || a.FrequencyHz.AsSpan().SequenceEqual(b.FrequencyHz));

    private static NetworkSweep Conjugate(NetworkSweep sweep) =>
        new(sweep.FrequencyHz, sweep.Ports, sweep.ReferenceOhm, sweep.Re, Array.ConvertAll(sweep.Im, value => -value)) { HasPhase = sweep.HasPhase };
}
