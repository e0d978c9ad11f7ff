namespace RangeReduce.Patterns.Tables;

/// <summary>What a unit in a heading measures.</summary>
internal enum UnitKind
{
    /// <summary>No unit was given.</summary>
    None,

    /// <summary>A frequency; the factor leads to hertz.</summary>
    Frequency,

    /// <summary>An angle; the factor leads to degrees.</summary>
    Angle,

    /// <summary>Decibels over a reference that does not matter here.</summary>
    Decibel,

    /// <summary>Decibels over an isotropic radiator.</summary>
    DecibelIsotropic,

    /// <summary>A linear amplitude; the factor leads to volts, or to 1.</summary>
    Amplitude,

    /// <summary>A linear power; the factor leads to watts.</summary>
    Power,

    /// <summary>An impedance in ohm.</summary>
    Ohm,
}
