using System.CommandLine;
using System.Text.Json;
using System.Text.Json.Serialization;
using RangeReduce.Diagnostics;
using RangeReduce.Runs;

namespace RangeReduce.Cli;

/// <summary><c>rangereduce check FOLDER</c>: says what was found and how it was understood; writes nothing but, when asked, the manifest.</summary>
internal static class CheckCommand
{
    private static readonly JsonSerializerOptions JsonOptions = new()
    {
        WriteIndented = true,
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        NumberHandling = JsonNumberHandling.AllowNamedFloatingPointLiterals,
        Encoder = System.Text.Encodings.Web.JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) },
    };

    /// <summary>Makes the command.</summary>
    public static Command Create(Terminal terminal, CancellationToken cancellationToken)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The measurement folder." };
        var draft = new Option<bool>("--draft") { Description = "Write the manifest that was understood to FOLDER/run.toml, ready to be corrected." };
        var force = new Option<bool>("--force") { Description = "With --draft: replace a run.toml that stands there." };
        var columns = new Option<bool>("--columns") { Description = "Print each table column by column." };
        var command = new Command("check", "Say what a measurement folder holds, how it was understood and what is wrong with it; write nothing.") { folder, draft, force, columns };
        command.SetAction(parsed => Run(
            parsed.GetRequiredValue(folder),
            parsed.GetValue(draft),
            parsed.GetValue(force),
            parsed.GetValue(columns),
            parsed.GetValue(CommonOptions.Json),
            parsed.GetValue(CommonOptions.Quiet),
            terminal,
            cancellationToken));
        return command;
    }

    private static int Run(string folder, bool draft, bool force, bool columns, bool json, bool quiet, Terminal terminal, CancellationToken cancellationToken)
    {
        var manifest = Path.Combine(folder, "run.toml");
        if (draft && !force && File.Exists(manifest))
        {
            throw new IOException($"{manifest} exists. Give --force to replace it.");
        }

        var description = ProgressLine.Show(terminal, quiet, report => RunCheck.Describe(folder, new DirectProgress(share => report("reading", share)), cancellationToken));
        if (json)
        {
            terminal.Output.WriteLine(JsonSerializer.Serialize(description, JsonOptions));
        }
        else
        {
            CheckPrinter.Print(terminal, description, columns);
        }

        if (draft)
        {
            WriteDraft(manifest, description.ManifestDraft);
            terminal.Error.WriteLine($"Wrote {manifest}. Correct what is wrong in it, then run reduce.");
        }

        return description.Remarks.Any(remark => remark.Severity == RemarkSeverity.Fault) ? ExitCode.Data : ExitCode.Done;
    }

    private static void WriteDraft(string manifest, string text)
    {
        // Whole or not at all, like everything that is written.
        var unfinished = $"{manifest}.unfinished-{Environment.ProcessId}";
        try
        {
            File.WriteAllText(unfinished, text);
            File.Move(unfinished, manifest, overwrite: true);
        }
        finally
        {
            File.Delete(unfinished);
        }
    }
}
