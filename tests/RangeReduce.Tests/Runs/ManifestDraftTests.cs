using RangeReduce.Runs;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Tests.Runs;

public sealed class ManifestDraftTests : IDisposable
{
    private readonly ScratchFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void The_draft_of_a_folder_without_manifest_reads_back_as_the_same_run()
    {
        _folder.WholeRun();
        RoundTrip();
    }

    [Fact]
    public void Names_that_patterns_cannot_hold_come_back_too()
    {
        _folder.WholeRun();
        _folder.Sweep("right/s \"11\" [a].s1p", 7);
        if (!OperatingSystem.IsWindows())
        {
            _folder.Sweep("left*/s11?.s1p", 8);
            _folder.Sweep("c:d\\e/s11.s1p", 9);
        }

        RoundTrip();
    }

    [Fact]
    public void The_draft_keeps_all_that_a_manifest_said()
    {
        _folder.WholeRun();
        _folder.Write("run.toml", """
            [run]
            name = "Spring \"build\""
            date = 2026-03-14
            operator = "Night shift"
            notes = "two\nlines\u0007"
            tags = ["a", "b"]
            [conventions]
            time = "exp(-iwt)"
            [probe]
            theta = "-V"
            phi = "H"
            [antenna]
            axis = "5 deg"
            largest-dimension = "310 mm"
            [range]
            length = "4.2 m"
            [[state]]
            name = "right"
            known-hand = "right"
            sweeps = ["right/*.s1p"]
            cuts = ["right/cut_*.csv"]
            simulated-sweeps = ["model/right.s1p"]
            simulated-cuts = ["model/right_*.csv"]
            [gain-standard]
            table = "horn/gain.csv"
            cuts = ["horn/*.csv"]
            [uncertainty]
            gain-standard = "0.25 dB"
            noise-floor = "-90 dBm"
            [report]
            laboratory = "Harbour laboratory"
            "odd key" = "x"
            [[requirement]]
            quantity = "axial-ratio"
            state = "right"
            band = "1.58 GHz .. 1.64 GHz"
            cone = "30 deg"
            at-most = "3 dB"
            [[requirement]]
            quantity = "vswr"
            at-most = 1.5
            [[requirement]]
            quantity = "hand"
            state = "right"
            equals = "right"
            """);
        RoundTrip();
    }

    private void RoundTrip()
    {
        var before = MeasurementRunReader.Read(_folder.Path);
        var draft = RunCheck.Describe(_folder.Path).ManifestDraft;
        _folder.Write(ManifestReader.FileName, draft);
        var after = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(Plan(before), Plan(after));
        Assert.Equal(before.States, after.States);
        Assert.Equal(before.Cuts.Select(cut => (cut.State, cut.Source, cut.Cut.FixedDeg, cut.Cut.First!.Re[0])), after.Cuts.Select(cut => (cut.State, cut.Source, cut.Cut.FixedDeg, cut.Cut.First!.Re[0])));
        Assert.Equal((before.Conventions.Time, before.Conventions.ThetaPort, before.Conventions.PhiPort), (after.Conventions.Time, after.Conventions.ThetaPort, after.Conventions.PhiPort));
        Assert.Equal((before.AxisDeg, before.RangeLengthM, before.LargestDimensionM), (after.AxisDeg, after.RangeLengthM, after.LargestDimensionM));
        Assert.Equal(before.UncertaintyTerms, after.UncertaintyTerms);
        Assert.Equal(before.Requirements.Select(requirement => requirement with { Line = 0 }), after.Requirements.Select(requirement => requirement with { Line = 0 }));
        Assert.Equal(before.Information.ReportFields, after.Information.ReportFields);
        Assert.Equal((before.Information.Name, before.Information.Date, before.Information.Notes), (after.Information.Name, after.Information.Date, after.Information.Notes));
        Assert.DoesNotContain(after.Remarks, remark => remark.Severity == Diagnostics.RemarkSeverity.Fault);
        Assert.Equal(draft.Replace("  # assumed: correct it where it is wrong", string.Empty, StringComparison.Ordinal), RunCheck.Describe(_folder.Path).ManifestDraft);
    }

    private static string Plan(MeasurementRun run) =>
        string.Join('\n', run.Inputs.Where(input => input.Kind != InputKind.Manifest).Select(input => $"{input.Path} {input.Sha256} {input.Kind} {input.State} {input.Source}"));
}
