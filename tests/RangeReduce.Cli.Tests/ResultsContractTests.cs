using System.Text.Json;
using System.Text.Json.Nodes;
using Json.Schema;

namespace RangeReduce.Cli.Tests;

/// <summary>Holds real output against the schema that other programs rely on (JSON Schema, draft 2020-12).</summary>
public sealed class ResultsContractTests
{
    private static readonly JsonSchema Schema = JsonSchema.FromText(File.ReadAllText(Path.Combine(CommandHarness.Root, "docs", "results.schema.json")));

    [Theory]
    [InlineData("spring-build")]
    [InlineData("autumn-retest")]
    public void The_results_of_a_sample_run_obey_the_schema(string name)
    {
        using var scratch = new ScratchFolder();
        CommandHarness.Run("reduce", Path.Combine(CommandHarness.Root, "sampledata", name), "--out", scratch.Of("out"), "--trials", "100", "--quiet");
        var results = JsonNode.Parse(File.ReadAllText(scratch.Of("out", "results.json")))!;
        KeepOneFigureOfEachShape(results);
        var outcome = Schema.Evaluate(JsonDocument.Parse(results.ToJsonString()).RootElement, new EvaluationOptions { OutputFormat = OutputFormat.List });
        Assert.True(outcome.IsValid, string.Join("; ", Reasons(outcome).Take(8)));
    }

    [Fact]
    public void A_key_that_the_schema_does_not_know_and_a_null_without_a_reason_are_refused()
    {
        using var scratch = new ScratchFolder();
        CommandHarness.Run("reduce", Path.Combine(CommandHarness.Root, "sampledata", "spring-build"), "--out", scratch.Of("out"), "--trials", "100", "--quiet");
        var results = JsonNode.Parse(File.ReadAllText(scratch.Of("out", "results.json")))!;
        KeepOneFigureOfEachShape(results);
        Assert.True(IsValid(results));
        results["surprise"] = true;
        Assert.False(IsValid(results));
        results.AsObject().Remove("surprise");
        var figure = results["figures"]!.AsArray().First(figure => figure!["why"] is null)!;
        figure["value"] = null;
        Assert.False(IsValid(results));
    }

    private static bool IsValid(JsonNode results) => Schema.Evaluate(JsonDocument.Parse(results.ToJsonString()).RootElement).IsValid;

    // Thousands of figures have a few dozen shapes; the validator takes milliseconds for each.
    private static void KeepOneFigureOfEachShape(JsonNode results)
    {
        var kept = results["figures"]!.AsArray().DistinctBy(Shape, StringComparer.Ordinal).Select(figure => figure!.DeepClone()).ToArray();
        Assert.True(kept.Length > 30);
        results["figures"] = new JsonArray(kept);

        static string Shape(JsonNode? figure) => string.Join(' ', figure!.AsObject().Select(pair => pair.Key is "quantity" or "unit" or "at" or "component" or "open" ? $"{pair.Key}={pair.Value}" : $"{pair.Key}:{pair.Value?.GetValueKind()}"));
    }

    // What fails under an "if" is a question, not an error.
    private static IEnumerable<string> Reasons(EvaluationResults outcome) => (outcome.Details ?? [])
        .Where(detail => detail.Errors is { Count: > 0 } && !detail.EvaluationPath.ToString().Contains("/if", StringComparison.Ordinal))
        .Select(detail => $"{detail.InstanceLocation}: {string.Join(", ", detail.Errors!.Values)}");

    [Fact]
    public void Every_input_that_a_figure_names_is_listed()
    {
        using var scratch = new ScratchFolder();
        CommandHarness.Run("reduce", Path.Combine(CommandHarness.Root, "sampledata", "spring-build"), "--out", scratch.Of("out"), "--trials", "100", "--quiet");
        var results = JsonNode.Parse(File.ReadAllText(scratch.Of("out", "results.json")))!;
        var known = results["inputs"]!.AsArray().Select(input => (string)input!["id"]!).ToHashSet(StringComparer.Ordinal);
        var figures = results["figures"]!.AsArray();
        Assert.All(figures, figure => Assert.All(figure!["inputs"]!.AsArray(), input => Assert.Contains((string)input!, known)));
        Assert.Equal(figures.Count, figures.Select(figure => (string)figure!["id"]!).Distinct(StringComparer.Ordinal).Count());
    }
}
