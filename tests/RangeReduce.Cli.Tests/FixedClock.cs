namespace RangeReduce.Cli.Tests;

/// <summary>A clock that stands still, so that two reports can be compared.</summary>
internal sealed class FixedClock(DateTimeOffset now) : TimeProvider
{
    public override DateTimeOffset GetUtcNow() => now;

    public override long GetTimestamp() => 0;
}
