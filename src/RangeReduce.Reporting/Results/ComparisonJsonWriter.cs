using System.Text.Encodings.Web;
using System.Text.Json;
using RangeReduce.Comparison;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes runs side by side as JSON (format <c>rangereduce-comparison</c>, version 1): each row holds the figure of each run and the differences from the first.</summary>
public static class ComparisonJsonWriter
{
    private static readonly JsonWriterOptions Options = new() { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes the rows.</summary>
    public static void Write(IReadOnlyList<ComparedRun> runs, IReadOnlyList<ComparedFigure> rows, Stream target)
    {
        ArgumentNullException.ThrowIfNull(runs);
        ArgumentNullException.ThrowIfNull(rows);
        using var json = new Utf8JsonWriter(target, Options);
        json.WriteStartObject();
        json.WriteString("format", "rangereduce-comparison");
        json.WriteNumber("version", 1);
        json.WriteStartArray("runs");
        foreach (var run in runs)
        {
            json.WriteStartObject();
            json.WriteString("name", run.Name);
            if (run.Date is not null)
            {
                json.WriteString("date", run.Date);
            }

            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("rows");
        foreach (var row in rows)
        {
            json.WriteStartObject();
            json.WriteStartArray("figures");
            foreach (var figure in row.Figures)
            {
                if (figure is null)
                {
                    json.WriteNullValue();
                }
                else
                {
                    FigureJson.Write(json, figure);
                }
            }

            json.WriteEndArray();
            WriteNumbers(json, "differences", row.Differences);
            WriteNumbers(json, "expanded", row.Expanded);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
        json.Flush();
        target.WriteByte((byte)'\n');
    }

    private static void WriteNumbers(Utf8JsonWriter json, string key, IReadOnlyList<double> values)
    {
        json.WriteStartArray(key);
        foreach (var value in values)
        {
            if (double.IsFinite(value))
            {
                json.WriteNumberValue(value);
            }
            else
            {
                json.WriteNullValue();
            }
        }

        json.WriteEndArray();
    }
}
