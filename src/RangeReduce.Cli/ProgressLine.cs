using Spectre.Console;

namespace RangeReduce.Cli;

/// <summary>Shows a progress bar on a terminal, and nothing elsewhere.</summary>
internal static class ProgressLine
{
    /// <summary>Does the work under a progress bar.</summary>
    /// <param name="terminal">The terminal; without one on standard error there is no bar.</param>
    /// <param name="quiet">Whether the user wants none.</param>
    /// <param name="work">Does the work; it is given a way to say which step it is at and how far along, from 0 to 1.</param>
    public static T Show<T>(Terminal terminal, bool quiet, Func<Action<string, double>, T> work)
    {
        if (quiet || !terminal.ErrorIsTerminal)
        {
            return work((_, _) => { });
        }

        return terminal.ErrorConsole().Progress()
            .AutoClear(true)
            .Columns(new TaskDescriptionColumn(), new ProgressBarColumn(), new PercentageColumn())
            .Start(context =>
            {
                var task = context.AddTask("reading", maxValue: 1.0);
                return work((step, share) =>
                {
                    task.Description = step;
                    task.Value = share;
                });
            });
    }
}
