using RangeReduce.Diagnostics;
using Spectre.Console;

namespace RangeReduce.Cli;

/// <summary>Prints remarks on standard error, faults first, one line each: severity, place, sentence.</summary>
internal static class RemarkPrinter
{
    /// <summary>Prints the remarks; notes are only counted, since the report lists them.</summary>
    public static void Print(Terminal terminal, IReadOnlyList<Remark> remarks)
    {
        var console = terminal.ErrorConsole();
        foreach (var remark in remarks.Where(remark => remark.Severity != RemarkSeverity.Note))
        {
            PrintLine(console, remark);
        }

        var notes = remarks.Count(remark => remark.Severity == RemarkSeverity.Note);
        if (notes > 0)
        {
            terminal.Error.WriteLine(notes == 1 ? "1 note is in the report." : FormattableString.Invariant($"{notes} notes are in the report."));
        }
    }

    /// <summary>Prints one remark on one line.</summary>
    public static void PrintLine(IAnsiConsole console, Remark remark)
    {
        var (word, colour) = remark.Severity switch
        {
            RemarkSeverity.Fault => ("fault", Color.Red),
            RemarkSeverity.Doubt => ("doubt", Color.Yellow),
            _ => ("note", Color.Default),
        };
        console.Write(new Text(word, new Style(colour)));
        var place = remark.Place is { } at ? $" {at}:" : ":";
        console.Profile.Out.Writer.WriteLine($"{place} {remark.Text}");
    }
}
