using System.CommandLine;
using RangeReduce.Comparison;
using RangeReduce.Diagnostics;
using RangeReduce.Reporting;
using RangeReduce.Reporting.Results;
using RangeReduce.Runs;
using RangeReduce.Uncertainties;

namespace RangeReduce.Cli;

/// <summary><c>rangereduce reduce FOLDER</c>: the main job, folder in, report folder out.</summary>
internal static class ReduceCommand
{
    /// <summary>Makes the command.</summary>
    public static Command Create(Terminal terminal, TimeProvider clock, CancellationToken cancellationToken)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The measurement folder; its run.toml is used where there is one." };
        var output = new Option<string?>("--out") { Description = "Where the report folder goes; reports/<name of the folder> where not given.", HelpName = "DIR" };
        var force = new Option<bool>("--force") { Description = "Replace a report that stands there." };
        var trials = new Option<int>("--trials") { Description = "Monte Carlo trials for the uncertainties.", HelpName = "N", DefaultValueFactory = _ => UncertaintyEvaluator.UsualTrials };
        trials.Validators.Add(result =>
        {
            if (result.Tokens.Count == 1 && int.TryParse(result.Tokens[0].Value, System.Globalization.CultureInfo.InvariantCulture, out var given) && given is < 100 or > 1_000_000)
            {
                result.AddError("--trials takes a whole number from 100 to 1000000.");
            }
        });
        var paper = new Option<PaperSize>("--paper") { Description = "Paper of the PDF: A4 or Letter.", DefaultValueFactory = _ => PaperSize.A4 };
        var timings = new Option<bool>("--timings") { Description = "Say on standard error how long each step took." };
        var command = new Command("reduce", "Reduce a measurement folder to a report folder: report.pdf, report.html, results.json, figures.csv, traces, plots.") { folder, output, force, paper, trials, timings };
        command.SetAction(parsed => Run(
            new(parsed.GetRequiredValue(folder), parsed.GetValue(output), parsed.GetValue(force), parsed.GetValue(trials), parsed.GetValue(paper), parsed.GetValue(timings), parsed.GetValue(CommonOptions.Json), parsed.GetValue(CommonOptions.Quiet)),
            terminal,
            clock,
            cancellationToken));
        return command;
    }

    private static int Run(Request request, Terminal terminal, TimeProvider clock, CancellationToken cancellationToken)
    {
        var target = request.Output ?? Path.Combine("reports", Path.GetFileName(Path.TrimEndingDirectorySeparator(Path.GetFullPath(request.Folder))));

        // Before the work, not after it: a name that is taken by something else is said at once. A report may turn out to be of the very same data.
        OutputFolder.CheckPlace(target, overwrite: request.Force || File.Exists(Path.Combine(target, "results.json")));
        var watch = new StepWatch(clock);
        var reduced = ProgressLine.Show(terminal, request.Quiet, report =>
        {
            var run = watch.Time("reading", () => MeasurementRunReader.Read(request.Folder, new DirectProgress(share => report("reading", 0.4 * share)), cancellationToken));
            var overwrite = request.Force || EarlierReport.IsOfSameData(target, run);
            OutputFolder.CheckPlace(target, overwrite);
            var result = watch.Time("reducing", () => RunReduction.Reduce(run, new() { Trials = request.Trials }, new DirectProgress(share => report("reducing", 0.4 + (0.2 * share))), cancellationToken));
            report("writing", 0.7);
            var stamp = new ReportStamp(clock.GetUtcNow(), ToolVersion.Text, watch.TotalSeconds);
            watch.Time("writing", () => ReportFolderWriter.Write(result, stamp, request.Paper, target, overwrite, watch.Add, cancellationToken));
            return result;
        });

        if (!request.Quiet)
        {
            RemarkPrinter.Print(terminal, reduced.Remarks);
        }

        if (request.Timings)
        {
            terminal.Error.WriteLine(watch.ToString());
        }

        if (request.Json)
        {
            terminal.Output.Write(File.ReadAllText(Path.Combine(target, "results.json")));
        }
        else
        {
            SummaryPrinter.Print(terminal, reduced, target);
        }

        // A file that could not be used makes the run incomplete, whatever the requirements say.
        return reduced.Remarks.Any(remark => remark is { Severity: RemarkSeverity.Fault, Place: not null }) ? ExitCode.Data
            : reduced.Requirements.Any(outcome => outcome.Verdict == RequirementVerdict.NotMet) ? ExitCode.RequirementNotMet
            : ExitCode.Done;
    }

    private sealed record Request(string Folder, string? Output, bool Force, int Trials, PaperSize Paper, bool Timings, bool Json, bool Quiet);
}
