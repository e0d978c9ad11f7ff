using RangeReduce.Diagnostics;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs.Assembly;

/// <summary>A measurement folder read: the plan, each file's reading and the run put together.</summary>
/// <param name="Plan">The plan with the final kinds.</param>
/// <param name="Readings">One reading a file, in order.</param>
/// <param name="Run">The run.</param>
internal sealed record RunReading(RunPlan Plan, IReadOnlyList<FileReading> Readings, MeasurementRun Run)
{
    /// <summary>Plans, reads and assembles a folder.</summary>
    /// <exception cref="MeasurementDataException">The folder or its manifest is wrong, or nothing in it can be used.</exception>
    public static RunReading Read(string folder, IInputReaders readers, IProgress<double>? progress, CancellationToken cancellationToken)
    {
        var plan = RunPlanner.Plan(folder, readers, cancellationToken);
        var remarks = plan.Remarks.ToList();
        var copies = RepeatedFiles.CopiesAmong(plan.Files, remarks);
        var raw = FileReading.ReadAll(plan, copies, readers, progress, cancellationToken);
        remarks.AddRange(raw.SelectMany(reading => reading.Fault is { } fault ? [fault.ToRemark() with { State = reading.File.Input.State }] : reading.Content?.Remarks ?? []));
        FileReading[] readings = [.. raw.Select(reading => KindSettler.Settle(reading, remarks))];

        // A copy was not read, so it takes the kind that its original turned out to have.
        readings = [.. readings.Select(reading => copies.Contains(reading.File.Input.Id) ? LikeOriginal(reading, readings) : reading)];
        ColumnStatements.Check(plan.Manifest, raw, remarks);
        var files = readings.Select(reading => reading.File).ToArray();
        var settled = plan with { Files = files, States = StatesWithFiles(plan, files, remarks), Remarks = remarks };
        var run = Assemble(settled, readings, remarks);
        if (run.Sweeps.Count + run.Cuts.Count == 0)
        {
            throw Nothing(folder, plan, raw);
        }

        return new(settled, readings, run);
    }

    private static MeasurementRun Assemble(RunPlan plan, FileReading[] readings, List<Remark> remarks)
    {
        var map = new ComponentMap(plan.Manifest?.Probe);
        var time = plan.Manifest?.Time ?? TimeFactor.PlusJ;
        var maker = new PieceMaker(map, time, remarks);
        var pieces = readings.Where(reading => reading.Content is not null).SelectMany(reading => reading.Content!.Cuts.SelectMany(cut => maker.PiecesOf(reading.File, cut))).ToArray();
        var (cuts, repeatedCuts) = CutJoiner.Join(pieces, remarks);
        var sweepFiles = readings.Where(reading => reading.Content?.Sweep is not null).Select(reading => (reading.File, reading.File.IsOfGainStandard ? GainStandard.StateName : reading.File.Input.State!, reading.Content!.Sweep!));
        var (sweeps, repeatedSweeps) = SweepAssembler.Assemble(sweepFiles, time, remarks);
        var order = plan.States.Select((state, at) => (state.Name, at)).ToDictionary(pair => pair.Name, pair => pair.at, StringComparer.Ordinal);
        var standard = GainStandardAssembler.Assemble(readings, [.. Ordered(cuts.Where(piece => piece.State is null))], [.. sweeps.Where(OfStandard)], remarks);
        RemarkOnStates(plan, sweeps, cuts, remarks);
        return new()
        {
            Information = InformationOf(plan),
            Conventions = map.Conventions(plan.Manifest?.Time, maker.UsedAssumed, maker.UsedHeadings),
            Inputs = [.. plan.Files.Select(file => file.Input)],
            States = plan.States,
            Sweeps = [.. sweeps.Where(sweep => !OfStandard(sweep)).OrderBy(sweep => order[sweep.State]).ThenBy(sweep => sweep.Source)],
            Cuts = [.. Ordered(cuts.Where(piece => piece.State is not null))],
            RepeatedSweeps = [.. repeatedSweeps.Where(sweep => !OfStandard(sweep)).OrderBy(sweep => order[sweep.State]).ThenBy(sweep => sweep.Source)],
            RepeatedCuts = [.. Ordered(repeatedCuts.Where(piece => piece.State is not null))],
            GainStandard = standard,
            AxisDeg = plan.Manifest?.AxisDeg ?? 0.0,
            RangeLengthM = plan.Manifest?.RangeLengthM,
            LargestDimensionM = plan.Manifest?.LargestDimensionM,
            UncertaintyTerms = plan.Manifest?.UncertaintyTerms ?? [],
            Requirements = plan.Manifest?.Requirements ?? [],
            Remarks = remarks,
        };

        IEnumerable<StateCut> Ordered(IEnumerable<CutPiece> all) => all
            .OrderBy(piece => piece.State is null ? -1 : order[piece.State]).ThenBy(piece => piece.Source).ThenBy(piece => piece.Path, StringComparer.Ordinal).ThenBy(piece => piece.Cut.FixedDeg)
            .Select(piece => new StateCut(piece.InputIds, piece.State ?? GainStandard.StateName, piece.Source, piece.Cut));

        static bool OfStandard(StateSweep sweep) => string.Equals(sweep.State, GainStandard.StateName, StringComparison.Ordinal);
    }

    /// <summary>Drops the states that a name alone made and that lost their files when the content turned out to be the gain standard's.</summary>
    private static IReadOnlyList<ConfigurationState> StatesWithFiles(RunPlan plan, PlannedFile[] files, List<Remark> remarks)
    {
        if (plan.Manifest is { States.Count: > 0 })
        {
            return plan.States;
        }

        var left = plan.States.Where(state => Array.Exists(files, file => string.Equals(file.Input.State, state.Name, StringComparison.Ordinal))).ToArray();
        var dropped = plan.States.Except(left).Select(state => state.Name).ToHashSet(StringComparer.Ordinal);
        remarks.RemoveAll(remark => remark.State is { } state && dropped.Contains(state) && remark.Severity != RemarkSeverity.Fault);
        return left;
    }

    private static RunInformation InformationOf(RunPlan plan)
    {
        var manifest = plan.Manifest;
        return new()
        {
            Name = manifest?.Name ?? Path.GetFileName(Path.TrimEndingDirectorySeparator(Path.GetFullPath(plan.Folder))),
            Folder = plan.Folder,
            Date = manifest?.Date,
            Operator = manifest?.Operator,
            Chamber = manifest?.Chamber,
            Notes = manifest?.Notes,
            Antenna = manifest?.Antenna,
            Serial = manifest?.Serial,
            Tags = manifest?.Tags ?? [],
            ReportFields = manifest?.ReportFields ?? new Dictionary<string, string>(StringComparer.Ordinal),
        };
    }

    private static void RemarkOnStates(RunPlan plan, List<StateSweep> sweeps, List<CutPiece> cuts, List<Remark> remarks)
    {
        foreach (var state in plan.States.Select(state => state.Name))
        {
            if (!sweeps.Exists(sweep => Same(sweep.State, state)) && !cuts.Exists(cut => Same(cut.State, state)))
            {
                remarks.Add(new(RemarkSeverity.Doubt, "state-without-data", $"State {state} has no sweep and no cut that could be used.", State: state));
            }
        }

        foreach (var requirement in plan.Manifest?.Requirements ?? [])
        {
            foreach (var name in new[] { requirement.State, requirement.OtherState }.OfType<string>().Where(name => !plan.States.Any(state => Same(state.Name, name))))
            {
                remarks.Add(new(RemarkSeverity.Fault, "unknown-state", $"Requirement {requirement.Id} is about state {name}, which this run does not have.", new(plan.Manifest!.Path, requirement.Line)));
            }
        }

        static bool Same(string? a, string b) => string.Equals(a, b, StringComparison.Ordinal);
    }

    private static FileReading LikeOriginal(FileReading copy, FileReading[] readings)
    {
        var original = Array.Find(readings, each => each.Content is not null && string.Equals(each.File.Input.Sha256, copy.File.Input.Sha256, StringComparison.Ordinal));
        return original is null ? copy : copy with { File = copy.File with { Input = copy.File.Input with { Kind = original.File.Input.Kind } } };
    }

    private static MeasurementDataException Nothing(string folder, RunPlan plan, FileReading[] readings)
    {
        MeasurementDataException[] faults = [.. plan.Faults, .. readings.Select(reading => reading.Fault).OfType<MeasurementDataException>()];
        var count = plan.Files.Count == 1 ? "one file, which is no sweep or cut that can be used" : $"{plan.Files.Count} files, none of which is a sweep or cut that can be used";
        var advice = faults.Length > 0 ? $"The first fault is at {faults[0].Message}" : "Put Touchstone files or tables with headings into the folder, or list the files in run.toml.";
        return new(new(folder), "nothing-readable", count, "at least one sweep or cut", advice) { Others = faults };
    }
}
