using System.Text.Json.Nodes;

namespace RangeReduce.Cli.Tests;

public sealed class CompareCommandTests
{
    private static readonly string Spring = Path.Combine(CommandHarness.Root, "sampledata", "spring-build");
    private static readonly string Autumn = Path.Combine(CommandHarness.Root, "sampledata", "autumn-retest");

    [Fact]
    public void A_winter_outdoors_shows_as_a_lower_resonance_and_less_gain()
    {
        var run = CommandHarness.Run("compare", Spring, Autumn, "--json");
        Assert.Equal(ExitCode.Done, run.Code);
        var rows = JsonNode.Parse(run.Output)!["rows"]!.AsArray();

        // By the README of the sample data the resonance is 0.6 % lower and the gain 0.4 to 0.5 dB less.
        var resonance = Row("resonance-frequency", "right", null);
        Assert.Equal(-0.006, (double)resonance["differences"]![1]! / (double)resonance["figures"]![0]!["value"]!, 0.001);
        var gain = Row("gain", "right", "right");
        Assert.Equal(-0.49, (double)gain["differences"]![1]!, 0.15);
        Assert.True((double)gain["expanded"]![1]! > 0.0);

        JsonNode Row(string quantity, string state, string? component) => rows.First(row =>
            row!["figures"]![0] is { } figure && string.Join(" ", figure["quantity"], figure["state"], figure["component"]).Trim() is { } words && words.Equals($"{quantity} {state} {component}".Trim(), StringComparison.Ordinal))!;
    }

    [Fact]
    public void A_report_folder_says_the_same_as_its_measurement_folder()
    {
        using var scratch = new ScratchFolder();
        CommandHarness.Run("reduce", Spring, "--out", scratch.Of("spring"), "--quiet");
        var run = CommandHarness.Run("compare", scratch.Of("spring"), Spring, "--all", "--json");
        Assert.All(JsonNode.Parse(run.Output)!["rows"]!.AsArray(), row => Assert.True(row!["differences"]![1] is null || (double)row["differences"]![1]! == 0.0, row.ToJsonString()));
    }

    [Fact]
    public void One_table_is_printed_and_written_as_a_file_that_is_not_replaced()
    {
        using var scratch = new ScratchFolder();
        var run = CommandHarness.Run("compare", Spring, Autumn, "--csv", scratch.Of("both.csv"));
        Assert.Contains("resonance frequency", run.Output, StringComparison.Ordinal);
        Assert.Contains("2 - 1", run.Output, StringComparison.Ordinal);
        Assert.True(File.ReadAllLines(scratch.Of("both.csv")).Length > 10);
        Assert.Equal(ExitCode.Machine, CommandHarness.Run("compare", Spring, Autumn, "--csv", scratch.Of("both.csv")).Code);
    }

    [Fact]
    public void One_run_alone_is_a_wrong_command_line() => Assert.Equal(ExitCode.Usage, CommandHarness.Run("compare", Spring).Code);

    [Fact]
    public void A_results_file_that_is_damaged_is_placed()
    {
        using var scratch = new ScratchFolder();
        scratch.Write("broken/results.json", "{\n  \"format\": oops\n}");
        var run = CommandHarness.Run("compare", scratch.Of("broken"), Spring);
        Assert.Equal(ExitCode.Data, run.Code);
        Assert.Contains("results.json:2", run.Error, StringComparison.Ordinal);
    }
}
