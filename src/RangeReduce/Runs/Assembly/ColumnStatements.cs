using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Assembly;

/// <summary>Checks that what the manifest says about headings met a heading.</summary>
internal static class ColumnStatements
{
    /// <summary>Remarks on every statement about a heading that no table of the run has.</summary>
    public static void Check(RunManifest? manifest, IEnumerable<FileReading> readings, List<Remark> remarks)
    {
        var stated = manifest?.Columns ?? [];
        if (stated.Count == 0)
        {
            return;
        }

        var headings = readings.SelectMany(reading => reading.Content?.Columns ?? []).Select(column => column.Heading).Distinct(StringComparer.OrdinalIgnoreCase).ToArray();
        foreach (var column in stated.Where(column => !headings.Contains(column.Heading, StringComparer.OrdinalIgnoreCase) && !IsNumber(column.Heading)))
        {
            var nearest = headings.Length == 0 ? string.Empty : $" The nearest heading is {FoundText.Show(NearestName.Of(column.Heading, headings))}.";
            remarks.Add(new(RemarkSeverity.Doubt, "column-not-found", $"No table that could be read has the heading {FoundText.Show(column.Heading)}.{nearest}", column.Place));
        }
    }

    // Tables without headings are told about by the number of the column.
    private static bool IsNumber(string heading) => int.TryParse(heading, NumberStyles.None, CultureInfo.InvariantCulture, out _);
}
