using System.Text.Json;
using RangeReduce.Runs;

namespace RangeReduce.Cli;

/// <summary>Looks at a report that stands where a new one is to go.</summary>
internal static class EarlierReport
{
    /// <summary>Tells whether the report was made of the very same files: then it may be made again without asking, since nothing is lost.</summary>
    public static bool IsOfSameData(string folder, MeasurementRun run)
    {
        var results = Path.Combine(folder, "results.json");
        if (!File.Exists(results))
        {
            return false;
        }

        try
        {
            using var document = JsonDocument.Parse(File.ReadAllBytes(results));
            return document.RootElement.TryGetProperty("inputs", out var inputs)
                && inputs.EnumerateArray().Select(input => (Text(input, "path"), Text(input, "sha256"))).SequenceEqual(run.Inputs.Select(input => ((string?)input.Path, (string?)input.Sha256)));
        }
        catch (Exception error) when (error is JsonException or InvalidOperationException)
        {
            // Damaged or foreign: not ours to replace unasked.
            return false;
        }
    }

    private static string? Text(JsonElement element, string key) => element.TryGetProperty(key, out var value) ? value.GetString() : null;
}
