using RangeReduce.Comparison;

namespace RangeReduce.Cli;

/// <summary>Prints what a reduction found, in a few lines, on standard output.</summary>
internal static class SummaryPrinter
{
    /// <summary>Prints the outcome of the requirements and where the report is.</summary>
    public static void Print(Terminal terminal, ReducedRun reduced, string target)
    {
        foreach (var outcome in reduced.Requirements)
        {
            var verdict = outcome.Verdict switch
            {
                RequirementVerdict.Met => "met",
                RequirementVerdict.NotMet => "NOT MET",
                _ => "undecided",
            };
            terminal.Output.WriteLine($"{verdict,-9}  {outcome.Text} ({outcome.Reason})");
        }

        terminal.Output.WriteLine($"Report: {Path.Combine(target, "report.pdf")}");
    }
}
