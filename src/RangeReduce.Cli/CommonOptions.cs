using System.CommandLine;

namespace RangeReduce.Cli;

/// <summary>The options that every command has.</summary>
internal static class CommonOptions
{
    public static readonly Option<bool> Json = new("--json") { Description = "Print the result as JSON on standard output, and nothing else there.", Recursive = true };

    public static readonly Option<bool> Quiet = new("--quiet", "-q") { Description = "No progress and no remarks on standard error; errors are still printed.", Recursive = true };

    public static readonly Option<bool> NoColor = new("--no-color") { Description = "No colours. The variable NO_COLOR does the same.", Recursive = true };
}
