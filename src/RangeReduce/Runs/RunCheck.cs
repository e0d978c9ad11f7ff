using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs.Assembly;
using RangeReduce.Runs.Description;
using RangeReduce.Runs.Manifest;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs;

/// <summary>Says what a measurement folder holds and how it was understood, and writes nothing.</summary>
public static class RunCheck
{
    /// <summary>Reads a folder and describes it.</summary>
    /// <param name="folder">The measurement folder.</param>
    /// <param name="progress">Takes the share of bytes read, 0 to 1; may be called from several threads.</param>
    /// <param name="cancellationToken">Stops the work.</param>
    /// <exception cref="MeasurementDataException">The folder is missing or empty, run.toml is wrong, or nothing in the folder can be used.</exception>
    public static RunDescription Describe(string folder, IProgress<double>? progress = null, CancellationToken cancellationToken = default) =>
        Describe(RunReading.Read(folder, InputReaders.All, progress, cancellationToken));

    /// <summary>Describes a folder that has been read.</summary>
    internal static RunDescription Describe(RunReading reading)
    {
        var run = reading.Run;
        var map = new ComponentMap(reading.Plan.Manifest?.Probe);
        return new()
        {
            Information = run.Information,
            HasManifest = reading.Plan.Manifest is not null,
            Files = [.. reading.Readings.Select(file => FileOf(file, run, map))],
            States = [.. run.States.Select(state => StateOf(state, run))],
            Conventions = [.. ConventionsOf(run, reading.Plan.Manifest)],
            Requirements = run.Requirements,
            Missing = [.. MissingParts.Of(run)],
            Remarks = [.. run.Remarks.OrderByDescending(remark => remark.Severity)],
            ManifestDraft = ManifestDraft.Write(run, reading.Plan.Manifest),
        };
    }

    private static FileDescription FileOf(FileReading reading, MeasurementRun run, ComponentMap map)
    {
        var (input, content) = (reading.File.Input, reading.Content);
        return new(input, UseOf(reading, run))
        {
            Sweep = content?.Sweep is { } sweep ? new(sweep.Count, sweep.FrequencyHz[0], sweep.FrequencyHz[^1], sweep.Ports, sweep.ReferenceOhm, sweep.HasPhase) : null,
            Cuts = [.. content?.Cuts.Select(cut => CutOf(cut, map)) ?? []],
            GainTable = content?.GainTable is { } table ? new(table.FrequencyHz.Length, table.FrequencyHz[0], table.FrequencyHz[^1], table.GainDbi.Min(), table.GainDbi.Max()) : null,
            Columns = content?.Columns ?? [],
        };
    }

    private static FileUse UseOf(FileReading reading, MeasurementRun run)
    {
        var id = reading.File.Input.Id;
        bool Has(IEnumerable<StateCut> cuts) => cuts.Any(cut => cut.InputIds.Contains(id, StringComparer.Ordinal));
        bool Holds(IEnumerable<StateSweep> sweeps) => sweeps.Any(sweep => string.Equals(sweep.InputId, id, StringComparison.Ordinal));
        var standard = run.GainStandard;
        return
            reading.Fault is not null || run.Remarks.Any(remark => remark.Severity == RemarkSeverity.Fault && reading.Content is null && string.Equals(remark.Place?.File, reading.File.Input.Path, StringComparison.Ordinal)) ? FileUse.Faulty :
            reading.File.Input.Kind is InputKind.Manifest ? FileUse.Used :
            !reading.File.IsRead ? FileUse.NotRead :
            reading.Content is null ? FileUse.Copy :
            Has(run.Cuts) || Holds(run.Sweeps) || (standard is not null && (Has(standard.Readings) || Holds(standard.Sweeps) || string.Equals(standard.TableInputId, id, StringComparison.Ordinal))) ? FileUse.Used :
            Has(run.RepeatedCuts) || Holds(run.RepeatedSweeps) ? FileUse.Repeat :
            FileUse.NotRead;
    }

    private static CutDescription CutOf(RawCut cut, ComponentMap map)
    {
        var known = !cut.FrequencyHz.Any(double.IsNaN);
        var channels = cut.Channels.Select(channel => map.Of(channel.Name) is { } found
            ? new ChannelDescription(channel.Name, found.Component, found.IsTurned, channel.Samples.HasPhase)
            : new ChannelDescription(channel.Name, FieldComponent.None, IsTurned: false, channel.Samples.HasPhase));
        return new(
            cut.Axis, double.IsNaN(cut.FixedDeg) ? null : cut.FixedDeg, cut.AngleDeg.Length, cut.AngleDeg[0], cut.AngleDeg[^1], cut.FrequencyHz.Length,
            known ? cut.FrequencyHz[0] : null, known ? cut.FrequencyHz[^1] : null, cut.Reference, [.. channels], cut.Lines.First, cut.Lines.Last);
    }

    private static StateDescription StateOf(ConfigurationState state, MeasurementRun run)
    {
        int Sweeps(DataSource source) => run.Sweeps.Count(sweep => sweep.Source == source && string.Equals(sweep.State, state.Name, StringComparison.Ordinal));
        int Cuts(DataSource source) => run.Cuts.Count(cut => cut.Source == source && string.Equals(cut.State, state.Name, StringComparison.Ordinal));
        return new(state, Sweeps(DataSource.Measured), Cuts(DataSource.Measured), Sweeps(DataSource.Simulated), Cuts(DataSource.Simulated));
    }

    private static IEnumerable<ConventionDescription> ConventionsOf(MeasurementRun run, RunManifest? manifest)
    {
        var used = run.Conventions;
        yield return new("time factor", TimeFactorText.Write(used.Time), used.TimeFrom);
        yield return new("hand", "IEEE Std 145, looking along propagation", "fixed");
        yield return new("theta component", used.ThetaPort, used.PortsFrom);
        yield return new("phi component", used.PhiPort, used.PortsFrom);
        if (manifest?.Probe is { Right: { } right, Left: { } left })
        {
            yield return new("right-hand component", right, Assignment.ByManifest);
            yield return new("left-hand component", left, Assignment.ByManifest);
        }
        else if (run.Cuts.Any(cut => cut.Cut.Basis == PolarizationBasis.RightLeft))
        {
            yield return new("right-hand component", "right", "headings");
            yield return new("left-hand component", "left", "headings");
        }

        yield return new("axis of the antenna along the cuts", string.Create(CultureInfo.InvariantCulture, $"{run.AxisDeg:0.###} deg"), manifest?.AxisDeg is null ? "assumed" : Assignment.ByManifest);
    }
}
