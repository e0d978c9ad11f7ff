using System.Diagnostics;
using CsCheck;
using RangeReduce.Diagnostics;
using RangeReduce.Runs;

namespace RangeReduce.Tests.Runs;

/// <summary>What a folder can do to us, and that each fault gets its sentence while the rest is still read.</summary>
public sealed class BadInputTests : IDisposable
{
    // What a refusal may allocate: blocks for looking and hashing, never the file.
    private const long FarLessThanTheFile = 256L << 20;

    private readonly ScratchFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void An_empty_folder_is_said_to_be_empty() => Assert.Equal("empty-folder", Failure().Code);

    [Fact]
    public void A_folder_with_nothing_readable_says_how_many_files_were_looked_at()
    {
        _folder.Write("notes.txt", "Nothing here but words.\n");
        _folder.Write("picture.png", [0x89, 0x50, 0x4E, 0x47, 0, 0, 1, 2]);
        var error = Failure();
        Assert.Equal("nothing-readable", error.Code);
        Assert.Contains("2 files", error.Found, StringComparison.Ordinal);
    }

    [Fact]
    public void Where_the_only_file_is_faulty_its_fault_is_told_with_its_line()
    {
        _folder.Write("right/s11.s1p", "# GHZ S MA R 50\n1.0 0.5 0\n1.1 nonsense 0\n");
        var error = Failure();
        Assert.Equal("nothing-readable", error.Code);
        Assert.Equal(("right/s11.s1p", 3), (Assert.Single(error.Others).Place.File, error.Others[0].Place.Line));
        Assert.Contains("right/s11.s1p:3", error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("1.1 0.4")]
    [InlineData("1.1 nan 0")]
    [InlineData("1.1 text 0")]
    public void A_sweep_that_is_cut_off_or_holds_no_number_is_left_out_and_the_rest_is_read(string row)
    {
        _folder.WholeRun();
        _folder.Write("right/s11.s1p", $"# GHZ S MA R 50\n1.0 0.5 0\n{row}\n");
        Fault("right/s11.s1p", 3);
    }

    [Theory]
    [InlineData("1.6e9,0,0,text,0.1,0.2,0.3")]
    [InlineData("1.6e9,0,0,0.1,0.2")]
    public void A_cut_with_text_for_a_number_or_a_missing_value_is_left_out_and_the_rest_is_read(string row)
    {
        _folder.WholeRun();
        _folder.Write("right/cut_phi0.csv", $"frequency [Hz],phi [deg],theta [deg],H re,H im,V re,V im\n1.6e9,0,-10,0.1,0.2,0.3,0.4\n{row}\n1.6e9,0,10,0.1,0.2,0.3,0.4\n");
        Fault("right/cut_phi0.csv", 3);
    }

    [Fact]
    public void A_cut_with_a_missing_channel_is_used_and_says_what_it_lacks()
    {
        _folder.WholeRun();
        _folder.Cut("right/cut_phi0.csv", ["H"], [0]);
        var run = MeasurementRunReader.Read(_folder.Path);
        var remark = run.Remarks.Single(remark => remark.Code is "missing-channel");
        Assert.Equal(("right/cut_phi0.csv", RemarkSeverity.Doubt), (remark.Place?.File, remark.Severity));
        Assert.Contains(run.Cuts, cut => cut is { State: "right", Cut.Second: null });
    }

    [Fact]
    public void An_empty_file_among_good_ones_is_a_fault()
    {
        _folder.WholeRun();
        _folder.Write("right/cut_phi0.csv", string.Empty);
        Fault("right/cut_phi0.csv", 0);
    }

    [Fact]
    public void Two_gigabytes_of_zeros_are_refused_at_once()
    {
        _folder.WholeRun();
        using (var file = File.Create(_folder.At("right/cut_phi0.csv")))
        {
            file.SetLength(2L << 30);
        }

        var before = GC.GetTotalAllocatedBytes();
        Fault("right/cut_phi0.csv", 0);
        Assert.InRange(GC.GetTotalAllocatedBytes() - before, 0L, FarLessThanTheFile);
    }

    [Fact]
    public void A_heading_followed_by_two_gigabytes_of_zeros_is_refused_at_once()
    {
        _folder.WholeRun();
        using (var file = File.OpenWrite(_folder.At("right/cut_phi0.csv")))
        {
            file.SetLength(2L << 30);
        }

        var before = GC.GetTotalAllocatedBytes();
        Fault("right/cut_phi0.csv", 0);
        Assert.InRange(GC.GetTotalAllocatedBytes() - before, 0L, FarLessThanTheFile);
    }

    [Fact]
    public void A_file_that_may_not_be_read_is_a_fault_and_the_rest_is_read()
    {
        _folder.WholeRun();
        if (OperatingSystem.IsWindows())
        {
            return;
        }

        File.SetUnixFileMode(_folder.At("right/s11.s1p"), UnixFileMode.None);
        if (CanBeRead(_folder.At("right/s11.s1p")))
        {
            return; // The superuser may read everything.
        }

        Fault("right/s11.s1p", 0);
    }

    [Fact]
    public void A_pipe_is_never_waited_for()
    {
        if (OperatingSystem.IsWindows())
        {
            return;
        }

        _folder.WholeRun();
        using (var made = Process.Start("mkfifo", _folder.At("right/live.csv")))
        {
            made.WaitForExit();
        }

        Assert.Contains(MeasurementRunReader.Read(_folder.Path).Remarks, remark => remark.Code is "empty-file");
    }

    [Fact]
    public void A_link_loop_does_not_keep_the_rest_from_being_read()
    {
        _folder.WholeRun();
        Directory.CreateSymbolicLink(_folder.At("right/loop"), _folder.Path);
        var run = MeasurementRunReader.Read(_folder.Path);
        Assert.Equal(11, run.Inputs.Count);
        Assert.Contains(run.Remarks, remark => remark.Code is "link-not-followed");
    }

    [Theory]
    [InlineData("../other/*.csv")]
    [InlineData("/etc/*")]
    [InlineData("right/../../x.csv")]
    public void A_pattern_that_leads_out_of_the_folder_stops_the_reading(string pattern)
    {
        _folder.WholeRun();
        _folder.Write("run.toml", $"[[state]]\nname = \"right\"\ncuts = [\"{pattern}\"]");
        Assert.Equal(("bad-pattern", 3), (Failure().Code, Failure().Place.Line));
    }

    [Fact]
    public void No_bytes_whatever_make_anything_but_a_run_or_a_located_error()
    {
        _folder.Sweep("good/s11.s1p");
        var good = File.ReadAllBytes(_folder.At("good/s11.s1p"));
        _folder.Cut("good/cut.csv", ["H", "V"], [0]);
        var cut = File.ReadAllBytes(_folder.At("good/cut.csv"));
        (from original in Gen.Bool.Select(first => first ? good : cut)
         from name in Gen.Int[0, 3].Select(at => new[] { "good/s11.s1p", "good/cut.csv", "x.txt", "run.toml" }[at])
         from at in Gen.Int[0, original.Length - 1]
         from junk in Gen.Byte.Array[0, 40]
         select (name, bytes: original[..at].Concat(junk).Concat(original[at..]).ToArray())).Sample(
            sample =>
            {
                using var folder = new ScratchFolder();
                folder.Sweep("other/s11.s1p");
                folder.Write(sample.name, sample.bytes);
                try
                {
                    MeasurementRunReader.Read(folder.Path);
                }
                catch (MeasurementDataException)
                {
                    return;
                }
            },
            seed: "000000000031",
            iter: 300);
    }

    private static bool CanBeRead(string path)
    {
        try
        {
            File.OpenRead(path).Dispose();
            return true;
        }
        catch (UnauthorizedAccessException)
        {
            return false;
        }
    }

    private MeasurementDataException Failure() => Assert.Throws<MeasurementDataException>(() => MeasurementRunReader.Read(_folder.Path));

    private void Fault(string path, int line)
    {
        var run = MeasurementRunReader.Read(_folder.Path);
        var fault = run.Remarks.Single(remark => remark.Severity == RemarkSeverity.Fault);
        Assert.Equal((path, line), (fault.Place?.File, fault.Place?.Line));
        Assert.NotEmpty(run.Sweeps);
        Assert.NotEmpty(run.Cuts);
        var input = run.Inputs.Single(each => string.Equals(each.Path, path, StringComparison.Ordinal));
        Assert.DoesNotContain(run.Sweeps, sweep => string.Equals(sweep.InputId, input.Id, StringComparison.Ordinal));
        Assert.DoesNotContain(run.Cuts, cut => cut.InputIds.Contains(input.Id, StringComparer.Ordinal));
    }
}
