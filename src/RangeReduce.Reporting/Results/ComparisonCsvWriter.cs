using System.Globalization;
using RangeReduce.Comparison;
using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes runs side by side as comma-separated text, one row a figure.</summary>
public static class ComparisonCsvWriter
{
    /// <summary>Writes the rows.</summary>
    public static void Write(IReadOnlyList<ComparedRun> runs, IReadOnlyList<ComparedFigure> rows, Stream target)
    {
        ArgumentNullException.ThrowIfNull(runs);
        ArgumentNullException.ThrowIfNull(rows);
        using var writer = CsvText.Open(target);
        foreach (var head in new[] { "quantity", "unit", "state", "other state", "frequency (Hz)", "phi (deg)", "theta (deg)", "at", "component", "threshold", "rank" })
        {
            writer.WriteField(head);
        }

        for (var i = 0; i < runs.Count; i++)
        {
            writer.WriteField($"{runs[i].Name} value");
            writer.WriteField($"{runs[i].Name} expanded uncertainty");
            if (i > 0)
            {
                writer.WriteField($"{runs[i].Name} difference");
                writer.WriteField($"{runs[i].Name} expanded uncertainty of the difference");
            }
        }

        writer.EndRecord();
        foreach (var row in rows)
        {
            var key = row.Key;
            foreach (var cell in new[] { key.Quantity, row.Figures.OfType<Figure>().First().Unit, key.State, key.OtherState, Number(key.FrequencyHz), Number(key.PhiDeg), Number(key.ThetaDeg), key.At.Word(), key.Component.Word(), Number(key.Threshold), Number(key.Rank) })
            {
                writer.WriteField(cell);
            }

            for (var i = 0; i < runs.Count; i++)
            {
                writer.WriteField(row.Figures[i]?.Hand?.Word() ?? Number(row.Figures[i]?.Value));
                writer.WriteField(Number(row.Figures[i]?.Uncertainty.Expanded));
                if (i > 0)
                {
                    writer.WriteField(Number(row.Differences[i]));
                    writer.WriteField(Number(row.Expanded[i]));
                }
            }

            writer.EndRecord();
        }
    }

    private static string? Number(double? value) => value is { } number && double.IsFinite(number) ? number.ToString("R", CultureInfo.InvariantCulture) : null;
}
