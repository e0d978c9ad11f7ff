using System.CommandLine;
using RangeReduce.Comparison;
using RangeReduce.Reporting.Results;
using RangeReduce.Runs;

namespace RangeReduce.Cli;

/// <summary><c>rangereduce compare RUN RUN...</c>: figures of several runs side by side, with their differences from the first.</summary>
internal static class CompareCommand
{
    /// <summary>Makes the command.</summary>
    public static Command Create(Terminal terminal, CancellationToken cancellationToken)
    {
        var runs = new Argument<string[]>("RUN") { Description = "Report folders (with results.json) or measurement folders, two or more; differences are taken from the first.", Arity = new(2, 100) };
        var all = new Option<bool>("--all") { Description = "Every figure, not only the match and the axis." };
        var csv = new Option<string?>("--csv") { Description = "Write the table to a file as well.", HelpName = "FILE" };
        var force = new Option<bool>("--force") { Description = "Replace the file of --csv." };
        var command = new Command("compare", "Lay the figures of several runs side by side: the same antenna tested again, two units of one design, before and after a test.") { runs, all, csv, force };
        command.SetAction(parsed => Run(
            parsed.GetRequiredValue(runs),
            parsed.GetValue(all),
            parsed.GetValue(csv),
            parsed.GetValue(force),
            parsed.GetValue(CommonOptions.Json),
            parsed.GetValue(CommonOptions.Quiet),
            terminal,
            cancellationToken));
        return command;
    }

    private static int Run(string[] paths, bool all, string? csv, bool force, bool json, bool quiet, Terminal terminal, CancellationToken cancellationToken)
    {
        if (csv is not null && File.Exists(csv) && !force)
        {
            throw new IOException($"{csv} exists. Give --force to replace it.");
        }

        var runs = ProgressLine.Show(terminal, quiet, report => paths.Select((path, at) =>
        {
            report($"reading {path}", (double)at / paths.Length);
            return Load(path, cancellationToken);
        }).ToArray());
        var rows = RunComparison.Compare(runs);
        var shown = all ? rows : [.. RunComparison.Headlines(rows)];
        if (csv is not null)
        {
            using var file = new FileStream(csv, FileMode.Create);
            ComparisonCsvWriter.Write(runs, shown, file);
        }

        if (json)
        {
            using var output = new MemoryStream();
            ComparisonJsonWriter.Write(runs, shown, output);
            terminal.Output.Write(System.Text.Encoding.UTF8.GetString(output.ToArray()));
        }
        else
        {
            ComparisonPrinter.Print(terminal.Output, runs, shown);
        }

        return ExitCode.Done;
    }

    private static ComparedRun Load(string path, CancellationToken cancellationToken)
    {
        var results = Path.Combine(path, "results.json");
        if (File.Exists(results))
        {
            return ResultsJsonReader.Read(results);
        }

        var reduced = RunReduction.Reduce(MeasurementRunReader.Read(path, cancellationToken: cancellationToken), cancellationToken: cancellationToken);
        return new(reduced.Run.Information.Name, reduced.Run.Information.Date, reduced.Table.Figures);
    }
}
