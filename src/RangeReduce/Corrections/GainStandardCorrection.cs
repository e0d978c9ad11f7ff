using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Corrections;

/// <summary>Gain by comparison: replaces receiver levels by realized partial gain through the readings of a gain standard.</summary>
/// <remarks>
/// Each probe port is calibrated by itself: G(x) = G(standard) + P(x) − P(standard) in dB on that port (IEEE Std 149, gain-comparison method).
/// A linear port sees the linear standard that stands along it: no 3 dB. A circular port takes half the power of a linear wave: 3.0103 dB less,
/// and since no port is purely circular its reading is averaged in power over the orthogonal positions of the standard, which is exact for any axial ratio of the port.
/// What the standard says about level says nothing about the phase between the ports: that stays as recorded.
/// </remarks>
public static class GainStandardCorrection
{
    /// <summary>The stable name of the correction.</summary>
    public const string Name = "gain-standard";

    /// <summary>Calibrates every measured cut with receiver levels; the run is returned as it is where there is no standard.</summary>
    public static MeasurementRun Apply(MeasurementRun run)
    {
        ArgumentNullException.ThrowIfNull(run);
        if (run.GainStandard is not { } standard)
        {
            return run;
        }

        var remarks = new List<Remark>(run.Remarks);
        var (cuts, calibrated, usedInputs) = (new List<StateCut>(run.Cuts.Count), 0, new SortedSet<string>(StringComparer.Ordinal));
        var ports = new Dictionary<PolarizationBasis, PortCalibration?>();
        foreach (var cut in run.Cuts)
        {
            if (cut.Source != DataSource.Measured || cut.Cut.Reference != LevelReference.Receiver)
            {
                cuts.Add(cut);
                continue;
            }

            if (!ports.TryGetValue(cut.Cut.Basis, out var calibration))
            {
                calibration = PortCalibration.Of(standard, cut.Cut.Basis);
                ports.Add(cut.Cut.Basis, calibration);
            }

            if (calibration is null || calibration.LacksPortOf(cut.Cut))
            {
                AddOnce(new(RemarkSeverity.Doubt, "no-standard-reading", $"The gain standard was not read through (or did not stand along) each of the {PortsOf(cut.Cut.Basis)} of the probe, so the cuts of state {cut.State} taken with them stay levels without gain.", State: cut.State));
                cuts.Add(cut);
                continue;
            }

            if (calibration.HasOnePosition)
            {
                AddOnce(new(RemarkSeverity.Doubt, "standard-one-position", "The gain standard was read through the circular ports in one position only: their own axial ratio stays in the gain (a port of 1 dB axial ratio brings 0.5 dB). Read it in two positions at right angles."));
            }

            var changed = calibration.Apply(cut.Cut, out var lost);
            if (lost > 0)
            {
                AddOnce(new(RemarkSeverity.Doubt, "standard-range", string.Create(CultureInfo.InvariantCulture, $"{lost} of {cut.Cut.FrequencyHz.Length} frequencies of the cuts of state {cut.State} lie outside the readings or the gain table of the standard: there is no gain at them."), State: cut.State));
            }

            cuts.Add(cut with { Cut = changed });
            usedInputs.UnionWith(calibration.Inputs);
            calibrated++;
        }

        if (calibrated == 0)
        {
            return run with { Remarks = remarks };
        }

        var words = ports.Where(port => port.Value is not null).Select(port => port.Value!.Words);
        var text = string.Create(CultureInfo.InvariantCulture, $"Receiver levels of {calibrated} cuts turned into realized gain by comparison with the gain standard, port by port ({string.Join("; ", words)}).");
        return run with
        {
            Cuts = cuts,
            Remarks = remarks,
            Corrections = [.. run.Corrections, new(Name, text, [standard.TableInputId, .. usedInputs])],
        };

        void AddOnce(Remark remark)
        {
            if (!remarks.Contains(remark))
            {
                remarks.Add(remark);
            }
        }
    }

    private static string PortsOf(PolarizationBasis basis) => basis == PolarizationBasis.ThetaPhi ? "two linear ports" : "two circular ports";
}
