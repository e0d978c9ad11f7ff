using System.Text.Json.Nodes;

namespace RangeReduce.Cli.Tests;

public sealed class CommandLineTests
{
    private static readonly string Sample = Path.Combine(CommandHarness.Root, "sampledata", "spring-build");

    [Fact]
    public void The_version_is_printed_alone()
    {
        var run = CommandHarness.Run("--version");
        Assert.Equal(ExitCode.Done, run.Code);
        Assert.Matches(@"^\d+\.\d+\.\d+\s*$", run.Output);
    }

    [Fact]
    public void Help_calls_the_command_by_its_name()
    {
        var run = CommandHarness.Run("reduce", "--help");
        Assert.Equal(ExitCode.Done, run.Code);
        Assert.Contains("rangereduce reduce <FOLDER>", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("reduce")]
    [InlineData("reduec", "x")]
    [InlineData("reduce", "x", "--nope")]
    [InlineData("reduce", "x", "--trials", "5")]
    [InlineData("reduce", "x", "--trials", "many")]
    public void A_wrong_command_line_is_told_on_standard_error_with_code_2(params string[] args)
    {
        var run = CommandHarness.Run(args);
        Assert.Equal(ExitCode.Usage, run.Code);
        Assert.Empty(run.Output);
        Assert.Contains("--help", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Reduce_gives_the_report_folder_and_says_that_a_requirement_is_not_met()
    {
        using var scratch = new ScratchFolder();
        var run = CommandHarness.Run("reduce", Sample, "--out", scratch.Of("out"), "--trials", "100");
        Assert.Equal(ExitCode.RequirementNotMet, run.Code);
        Assert.Contains("NOT MET", run.Output, StringComparison.Ordinal);
        foreach (var name in new[] { "report.pdf", "report.html", "results.json", "figures.csv" })
        {
            Assert.True(new FileInfo(scratch.Of("out", name)).Length > 0, name);
        }

        Assert.NotEmpty(Directory.EnumerateFiles(scratch.Of("out", "traces"), "*.csv"));
        Assert.NotEmpty(Directory.EnumerateFiles(scratch.Of("out", "plots"), "*.png"));
    }

    [Fact]
    public void With_json_standard_output_is_the_results_and_nothing_else()
    {
        using var scratch = new ScratchFolder();
        var run = CommandHarness.Run("reduce", Sample, "--out", scratch.Of("out"), "--trials", "100", "--json", "--quiet");
        Assert.Equal("rangereduce-results", (string)JsonNode.Parse(run.Output)!["format"]!);
        Assert.Empty(run.Error);
    }

    [Fact]
    public void The_same_input_gives_the_same_bytes()
    {
        using var scratch = new ScratchFolder();
        CommandHarness.Run("reduce", Sample, "--out", scratch.Of("one"), "--trials", "100", "--quiet");
        CommandHarness.Run("reduce", Sample, "--out", scratch.Of("two"), "--trials", "100", "--quiet");
        foreach (var path in Directory.EnumerateFiles(scratch.Of("one"), "*", SearchOption.AllDirectories))
        {
            var name = Path.GetRelativePath(scratch.Of("one"), path);
            Assert.True(File.ReadAllBytes(path).AsSpan().SequenceEqual(File.ReadAllBytes(scratch.Of("two", name))), name);
        }
    }

    [Fact]
    public void Check_says_what_was_understood_and_writes_nothing()
    {
        var before = Directory.EnumerateFileSystemEntries(Sample).Count();
        var run = CommandHarness.Run("check", Sample, "--columns");
        Assert.Equal(ExitCode.Done, run.Code);
        Assert.Contains("right/cut_phi000.csv", run.Output, StringComparison.Ordinal);
        Assert.Contains("exp(+jwt) (run.toml)", run.Output, StringComparison.Ordinal);
        Assert.Contains("Columns of", run.Output, StringComparison.Ordinal);
        Assert.Equal(before, Directory.EnumerateFileSystemEntries(Sample).Count());
    }

    [Fact]
    public void A_drafted_manifest_gives_the_same_states_when_it_is_read_back()
    {
        using var scratch = new ScratchFolder();
        foreach (var path in Directory.EnumerateFiles(Sample, "*", SearchOption.AllDirectories).Where(path => Path.GetExtension(path) is ".csv" or ".s1p"))
        {
            scratch.Write(Path.Combine("run", Path.GetRelativePath(Sample, path)), File.ReadAllText(path));
        }

        Assert.Equal(ExitCode.Done, CommandHarness.Run("check", scratch.Of("run"), "--draft").Code);
        Assert.True(File.Exists(scratch.Of("run", "run.toml")));
        Assert.Equal(ExitCode.Machine, CommandHarness.Run("check", scratch.Of("run"), "--draft").Code);
        var states = JsonNode.Parse(CommandHarness.Run("check", scratch.Of("run"), "--json").Output)!["states"]!.AsArray().Select(state => (string)state!["state"]!["name"]!);
        Assert.Equal("left right stowed", string.Join(" ", states.Order(StringComparer.Ordinal)));
    }
}
