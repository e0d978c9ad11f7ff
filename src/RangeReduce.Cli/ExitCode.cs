namespace RangeReduce.Cli;

/// <summary>The exit codes that scripts may rely on.</summary>
internal static class ExitCode
{
    public const int Done = 0;

    /// <summary>Done, and at least one requirement is not met.</summary>
    public const int RequirementNotMet = 1;

    /// <summary>The command line is wrong.</summary>
    public const int Usage = 2;

    /// <summary>The measurement data or the manifest is wrong.</summary>
    public const int Data = 3;

    /// <summary>The machine failed: disk full, no permission.</summary>
    public const int Machine = 4;

    /// <summary>A defect of the tool.</summary>
    public const int Defect = 70;

    /// <summary>Interrupted.</summary>
    public const int Interrupted = 130;
}
