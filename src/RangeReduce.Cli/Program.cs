using System.Runtime.InteropServices;

namespace RangeReduce.Cli;

/// <summary>Starts the command line.</summary>
internal static class Program
{
    private static int Main(string[] args)
    {
        using var stop = new CancellationTokenSource();

        // Both signals only ask: the work ends at its next safe place, so that what it writes is whole or absent.
        using var interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, Ask);
        using var terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, Ask);
        return CommandLine.Run(args, Terminal.OfProcess(), TimeProvider.System, stop.Token);

        void Ask(PosixSignalContext context)
        {
            context.Cancel = true;
            stop.Cancel();
        }
    }
}
