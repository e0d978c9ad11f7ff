namespace RangeReduce.Runs.Manifest;

/// <summary>What kind of quantity a unit measures.</summary>
public enum UnitDimension
{
    /// <summary>A plain number without unit.</summary>
    Number,

    /// <summary>Frequency, kept in hertz.</summary>
    Frequency,

    /// <summary>Length, kept in metres.</summary>
    Length,

    /// <summary>Angle, kept in degrees.</summary>
    Angle,

    /// <summary>Time, kept in seconds.</summary>
    Time,

    /// <summary>Resistance, kept in ohm.</summary>
    Resistance,

    /// <summary>Temperature, kept in kelvin.</summary>
    Temperature,

    /// <summary>Ratio of powers, kept in decibels.</summary>
    Ratio,

    /// <summary>Gain over an isotropic radiator, kept in dBi.</summary>
    Gain,

    /// <summary>Power over one milliwatt, kept in dBm.</summary>
    Power,

    /// <summary>Share, kept in percent.</summary>
    Percent,
}
