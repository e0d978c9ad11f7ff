using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Corrections;

/// <summary>Turns simulated gain into realized gain by the simulated reflection sweep, so that it can be laid beside a measured gain by comparison.</summary>
/// <remarks>Gain by IEEE Std 145 leaves the mismatch out; realized gain is gain times (1 − |Γ|²). A table in dBi is taken for gain.</remarks>
public static class SimulatedMismatchCorrection
{
    /// <summary>The stable name of the correction.</summary>
    public const string Name = "simulated-mismatch";

    /// <summary>Applies the mismatch to every simulated cut in dBi whose state has a simulated sweep over its frequencies.</summary>
    public static MeasurementRun Apply(MeasurementRun run)
    {
        ArgumentNullException.ThrowIfNull(run);
        var (cuts, remarks, inputs, states) = (new List<StateCut>(), new List<Remark>(run.Remarks), new List<string>(), new List<string>());
        foreach (var cut in run.Cuts)
        {
            if (cut.Source != DataSource.Simulated || cut.Cut.Reference != LevelReference.Isotropic || cut.Cut.IsRealized)
            {
                cuts.Add(cut);
                continue;
            }

            var sweep = run.Sweeps.FirstOrDefault(sweep => sweep.Source == DataSource.Simulated && string.Equals(sweep.State, cut.State, StringComparison.Ordinal));
            if (sweep is null || sweep.Sweep.Count < 2 || cut.Cut.FrequencyHz[0] < sweep.Sweep.FrequencyHz[0] || cut.Cut.FrequencyHz[^1] > sweep.Sweep.FrequencyHz[^1])
            {
                var remark = new Remark(RemarkSeverity.Note, "gain-not-realized", $"The simulated gain of state {cut.State} has no mismatch in it, for want of a simulated sweep over its frequencies: it is not compared with measured realized gain.", State: cut.State);
                if (!remarks.Contains(remark))
                {
                    remarks.Add(remark);
                }

                cuts.Add(cut);
                continue;
            }

            cuts.Add(cut with { Cut = Apply(cut.Cut, sweep.Sweep) });
            inputs.Add(sweep.InputId);
            states.Add(cut.State);
        }

        return inputs.Count == 0
            ? run with { Remarks = remarks }
            : run with
            {
                Cuts = cuts,
                Remarks = remarks,
                Corrections = [.. run.Corrections, new(Name, $"Simulated gain of {string.Join(", ", states.Distinct(StringComparer.Ordinal))} multiplied by 1 − |Γ|² of the simulated sweep, which makes it realized gain like the measured one.", [.. inputs.Distinct(StringComparer.Ordinal)])],
            };
    }

    private static PatternCut Apply(PatternCut cut, NetworkSweep sweep)
    {
        var count = sweep.Count;
        var (re, im) = (new double[count], new double[count]);
        for (var i = 0; i < count; i++)
        {
            (re[i], im[i]) = (sweep[i, 0, 0].Real, sweep[i, 0, 0].Imaginary);
        }

        var factor = Array.ConvertAll(cut.FrequencyHz, hertz =>
        {
            var found = Array.BinarySearch(sweep.FrequencyHz, hertz);
            var segment = Math.Clamp(found >= 0 ? found : ~found - 1, 0, count - 2);
            var (atRe, atIm) = (LocalCubic.Interpolate(sweep.FrequencyHz, re, segment, hertz), LocalCubic.Interpolate(sweep.FrequencyHz, im, segment, hertz));
            return Math.Sqrt(Math.Max(0.0, 1.0 - (atRe * atRe) - (atIm * atIm)));
        });
        return cut with { First = cut.First?.Scaled(factor), Second = cut.Second?.Scaled(factor), IsRealized = true };
    }
}
