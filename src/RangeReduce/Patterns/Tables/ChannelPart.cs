namespace RangeReduce.Patterns.Tables;

/// <summary>Which part of a complex sample a column holds.</summary>
internal enum ChannelPart
{
    /// <summary>The heading does not say.</summary>
    None,

    /// <summary>Level in decibels: 20 times the common logarithm of the amplitude.</summary>
    Level,

    /// <summary>Linear amplitude.</summary>
    Amplitude,

    /// <summary>Linear power: the square of the amplitude.</summary>
    Power,

    /// <summary>Phase.</summary>
    Phase,

    /// <summary>Real part.</summary>
    Real,

    /// <summary>Imaginary part.</summary>
    Imaginary,

    /// <summary>Return loss in decibels, positive for a passive port.</summary>
    ReturnLoss,

    /// <summary>Voltage standing wave ratio.</summary>
    StandingWaveRatio,
}
