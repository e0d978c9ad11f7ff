namespace RangeReduce.Networks.Touchstone;

/// <summary>How a pair of numbers makes a complex value.</summary>
public enum ParameterFormat
{
    /// <summary>Magnitude and angle in degrees.</summary>
    MagnitudeAngle,

    /// <summary>20 lg of the magnitude and angle in degrees.</summary>
    DecibelAngle,

    /// <summary>Real and imaginary part.</summary>
    RealImaginary,
}
