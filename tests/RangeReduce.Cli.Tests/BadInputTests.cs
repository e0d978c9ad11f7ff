namespace RangeReduce.Cli.Tests;

public sealed class BadInputTests
{
    private const string GoodSweep = "# GHz S RI R 50\n1.0 0.5 0\n1.1 0.3 0\n1.2 0.05 0\n1.3 0.3 0\n1.4 0.5 0\n";
    private const string GoodCut = "Frequency [GHz],Phi [deg],Theta [deg],H [dB],H [deg],V [dB],V [deg]\n1.2,0,-10,-40,0,-40,-90\n1.2,0,0,-39,0,-39,-90\n1.2,0,10,-40,0,-40,-90\n";

    [Fact]
    public void A_folder_that_is_not_there_is_said()
    {
        using var scratch = new ScratchFolder();
        var run = CommandHarness.Run("reduce", scratch.Of("nowhere"), "--out", scratch.Of("out"));
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains("nowhere", run.Error, StringComparison.Ordinal);
        Assert.False(Directory.Exists(scratch.Of("out")));
    }

    [Fact]
    public void An_empty_folder_is_said()
    {
        using var scratch = new ScratchFolder();
        Directory.CreateDirectory(scratch.Of("run"));
        var run = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains("found no file", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_folder_with_nothing_readable_is_said()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/notes.md", "# Notes\n");
        var run = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains("at least one sweep or cut", run.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("s11.s1p", "# GHz S RI R 50\n1.0 0.5 0\n1.1 0.4\n", "s11.s1p:3", "cut off")]
    [InlineData("s11.s1p", "# GHz S RI R 50\n1.0 0.5 0\n1.1 x 0\n", "s11.s1p:3:5", "'x'")]
    [InlineData("s11.s1p", "# GHz S RI R 50\n1.0 0.5 0\n1.1 nan 0\n", "s11.s1p:3:5", "'nan'")]
    [InlineData("cut.csv", "Frequency [GHz],Theta [deg],H [dB],H [deg],V [deg]\n1.2,0,-39,0,0\n1.2,5,-39,0,0\n", "cut.csv:1", "V")]
    [InlineData("cut.csv", "Frequency [GHz],Theta [deg],H [dB],H [deg]\n1.2,0,-39,0\n1.2,5,text,0\n", "cut.csv:3:7", "\"text\"")]
    public void A_faulty_file_is_placed_and_the_rest_is_reduced(string name, string text, string place, string found)
    {
        using var scratch = new ScratchFolder();
        scratch.Write($"run/bad/{name}", text);
        scratch.Write("run/good/s11.s1p", GoodSweep);
        scratch.Write("run/good/cut.csv", GoodCut);
        var run = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"), "--trials", "100");
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains(place, run.Error, StringComparison.Ordinal);
        Assert.Contains(found, run.Error, StringComparison.Ordinal);
        Assert.Contains("\"state\": \"good\"", File.ReadAllText(scratch.Of("out", "results.json")), StringComparison.Ordinal);
        Assert.True(File.Exists(scratch.Of("out", "report.pdf")));
    }

    [Fact]
    public void Two_gigabytes_of_zeros_are_refused_without_being_read()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/s11.s1p", GoodSweep);
        using (var zeros = File.Create(scratch.Write("run/zeros/s11.s1p", string.Empty)))
        {
            zeros.SetLength(2L << 30);
        }

        var run = CommandHarness.Run("check", scratch.Of("run"));
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains("zeros/s11.s1p", run.Output, StringComparison.Ordinal);
        Assert.Contains("zero bytes", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_loop_of_links_ends()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/s11.s1p", GoodSweep);
        Directory.CreateSymbolicLink(scratch.Of("run", "good", "again"), scratch.Of("run"));
        var run = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.True(File.Exists(scratch.Of("out", "results.json")), run.Error);
    }

    [Fact]
    public void Two_sweeps_of_one_state_are_remarked_and_the_first_is_used()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/a.s1p", GoodSweep);
        scratch.Write("run/good/b.s1p", GoodSweep.Replace("0.05", "0.06", StringComparison.Ordinal));
        var run = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.Contains("good/b.s1p", run.Error, StringComparison.Ordinal);
        Assert.True(File.Exists(scratch.Of("out", "results.json")));
    }

    [Fact]
    public void An_unknown_key_of_the_manifest_names_the_nearest_known_one()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/s11.s1p", GoodSweep);
        scratch.Write("run/run.toml", "[run]\nnaem = \"x\"\n");
        var run = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains("run.toml:2:1", run.Error, StringComparison.Ordinal);
        Assert.Contains("name", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Output_that_stands_there_is_replaced_only_when_asked()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/s11.s1p", GoodSweep);
        Assert.Equal(ExitCode.Done, CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out")).Code);

        // A report of the very same files says the same: it is made again without asking.
        Assert.Equal(ExitCode.Done, CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out")).Code);
        scratch.Write("run/good/s11.s1p", GoodSweep.Replace("0.05", "0.06", StringComparison.Ordinal));
        var second = CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.Equal(ExitCode.Machine, second.Code);
        Assert.Contains("--force", second.Error, StringComparison.Ordinal);
        Assert.Equal(ExitCode.Done, CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"), "--force").Code);
    }

    [Fact]
    public void A_folder_that_is_no_report_is_never_replaced()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/s11.s1p", GoodSweep);
        scratch.Write("out/precious.txt", "mine");
        Assert.Equal(ExitCode.Machine, CommandHarness.Run("reduce", scratch.Of("run"), "--out", scratch.Of("out"), "--force").Code);
        Assert.Equal("mine", File.ReadAllText(scratch.Of("out", "precious.txt")));
    }

    [Fact]
    public void An_interrupted_run_leaves_nothing_behind()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("run/good/s11.s1p", GoodSweep);
        using var stopped = new CancellationTokenSource();
        stopped.Cancel();
        var run = CommandHarness.Run(stopped.Token, "reduce", scratch.Of("run"), "--out", scratch.Of("out"));
        Assert.Equal(ExitCode.Interrupted, run.Code);
        Assert.Equal("run", Path.GetFileName(Assert.Single(Directory.EnumerateFileSystemEntries(scratch.Path))));
    }
}
