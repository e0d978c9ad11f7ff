using RangeReduce.Diagnostics;

namespace RangeReduce.Cli;

/// <summary>Runs a command and turns what goes wrong into one sentence and an exit code.</summary>
internal static class CommandRunner
{
    /// <summary>Runs the command.</summary>
    public static int Run(Terminal terminal, Func<int> command)
    {
        try
        {
            return command();
        }
        catch (MeasurementDataException error)
        {
            return Fail(error.Message, ExitCode.Data);
        }
        catch (AggregateException error) when (error.Flatten().InnerExceptions.All(inner => inner is MeasurementDataException))
        {
            return Fail(string.Join(Environment.NewLine, error.Flatten().InnerExceptions.Select(inner => inner.Message)), ExitCode.Data);
        }
        catch (OperationCanceledException)
        {
            return Fail("Interrupted. Nothing was left half-written.", ExitCode.Interrupted);
        }
        catch (UnauthorizedAccessException error)
        {
            return Fail($"No permission: {error.Message}", ExitCode.Machine);
        }
        catch (IOException error)
        {
            return Fail(error.Message, ExitCode.Machine);
        }
#pragma warning disable CA1031 // The outermost place: whatever else comes is a defect, and the user gets told so with its trace.
        catch (Exception error)
#pragma warning restore CA1031
        {
            return Fail($"This is a defect of the tool, please report it with the lines below.{Environment.NewLine}{error}", ExitCode.Defect);
        }

        int Fail(string sentence, int code)
        {
            terminal.Error.WriteLine(sentence);
            return code;
        }
    }
}
