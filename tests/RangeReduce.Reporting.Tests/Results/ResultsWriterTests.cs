using System.Globalization;
using System.Text;
using System.Text.Json;
using System.Text.Json.Nodes;
using Json.Schema;
using RangeReduce.Quantities;
using RangeReduce.Reporting.Results;

namespace RangeReduce.Reporting.Tests.Results;

public sealed class ResultsWriterTests
{
    private static readonly ReportStamp Stamp = new(new DateTimeOffset(2026, 1, 31, 12, 0, 0, TimeSpan.FromHours(2.0)), "0.1.0", 1.23456);

    [Fact]
    public void Results_with_every_kind_of_figure_obey_the_schema()
    {
        // JSON Schema, draft 2020-12. One figure of each quantity: the validator takes milliseconds for each.
        var reduced = WithOddFigures();
        var table = new FigureTable();
        foreach (var figure in reduced.Table.Figures.DistinctBy(figure => (figure.Quantity, figure.Component, figure.At, figure.Why, figure.Open, figure.Uncertainty.Budget)))
        {
            table.Add(figure);
        }

        var schema = JsonSchema.FromText(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Data", "results.schema.json")));
        using var results = JsonDocument.Parse(Written(reduced with { Table = table }, Stamp));
        var outcome = schema.Evaluate(results.RootElement, new EvaluationOptions { OutputFormat = OutputFormat.List });
        Assert.True(outcome.IsValid, string.Join("; ", (outcome.Details ?? []).Where(detail => detail.Errors is not null).Take(5).Select(detail => $"{detail.InstanceLocation}: {string.Join(", ", detail.Errors!.Values)}")));
    }

    [Fact]
    public void A_value_that_is_not_finite_is_null_with_the_reason_and_a_hand_is_its_word()
    {
        var results = JsonNode.Parse(Written(WithOddFigures(), Stamp))!;
        var figures = results["figures"]!.AsArray();
        var matched = figures.Single(figure => (string?)figure!["why"] is "the match is perfect to the last digit")!;
        Assert.Null(matched["value"]);
        Assert.Equal("return-loss", (string?)matched["quantity"]);
        Assert.All(figures.Where(figure => (string?)figure!["quantity"] is "hand"), figure => Assert.Contains((string)figure!["value"]!, new[] { "right", "left", "linear" }, StringComparer.Ordinal));
        Assert.All(figures, figure => Assert.DoesNotContain(figure!.AsObject(), pair => pair.Key is not "value" && pair.Value is null));
    }

    [Fact]
    public void Two_writings_differ_only_in_made()
    {
        var first = Written(WithOddFigures(), Stamp);
        Assert.Equal(first, Written(WithOddFigures(), Stamp));
        var (one, other) = (JsonNode.Parse(first)!.AsObject(), JsonNode.Parse(Written(WithOddFigures(), Stamp with { At = Stamp.At.AddYears(1), Seconds = 9.0 }))!.AsObject());
        Assert.False(JsonNode.DeepEquals(one, other));
        Assert.Equal("2026-01-31T10:00:00Z", (string?)one["made"]!["at"]);
        Assert.Equal("rangereduce 0.1.0", (string?)one["made"]!["by"]);
        one.Remove("made");
        other.Remove("made");
        Assert.True(JsonNode.DeepEquals(one, other));
    }

    [Fact]
    public void Figures_csv_has_one_row_a_figure_whatever_the_culture_of_the_machine()
    {
        var reduced = WithOddFigures();
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            using var stream = new MemoryStream();
            FiguresCsvWriter.Write(reduced.Table, stream);
            var lines = Encoding.UTF8.GetString(stream.ToArray()).TrimEnd('\n').Split('\n');
            Assert.Equal(reduced.Table.Figures.Count + 1, lines.Length);
            var columns = lines[0].Split(',').Length;
            Assert.All(lines.Where(line => !line.Contains('"', StringComparison.Ordinal)), line => Assert.Equal(columns, line.Split(',').Length));
            Assert.Equal(Enumerable.Range(1, reduced.Table.Figures.Count).Select(number => $"f{number}"), lines.Skip(1).Select(line => line.Split(',')[0]), StringComparer.Ordinal);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void No_trace_is_lost_between_files_whose_names_would_be_alike()
    {
        using var scratch = new ScratchFolder();
        var table = new FigureTable();
        Trace Along(string state, double? phiDeg, double[] x) => new() { Quantity = QuantityCatalogue.Level, Axis = TraceAxis.Angle, X = x, Y = Array.ConvertAll(x, _ => -1.0), State = state, Source = DataSource.Measured, FrequencyHz = 1e9, PhiDeg = phiDeg };
        table.Add(Along("a b", 0.0, [0.0, 1.0]));
        table.Add(Along("a-b", 0.0, [0.0, 1.0, 2.0]));
        table.Add(Along("a b", null, [0.0, 1.0, 2.0, 3.0]));
        table.Add(Along("A B", 0.0, [0.0, 1.0, 2.0, 3.0, 4.0]));
        table.Add(Along("c", 0.0, [0.0, 1.0]));
        table.Add(Along("c", 0.0, [0.0, 1.0, 2.0]) with { Quantity = QuantityCatalogue.AxialRatio });
        Directory.CreateDirectory(scratch.Of("traces"));
        var files = TraceCsvWriter.Write(table, scratch.Of("traces"));
        Assert.Equal(5, files.Count);
        Assert.Equal(5, files.Distinct(StringComparer.OrdinalIgnoreCase).Count());
        var rows = files.Sum(file => File.ReadAllLines(Path.Combine(scratch.Of("traces"), file)).Length - 1);
        Assert.Equal(table.Traces.Sum(trace => trace.X.Length), rows);
    }

    private static ReducedRun WithOddFigures()
    {
        var reduced = SyntheticRun.Make();
        reduced.Table.Add(new Figure { Quantity = QuantityCatalogue.ReturnLoss, Value = double.PositiveInfinity, Why = "the match is perfect to the last digit", State = "right", Source = DataSource.Measured, FrequencyHz = 1.6e9, At = FigurePlace.Resonance, Rank = 1 });
        reduced.Table.Add(new Figure { Quantity = QuantityCatalogue.MatchBand, Value = 21e6, Open = "high", LowHz = 1.6e9, HighHz = 1.621e9, Threshold = 10.0, Rank = 1, State = "right", Source = DataSource.Measured });
        reduced.Table.Add(new Figure { Quantity = QuantityCatalogue.Hand, Hand = Hand.Linear, State = "stowed", Source = DataSource.Measured, FrequencyHz = 1.6e9, At = FigurePlace.Axis });
        return reduced;
    }

    private static string Written(ReducedRun reduced, ReportStamp stamp)
    {
        using var stream = new MemoryStream();
        ResultsJsonWriter.Write(reduced, stamp, stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
