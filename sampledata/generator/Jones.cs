using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>Two complex components of a field, time factor exp(+jwt).</summary>
/// <param name="First">Along theta.</param>
/// <param name="Second">Along phi.</param>
internal readonly record struct Jones(Complex First, Complex Second)
{
    /// <summary>Gets the right-hand amplitude by IEEE Std 145: phi lags theta by 90 degrees.</summary>
    public Complex Right => (First + (Complex.ImaginaryOne * Second)) / Math.Sqrt(2.0);

    /// <summary>Gets the left-hand amplitude.</summary>
    public Complex Left => (First - (Complex.ImaginaryOne * Second)) / Math.Sqrt(2.0);

    /// <summary>Gets the sum of the squared magnitudes.</summary>
    public double Power => SquareOf(First) + SquareOf(Second);

    /// <summary>Scales both components.</summary>
    public static Jones operator *(Jones field, Complex factor) => new(field.First * factor, field.Second * factor);

    /// <summary>Scales both components.</summary>
    public static Jones operator *(Jones field, double factor) => new(field.First * factor, field.Second * factor);

    private static double SquareOf(Complex value) => (value.Real * value.Real) + (value.Imaginary * value.Imaginary);
}
