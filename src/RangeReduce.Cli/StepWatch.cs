using System.Globalization;

namespace RangeReduce.Cli;

/// <summary>Times the steps of a job.</summary>
/// <param name="clock">The clock.</param>
internal sealed class StepWatch(TimeProvider clock)
{
    private readonly long _start = clock.GetTimestamp();
    private readonly List<(string Step, double Seconds)> _steps = [];

    /// <summary>Gets the seconds since the watch was made.</summary>
    public double TotalSeconds => clock.GetElapsedTime(_start).TotalSeconds;

    /// <summary>Times a step that gives something.</summary>
    public T Time<T>(string step, Func<T> work)
    {
        var start = clock.GetTimestamp();
        var result = work();
        _steps.Add((step, clock.GetElapsedTime(start).TotalSeconds));
        return result;
    }

    /// <summary>Adds a part of a step that was timed elsewhere; parts that ran side by side add up to more than their step.</summary>
    public void Add(string part, double seconds)
    {
        lock (_steps)
        {
            _steps.Add(($"of it {part}", seconds));
        }
    }

    /// <summary>Times a step.</summary>
    public void Time(string step, Action work) => Time(step, () =>
    {
        work();
        return true;
    });

    /// <summary>Gives the steps and the total in one line.</summary>
    public override string ToString() => string.Join(", ", _steps.Append(("total", TotalSeconds)).Select(step => string.Create(CultureInfo.InvariantCulture, $"{step.Item1} {step.Item2:0.000} s")));
}
