using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using RangeReduce.Comparison;
using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes results.json, the table as other programs read it (format <c>rangereduce-results</c>, version 1).</summary>
/// <remarks>Rows come in the order of the table; keys that do not apply are absent; a value that is not finite is null with the reason beside it.</remarks>
public static class ResultsJsonWriter
{
    /// <summary>The word by which the format is known, at the head of the file.</summary>
    public const string Format = "rangereduce-results";

    // The file is read by people too: degree signs and Greek letters stay as they are. It is never pasted into HTML.
    private static readonly JsonWriterOptions Options = new() { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes the results.</summary>
    /// <param name="reduced">The reduced run.</param>
    /// <param name="stamp">Time and version.</param>
    /// <param name="target">Open stream; it is not closed.</param>
    public static void Write(ReducedRun reduced, ReportStamp stamp, Stream target)
    {
        ArgumentNullException.ThrowIfNull(reduced);
        ArgumentNullException.ThrowIfNull(stamp);
        using var json = new Utf8JsonWriter(target, Options);
        json.WriteStartObject();
        json.WriteString("format", Format);
        json.WriteNumber("version", 1);
        WriteStamp(json, stamp);
        WriteRun(json, reduced.Run);
        WriteInputs(json, reduced.Run);
        WriteStates(json, reduced.Run);
        json.WriteStartArray("corrections");
        foreach (var correction in reduced.Run.Corrections)
        {
            json.WriteStartObject();
            json.WriteString("name", correction.Name);
            json.WriteString("text", correction.Text);
            WriteStrings(json, "inputs", correction.Inputs);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("figures");
        foreach (var figure in reduced.Table.Figures)
        {
            FigureJson.Write(json, figure);
        }

        json.WriteEndArray();
        WriteRequirements(json, reduced.Requirements);
        WriteRemarks(json, reduced);
        json.WriteEndObject();
        json.Flush();
        target.WriteByte((byte)'\n');
    }

    private static void WriteStamp(Utf8JsonWriter json, ReportStamp stamp)
    {
        json.WriteStartObject("made");
        json.WriteString("at", stamp.At.ToUniversalTime().ToString("yyyy-MM-dd'T'HH:mm:ss'Z'", CultureInfo.InvariantCulture));
        json.WriteString("by", $"rangereduce {stamp.Version}");
        if (double.IsFinite(stamp.Seconds))
        {
            json.WriteNumber("seconds", Math.Round(stamp.Seconds, 3));
        }

        json.WriteEndObject();
    }

    private static void WriteRun(Utf8JsonWriter json, MeasurementRun run)
    {
        json.WriteStartObject("run");
        json.WriteString("name", run.Information.Name);
        WriteIfGiven(json, "date", run.Information.Date);
        json.WriteString("folder", run.Information.Folder);
        WriteIfGiven(json, "operator", run.Information.Operator);
        WriteIfGiven(json, "chamber", run.Information.Chamber);
        WriteIfGiven(json, "notes", run.Information.Notes);
        json.WriteEndObject();

        var conventions = run.Conventions;
        json.WriteStartObject("conventions");
        json.WriteString("time", conventions.Time == TimeFactor.PlusJ ? "exp(+jwt)" : "exp(-iwt)");
        json.WriteString("timeFrom", conventions.TimeFrom);
        json.WriteString("hand", "IEEE, along propagation");
        json.WriteString("thetaPort", conventions.ThetaPort);
        json.WriteString("phiPort", conventions.PhiPort);
        json.WriteString("portsFrom", conventions.PortsFrom);
        json.WriteNumber("axisDeg", run.AxisDeg);
        json.WriteEndObject();
    }

    private static void WriteInputs(Utf8JsonWriter json, MeasurementRun run)
    {
        json.WriteStartArray("inputs");
        foreach (var input in run.Inputs)
        {
            json.WriteStartObject();
            json.WriteString("id", input.Id);
            json.WriteString("path", input.Path);
            json.WriteString("sha256", input.Sha256);
            json.WriteNumber("bytes", input.Bytes);
            json.WriteString("kind", KindWord(input.Kind));
            WriteIfGiven(json, "state", input.State);
            WriteIfGiven(json, "source", input.Source?.Word());
            WriteIfGiven(json, "reason", input.Reason);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static string KindWord(InputKind kind) => kind switch
    {
        InputKind.Manifest => "manifest",
        InputKind.Sweep => "sweep",
        InputKind.Cut => "cut",
        InputKind.GainTable => "gain-table",
        InputKind.GainStandardCut => "gain-standard-cut",
        _ => "other",
    };

    private static void WriteStates(Utf8JsonWriter json, MeasurementRun run)
    {
        json.WriteStartArray("states");
        foreach (var state in run.States)
        {
            json.WriteStartObject();
            json.WriteString("name", state.Name);
            WriteIfGiven(json, "intendedHand", state.IntendedHand?.Word());
            WriteIfGiven(json, "knownHand", state.KnownHand?.Word());
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteRequirements(Utf8JsonWriter json, IReadOnlyList<RequirementOutcome> outcomes)
    {
        json.WriteStartArray("requirements");
        foreach (var outcome in outcomes)
        {
            json.WriteStartObject();
            json.WriteString("id", outcome.Requirement.Id);
            json.WriteString("text", outcome.Text);
            json.WriteString("outcome", outcome.Verdict switch
            {
                RequirementVerdict.Met => "met",
                RequirementVerdict.NotMet => "not met",
                _ => "undecided",
            });
            WriteStrings(json, "figures", outcome.FigureIds);
            if (double.IsFinite(outcome.Margin))
            {
                json.WriteNumber("margin", outcome.Margin);
            }

            if (double.IsFinite(outcome.Worst))
            {
                json.WriteNumber("worst", outcome.Worst);
            }

            WriteIfGiven(json, "reason", outcome.Reason);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteRemarks(Utf8JsonWriter json, ReducedRun reduced)
    {
        var idOf = reduced.Run.Inputs.GroupBy(input => input.Path, StringComparer.Ordinal).ToDictionary(group => group.Key, group => group.First().Id, StringComparer.Ordinal);
        json.WriteStartArray("remarks");
        foreach (var remark in reduced.Remarks)
        {
            json.WriteStartObject();
            json.WriteString("severity", remark.Severity switch
            {
                RemarkSeverity.Fault => "fault",
                RemarkSeverity.Doubt => "doubt",
                _ => "note",
            });
            json.WriteString("code", remark.Code);
            json.WriteString("text", remark.Text);
            WriteIfGiven(json, "state", remark.State);
            if (remark.Place is { } place)
            {
                WriteIfGiven(json, "input", idOf.GetValueOrDefault(place.File));
                json.WriteString("file", place.File);
                if (place.Line > 0)
                {
                    json.WriteNumber("line", place.Line);
                }

                if (place.Column > 0)
                {
                    json.WriteNumber("column", place.Column);
                }
            }

            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteIfGiven(Utf8JsonWriter json, string key, string? value)
    {
        if (!string.IsNullOrEmpty(value))
        {
            json.WriteString(key, value);
        }
    }

    private static void WriteStrings(Utf8JsonWriter json, string key, IReadOnlyList<string> values)
    {
        json.WriteStartArray(key);
        foreach (var value in values)
        {
            json.WriteStringValue(value);
        }

        json.WriteEndArray();
    }
}
