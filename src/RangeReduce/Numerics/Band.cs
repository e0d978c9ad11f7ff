namespace RangeReduce.Numerics;

/// <summary>A connected run of abscissae over which a curve keeps a bound.</summary>
/// <param name="Low">Lower edge.</param>
/// <param name="High">Upper edge.</param>
/// <param name="OpenLow">Whether the data end (or a sample is missing) before the lower edge is seen.</param>
/// <param name="OpenHigh">Whether the data end (or a sample is missing) before the upper edge is seen.</param>
/// <param name="First">Index of the first sample inside; of the sample before a band that fits between two samples.</param>
/// <param name="Last">Index of the last sample inside; of the sample after a band that fits between two samples.</param>
public readonly record struct Band(double Low, double High, bool OpenLow, bool OpenHigh, int First, int Last)
{
    /// <summary>Gives the distance of the edges.</summary>
    public double Width => High - Low;

    /// <summary>Gives which ends are open: <c>low</c>, <c>high</c>, <c>both</c>, or null.</summary>
    public string? Open => (OpenLow, OpenHigh) switch
    {
        (true, true) => "both",
        (true, false) => "low",
        (false, true) => "high",
        _ => null,
    };

    /// <summary>Tells whether an abscissa lies inside, edges included.</summary>
    public bool Contains(double x) => x >= Low && x <= High;
}
