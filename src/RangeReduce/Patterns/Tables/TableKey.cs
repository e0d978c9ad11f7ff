namespace RangeReduce.Patterns.Tables;

/// <summary>One of the three keys that a sample is found by: frequency, the theta-like angle, the phi-like angle.</summary>
internal sealed record TableKey
{
    /// <summary>Slot of the frequency.</summary>
    public const int Frequency = 0;

    /// <summary>Slot of the theta-like angle: theta, azimuth or the only angle there is.</summary>
    public const int First = 1;

    /// <summary>Slot of the phi-like angle: phi, roll, or elevation beside azimuth.</summary>
    public const int Second = 2;

    /// <summary>Gets what the key names; <see cref="HeadingKind.Unknown"/> where the table says nothing of it.</summary>
    public HeadingKind Kind { get; init; }

    /// <summary>Gets the column; -1 where it is fixed by something else than a column.</summary>
    public int Column { get; init; } = -1;

    /// <summary>Gets the factor to hertz or degrees.</summary>
    public double Factor { get; init; } = 1.0;

    /// <summary>Gets the value in hertz or degrees where there is no column; NaN where nothing says it.</summary>
    public double Fixed { get; init; } = double.NaN;

    /// <summary>Gets whether the value columns carry this key (wide form).</summary>
    public bool IsAcross { get; init; }
}
