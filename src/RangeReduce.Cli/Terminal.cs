using Spectre.Console;

namespace RangeReduce.Cli;

/// <summary>The two streams of a command and what may be done with them.</summary>
/// <param name="output">Standard output: the result, and nothing else.</param>
/// <param name="error">Standard error: progress and remarks.</param>
/// <param name="outputIsTerminal">Whether standard output is a terminal.</param>
/// <param name="errorIsTerminal">Whether standard error is a terminal.</param>
internal sealed class Terminal(TextWriter output, TextWriter error, bool outputIsTerminal, bool errorIsTerminal)
{
    /// <summary>Width of text that does not go to a terminal.</summary>
    public const int PlainWidth = 120;

    /// <summary>Gets standard output.</summary>
    public TextWriter Output { get; } = output;

    /// <summary>Gets standard error.</summary>
    public TextWriter Error { get; } = error;

    /// <summary>Gets whether standard output is a terminal.</summary>
    public bool OutputIsTerminal { get; } = outputIsTerminal;

    /// <summary>Gets whether standard error is a terminal.</summary>
    public bool ErrorIsTerminal { get; } = errorIsTerminal;

    /// <summary>Gets or sets whether colour is unwanted.</summary>
    public bool NoColor { get; set; }

    /// <summary>Gives the terminal of this process.</summary>
    public static Terminal OfProcess() => new(Console.Out, Console.Error, !Console.IsOutputRedirected, !Console.IsErrorRedirected)
    {
        // https://no-color.org: any value that is not empty.
        NoColor = !string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR")),
    };

    /// <summary>Makes a console for tables and colours on standard output.</summary>
    public IAnsiConsole OutputConsole() => Make(Output, OutputIsTerminal);

    /// <summary>Makes a console for the progress bar and remarks on standard error.</summary>
    public IAnsiConsole ErrorConsole() => Make(Error, ErrorIsTerminal);

    private IAnsiConsole Make(TextWriter writer, bool terminal)
    {
        var console = AnsiConsole.Create(new AnsiConsoleSettings
        {
            Out = new AnsiConsoleOutput(writer),
            Ansi = terminal ? AnsiSupport.Detect : AnsiSupport.No,
            ColorSystem = terminal && !NoColor ? ColorSystemSupport.Detect : ColorSystemSupport.NoColors,
            Interactive = terminal ? InteractionSupport.Yes : InteractionSupport.No,
        });
        if (!terminal)
        {
            console.Profile.Width = PlainWidth;
        }

        return console;
    }
}
