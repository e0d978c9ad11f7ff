using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Tests.Runs;

public sealed class MeasurementRunReaderTests : IDisposable
{
    private readonly ScratchFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Without_a_manifest_folders_names_and_content_say_what_each_file_is()
    {
        _folder.WholeRun();
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(
            """
            i1 README.txt Other  
            i2 horn/gain.csv GainTable  
            i3 horn/levels.csv GainStandardCut  Measured
            i4 left/cuts.csv Cut left Measured
            i5 left/s11.s1p Sweep left Measured
            i6 model/left.s1p Sweep left Simulated
            i7 model/right.s1p Sweep right Simulated
            i8 model/right_cuts.csv Cut right Simulated
            i9 right/cut_phi0.csv Cut right Measured
            i10 right/cut_phi90.csv Cut right Measured
            i11 right/s11.s1p Sweep right Measured
            """.ReplaceLineEndings("\n"),
            string.Join('\n', run.Inputs.Select(input => $"{input.Id} {input.Path} {input.Kind} {input.State} {input.Source}")));
        Assert.Equal([new("left", Hand.Left), new ConfigurationState("right", Hand.Right)], run.States);
        Assert.Equal("left Measured, left Simulated, right Measured, right Simulated", string.Join(", ", run.Sweeps.Select(sweep => $"{sweep.State} {sweep.Source}")));
        Assert.Equal(
            "left Measured 0, left Measured 45, left Measured 90, right Measured 0, right Measured 90, right Simulated 0, right Simulated 90",
            string.Join(", ", run.Cuts.Select(cut => ScratchFolder.Text($"{cut.State} {cut.Source} {cut.Cut.FixedDeg}"))));
        Assert.All(run.Cuts, cut => Assert.True(cut.Cut.IsComplex));
        Assert.Equal([1.5e9, 1.6e9, 1.7e9], run.GainStandard!.FrequencyHz);
        Assert.Equal("i3", Assert.Single(Assert.Single(run.GainStandard.Readings).InputIds));
        Assert.Equal(("assumed", "assumed"), (run.Conventions.TimeFrom, run.Conventions.PortsFrom));
        Assert.DoesNotContain(run.Remarks, remark => remark.Severity != RemarkSeverity.Note);
    }

    [Fact]
    public void Checksums_are_those_of_the_bytes()
    {
        _folder.Sweep("right/s11.s1p");
        _folder.Write("abc.md", "abc");

        // FIPS 180-4, example of SHA-256 for the message "abc".
        Assert.Equal("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", MeasurementRunReader.Read(_folder.Path).Inputs[0].Sha256);
    }

    [Fact]
    public void The_manifest_decides_over_names_and_what_it_does_not_list_is_not_read()
    {
        _folder.WholeRun();
        _folder.Write("run.toml", """
            [run]
            name = "Turned"
            [conventions]
            time = "exp(-iwt)"
            [[state]]
            name = "A"
            sweeps = ["left/*.s1p"]
            cuts = ["left/**"]
            """);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal("Turned", run.Information.Name);
        Assert.Equal("A", Assert.Single(run.States).Name);
        Assert.Equal("A run.toml", string.Join(", ", run.Inputs.Where(input => input.Kind == InputKind.Sweep).Select(input => $"{input.State} {input.Reason}")));
        Assert.Equal(8, run.Remarks.Count(remark => remark.Code is "unlisted-file"));
        Assert.Null(run.GainStandard);
        Assert.Equal(TimeFactor.MinusI, run.Conventions.Time);

        // The file has a negative imaginary part; exp(-iwt) conjugates it.
        Assert.Equal(0.22, run.Sweeps[0].Sweep[0, 0, 0].Imaginary, 1e-15);
    }

    [Fact]
    public void A_gain_table_among_the_cuts_of_the_standard_is_not_a_cut()
    {
        _folder.WholeRun();
        _folder.Write("run.toml", """
            [[state]]
            name = "right"
            cuts = ["right/*.csv"]
            [gain-standard]
            table = "horn/gain.csv"
            cuts = ["horn/*.csv"]
            """);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(InputKind.GainTable, run.Inputs.Single(input => input.Path is "horn/gain.csv").Kind);
        Assert.Equal(10.6, run.GainStandard!.GainDbi[1]);
        Assert.Single(run.GainStandard.Readings);
    }

    [Fact]
    public void A_file_that_two_states_claim_is_used_for_neither()
    {
        _folder.WholeRun();
        _folder.Write("run.toml", """
            [[state]]
            name = "right"
            sweeps = ["*/s11.s1p"]
            cuts = ["right/*.csv"]
            [[state]]
            name = "left"
            sweeps = ["left/*.s1p", "nowhere/*.s1p"]
            """);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal("right", Assert.Single(run.Sweeps).State);
        Assert.Contains("state right and to state left", run.Remarks.Single(remark => remark.Code is "claimed-twice").Text, StringComparison.Ordinal);
        Assert.Equal(new SourcePlace("run.toml", 7, 25), run.Remarks.Single(remark => remark.Code is "pattern-without-file").Place);
        Assert.Contains(run.Remarks, remark => remark is { Code: "state-without-data", State: "left" });
    }

    [Fact]
    public void A_copy_is_used_once_and_another_measurement_of_the_same_thing_is_kept_as_a_repeat()
    {
        _folder.Sweep("right/a.s1p", 1);
        _folder.Sweep("right/b.s1p", 1);
        _folder.Sweep("right/c.s1p", 2);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal("i1", Assert.Single(run.Sweeps).InputId);
        Assert.Equal("i3", Assert.Single(run.RepeatedSweeps).InputId);
        Assert.Equal((RemarkSeverity.Note, "right/b.s1p"), run.Remarks.Where(remark => remark.Code is "same-file-twice").Select(remark => (remark.Severity, remark.Place!.Value.File)).Single());
        Assert.Equal((RemarkSeverity.Doubt, "right/c.s1p"), run.Remarks.Where(remark => remark.Code is "repeated-sweep").Select(remark => (remark.Severity, remark.Place!.Value.File)).Single());
    }

    [Fact]
    public void The_same_bytes_under_two_states_are_a_sign_of_a_mix_up()
    {
        _folder.Sweep("right/s11.s1p", 1);
        _folder.Sweep("left/s11.s1p", 1);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(2, run.Sweeps.Count);
        Assert.Equal(RemarkSeverity.Doubt, run.Remarks.Single(remark => remark.Code is "same-bytes-elsewhere").Severity);
    }

    [Fact]
    public void Channels_angle_and_state_can_come_from_the_file_names()
    {
        _folder.Cut("long_phi045_h.csv", ["H"], []);
        _folder.Cut("long_phi045_v.csv", ["V"], []);
        var run = MeasurementRunReader.Read(_folder.Path);
        var cut = Assert.Single(run.Cuts);
        Assert.Equal(("long", 45.0, "i1 i2"), (cut.State, cut.Cut.FixedDeg, string.Join(' ', cut.InputIds)));
        Assert.True(cut.Cut.IsComplex);
    }

    [Fact]
    public void A_gain_table_and_a_reflection_table_are_known_by_their_headings_wherever_they_lie()
    {
        _folder.Cut("right/cut.csv", ["H", "V"], [0]);
        _folder.Write("right/match.csv", "frequency [GHz],S11 re,S11 im\n1.6,0.1,0.2\n1.7,0.2,0.1\n");
        _folder.GainTable("papers/certificate.csv");
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal("right", Assert.Single(run.States).Name);
        Assert.Equal(0.2, Assert.Single(run.Sweeps).Sweep[0, 0, 0].Imaginary);
        Assert.Equal(3, run.GainStandard!.GainDbi.Length);
        Assert.Equal("gain-standard-without-levels", Assert.Single(run.Remarks, remark => remark.Severity == RemarkSeverity.Doubt).Code);
    }

    [Fact]
    public void Columns_in_words_of_their_own_are_read_as_the_manifest_says()
    {
        _folder.Write("right/cut.csv", "F [GHz],Winkel,A,B,C,D\n1.6,-10,0.1,0.2,0.3,0.4\n1.6,0,0.5,0.6,0.7,0.8\n1.6,10,0.1,0.2,0.3,0.4\n");
        string[] columns = ["Winkel=theta [deg]", "A=h re", "B=h im", "C=v re", "D=v im", "Winkl=theta [deg]"];
        _folder.Write("run.toml", string.Join('\n', columns.Select(column => $"[[columns]]\nheading = \"{column.Split('=')[0]}\"\nmeaning = \"{column.Split('=')[1]}\"")));
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal([0.3, 0.7, 0.3], Assert.Single(run.Cuts).Cut.Second!.Re);
        var remark = run.Remarks.Single(remark => remark.Code is "column-not-found");
        Assert.Equal(16, remark.Place?.Line);
        Assert.Contains("\"Winkel\"", remark.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Linear_and_circular_components_of_one_cut_are_two_cuts()
    {
        _folder.Cut("right/linear.csv", ["H", "V"], [0], 1);
        _folder.Cut("right/circular.csv", ["right", "left"], [0], 2);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(2, run.Cuts.Select(cut => cut.Cut.Basis).Distinct().Count());
        Assert.Empty(run.RepeatedCuts);
    }

    [Fact]
    public void A_requirement_about_a_state_that_the_folder_does_not_have_is_a_fault()
    {
        _folder.Sweep("right/s11.s1p");
        _folder.Write("run.toml", "[[requirement]]\nquantity = \"return-loss\"\nstate = \"rihgt\"\nat-least = \"10 dB\"");
        Assert.Equal(new SourcePlace("run.toml", 1), MeasurementRunReader.Read(_folder.Path).Remarks.Single(remark => remark.Code is "unknown-state").Place);
    }

    [Fact]
    public void Reading_twice_gives_the_same_run_and_progress_ends_at_one()
    {
        _folder.WholeRun();
        var shares = new System.Collections.Concurrent.ConcurrentQueue<double>();
        var first = MeasurementRunReader.Read(_folder.Path, new Sink(shares.Enqueue));
        var second = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(1.0, shares.Max());
        Assert.Equal(first.Inputs, second.Inputs);
        Assert.Equal(first.Remarks, second.Remarks);
        Assert.Equal(first.Cuts.Select(cut => (cut.State, cut.Source, cut.Cut.FixedDeg, cut.Cut.First!.Re.Sum())), second.Cuts.Select(cut => (cut.State, cut.Source, cut.Cut.FixedDeg, cut.Cut.First!.Re.Sum())));
    }

    [Fact]
    public void A_cancelled_reading_stops()
    {
        _folder.WholeRun();
        Assert.ThrowsAny<OperationCanceledException>(() => MeasurementRunReader.Read(_folder.Path, null, new(canceled: true)));
    }

    [Fact]
    public void A_wrong_manifest_stops_the_reading_with_all_its_errors()
    {
        _folder.WholeRun();
        _folder.Write(ManifestReader.FileName, "[run]\nnmae = \"x\"\n[range]\nlength = 4");
        var error = Assert.Throws<MeasurementDataException>(() => MeasurementRunReader.Read(_folder.Path));
        Assert.Equal(("run.toml:2:1", "run.toml:4:10"), (error.Place.ToString(), Assert.Single(error.Others).Place.ToString()));
    }

    private sealed class Sink(Action<double> take) : IProgress<double>
    {
        public void Report(double value) => take(value);
    }
}
