namespace RangeReduce.Cli;

/// <summary>Passes progress on at once, on the thread that makes it.</summary>
/// <param name="report">Takes the share that is done.</param>
internal sealed class DirectProgress(Action<double> report) : IProgress<double>
{
    private readonly Lock _lock = new();

    /// <inheritdoc/>
    public void Report(double value)
    {
        lock (_lock)
        {
            report(value);
        }
    }
}
