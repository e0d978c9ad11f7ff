namespace RangeReduce.Quantities;

/// <summary>What a trace runs along.</summary>
public enum TraceAxis
{
    /// <summary>Frequency in hertz.</summary>
    Frequency,

    /// <summary>Angle along the cut in degrees.</summary>
    Angle,
}
