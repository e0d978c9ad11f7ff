using System.Text.Json;
using RangeReduce.Comparison;
using RangeReduce.Diagnostics;
using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Results;

/// <summary>Reads the figures of a results.json back, so that a report can be compared and explained years later.</summary>
public static class ResultsJsonReader
{
    /// <summary>Reads a file.</summary>
    /// <param name="path">Path of the results.json.</param>
    /// <exception cref="MeasurementDataException">The file is not JSON, not of our format, or of a version that is not known.</exception>
    /// <exception cref="IOException">The file cannot be read.</exception>
    public static ComparedRun Read(string path)
    {
        using var document = Parse(path);
        var root = document.RootElement;
        if (Text(root, "format") is not "rangereduce-results" || !root.TryGetProperty("version", out var version) || version.ValueKind != JsonValueKind.Number || version.GetInt32() != 1)
        {
            throw new MeasurementDataException(new(path), "not-results", "a JSON document of another format or version", "rangereduce-results, version 1", "Name a report folder, or make the report again.");
        }

        var run = root.GetProperty("run");
        return new(Text(run, "name") ?? path, Text(run, "date"), [.. root.GetProperty("figures").EnumerateArray().Select(Figure).OfType<Figure>()]);
    }

    private static JsonDocument Parse(string path)
    {
        try
        {
            return JsonDocument.Parse(File.ReadAllBytes(path));
        }
        catch (JsonException error)
        {
            throw new MeasurementDataException(new(path, (int)(error.LineNumber ?? 0) + 1, (int)(error.BytePositionInLine ?? 0) + 1), "not-json", "text that is not JSON", "a results.json", "Make the report again.");
        }
    }

    // A quantity that this version does not know is left out: results of a newer version can still be compared in what both know.
    private static Figure? Figure(JsonElement element) => QuantityCatalogue.TryGet(Text(element, "quantity") ?? string.Empty, out var quantity)
        ? new()
        {
            Id = Text(element, "id") ?? string.Empty,
            Quantity = quantity,
            Value = element.GetProperty("value") is { ValueKind: JsonValueKind.Number } value ? value.GetDouble() : double.NaN,
            Hand = element.GetProperty("value") is { ValueKind: JsonValueKind.String } hand ? Enum.Parse<Hand>(hand.GetString()!, ignoreCase: true) : null,
            Why = Text(element, "why"),
            State = Text(element, "state"),
            OtherState = Text(element, "otherState"),
            Source = Word<DataSource>(element, "source"),
            FrequencyHz = Number(element, "frequencyHz"),
            LowHz = Number(element, "lowHz"),
            HighHz = Number(element, "highHz"),
            PhiDeg = Number(element, "phiDeg"),
            ThetaDeg = Number(element, "thetaDeg"),
            DirectionDeg = Number(element, "directionDeg"),
            At = Word<FigurePlace>(element, "at") ?? FigurePlace.None,
            Component = Word<FieldComponent>(element, "component") ?? FieldComponent.None,
            Threshold = Number(element, "threshold"),
            Rank = Number(element, "rank") is { } rank ? (int)rank : null,
            Open = Text(element, "open"),
            Method = Text(element, "method"),
            Of = Text(element, "of"),
            Grade = Text(element, "grade"),
            Realized = Flag(element, "realized"),
            BackLobe = Flag(element, "backLobe"),
            Uncertainty = UncertaintyOf(element.GetProperty("uncertainty")),
            Origin = new([.. element.GetProperty("inputs").EnumerateArray().Select(input => input.GetString()!)], [], Text(element, "formula") ?? string.Empty),
        }
        : null;

    private static Uncertainty UncertaintyOf(JsonElement element) => new(Number(element, "expanded") ?? double.NaN, Number(element, "coverage") ?? double.NaN, Word<BudgetState>(element, "budget") ?? BudgetState.Absent)
    {
        Low = Number(element, "low"),
        High = Number(element, "high"),
        Standard = Number(element, "standard"),
    };

    private static string? Text(JsonElement element, string key) => element.TryGetProperty(key, out var value) && value.ValueKind == JsonValueKind.String ? value.GetString() : null;

    private static double? Number(JsonElement element, string key) => element.TryGetProperty(key, out var value) && value.ValueKind == JsonValueKind.Number ? value.GetDouble() : null;

    private static bool? Flag(JsonElement element, string key) => element.TryGetProperty(key, out var value) && value.ValueKind is JsonValueKind.True or JsonValueKind.False ? value.GetBoolean() : null;

    private static T? Word<T>(JsonElement element, string key)
        where T : struct, Enum => Text(element, key) is { } word && Enum.TryParse<T>(word, ignoreCase: true, out var value) ? value : null;
}
