namespace RangeReduce.Cli.Tests;

/// <summary>Runs a command line in this process and keeps what it prints.</summary>
internal sealed record CommandHarness(int Code, string Output, string Error)
{
    /// <summary>The time that reports of the tests are made at.</summary>
    public static readonly DateTimeOffset Noon = new(2026, 5, 4, 12, 0, 0, TimeSpan.Zero);

    /// <summary>Gets the folder that holds the solution.</summary>
    public static string Root { get; } = FindRoot();

    /// <summary>Runs a command line without a terminal.</summary>
    public static CommandHarness Run(params string[] args) => Run(CancellationToken.None, args);

    /// <summary>Runs a command line without a terminal.</summary>
    public static CommandHarness Run(CancellationToken cancellationToken, params string[] args)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        var code = CommandLine.Run(args, new Terminal(output, error, outputIsTerminal: false, errorIsTerminal: false), new FixedClock(Noon), cancellationToken);
        return new(code, output.ToString(), error.ToString());
    }

    private static string FindRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "RangeReduce.sln")))
            {
                return folder.FullName;
            }
        }

        throw new InvalidOperationException("The tests must run inside the repository.");
    }
}
