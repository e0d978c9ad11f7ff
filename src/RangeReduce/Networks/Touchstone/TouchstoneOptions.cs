namespace RangeReduce.Networks.Touchstone;

/// <summary>Limits of the Touchstone reader; past them there is a clear error before memory is taken.</summary>
public sealed record TouchstoneOptions
{
    /// <summary>Gets the most ports; the default is 256.</summary>
    public int MostPorts { get; init; } = 256;

    /// <summary>Gets the most values (frequencies times ports squared); the default is 100 million.</summary>
    public long MostValues { get; init; } = 100_000_000;

    /// <summary>Gets the longest line in bytes; the default is one mebibyte.</summary>
    public int LongestLine { get; init; } = 1 << 20;

    /// <summary>Gets the largest file in bytes; the default is one gibibyte.</summary>
    public long LargestFile { get; init; } = 1L << 30;
}
