using System.CommandLine;

namespace RangeReduce.Cli;

/// <summary>The command line: parses, calls, prints; decides nothing.</summary>
internal static class CommandLine
{
    private const string CommandName = "rangereduce";

    /// <summary>Runs a command line.</summary>
    /// <param name="args">The arguments.</param>
    /// <param name="terminal">Where to print.</param>
    /// <param name="clock">The clock.</param>
    /// <param name="cancellationToken">Stops the work at its next safe place.</param>
    /// <returns>The exit code.</returns>
    public static int Run(string[] args, Terminal terminal, TimeProvider clock, CancellationToken cancellationToken)
    {
        var root = new RootCommand("Turns a folder of antenna measurements into figures with uncertainty and a report.")
        {
            ReduceCommand.Create(terminal, clock, cancellationToken),
            CheckCommand.Create(terminal, cancellationToken),
            CompareCommand.Create(terminal, cancellationToken),
        };
        root.Options.Add(CommonOptions.Json);
        root.Options.Add(CommonOptions.Quiet);
        root.Options.Add(CommonOptions.NoColor);

        var parsed = root.Parse(args);
        if (parsed.Errors.Count > 0)
        {
            foreach (var error in parsed.Errors)
            {
                terminal.Error.WriteLine(error.Message);
            }

            var command = parsed.CommandResult.Command;
            terminal.Error.WriteLine(command == root ? "Try: rangereduce --help" : $"Try: rangereduce {command.Name} --help");
            return ExitCode.Usage;
        }

        terminal.NoColor |= parsed.GetValue(CommonOptions.NoColor);

        // Help and version go through the library, which calls the command by its assembly; our commands print for themselves.
        using var library = new StringWriter();
        var code = CommandRunner.Run(terminal, () => parsed.Invoke(new InvocationConfiguration
        {
            Output = library,
            Error = terminal.Error,
            EnableDefaultExceptionHandler = false,
            ProcessTerminationTimeout = null,
        }));
        terminal.Output.Write(library.ToString().Replace(RootCommand.ExecutableName, CommandName, StringComparison.Ordinal));
        return code;
    }
}
