namespace RangeReduce.Patterns.Tables;

/// <summary>What a heading names.</summary>
internal enum HeadingKind
{
    /// <summary>Nothing that is known.</summary>
    Unknown,

    /// <summary>The frequency.</summary>
    Frequency,

    /// <summary>Theta of the antenna.</summary>
    Theta,

    /// <summary>Phi of the antenna.</summary>
    Phi,

    /// <summary>Azimuth of a positioner.</summary>
    Azimuth,

    /// <summary>Elevation of a positioner.</summary>
    Elevation,

    /// <summary>Roll of a positioner about the antenna axis.</summary>
    Roll,

    /// <summary>An angle without a name of its own.</summary>
    Angle,

    /// <summary>Angle of a spinning probe.</summary>
    Spin,

    /// <summary>A part of a channel.</summary>
    Channel,

    /// <summary>A part of the reflection of one port.</summary>
    Reflection,

    /// <summary>An uncertainty.</summary>
    Uncertainty,

    /// <summary>Something that is not needed: a time, a temperature, a comment.</summary>
    Spare,
}
