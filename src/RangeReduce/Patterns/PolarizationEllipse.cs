using RangeReduce.Quantities;

namespace RangeReduce.Patterns;

/// <summary>Axial ratio, hand and tilt of the polarization ellipse from circular components (IEEE Std 145).</summary>
public static class PolarizationEllipse
{
    /// <summary>Axial ratio in dB above which no hand is named: the minor axis is then a hundredth of the major one, inside the errors of most ranges (common practice).</summary>
    public const double LinearFromDb = 40.0;

    /// <summary>Axial ratio in dB below which the tilt has no meaning.</summary>
    public const double TiltFromDb = 0.1;

    // Amplitudes that differ by less than this share of their sum are equal but for the last digits of the arithmetic: 260 dB is no axial ratio.
    private const double RoundingShare = 1e-13;

    /// <summary>Gives the axial ratio in dB, 0 for a circle and never negative.</summary>
    /// <param name="right">Amplitude of the right-hand component, any scale.</param>
    /// <param name="left">Amplitude of the left-hand component, same scale.</param>
    /// <returns>20 lg ((a + b)/|a − b|); +∞ for amplitudes that are equal to rounding, NaN if both are zero or one is missing.</returns>
    public static double AxialRatioDb(double right, double left)
    {
        var (sum, difference) = (right + left, Math.Abs(right - left));
        if (difference < RoundingShare * sum)
        {
            return double.PositiveInfinity;
        }

        return sum > 0.0 ? 20.0 * Math.Log10(sum / difference) : double.NaN;
    }

    /// <summary>Gives the axial ratio in dB of a circular cross-polar ratio in dB; the same map serves the way back.</summary>
    public static double AxialRatioDbOfCrossPolarDb(double crossPolarDb) => AxialRatioDb(1.0, Math.Pow(10.0, -crossPolarDb / 20.0));

    /// <summary>Gives the hand; linear where the axial ratio exceeds <see cref="LinearFromDb"/> or cannot be formed.</summary>
    /// <param name="right">Amplitude of the right-hand component, any scale.</param>
    /// <param name="left">Amplitude of the left-hand component, same scale.</param>
    public static Hand HandOf(double right, double left)
    {
        var ratio = AxialRatioDb(right, left);
        return !(ratio <= LinearFromDb) ? Hand.Linear : right > left ? Hand.Right : Hand.Left;
    }

    /// <summary>Gives the tilt of the major axis from theta towards phi: half the phase of right against left.</summary>
    /// <returns>Degrees above −90 and up to 90; NaN where a component is missing.</returns>
    public static double TiltDeg(double rightRe, double rightIm, double leftRe, double leftIm)
    {
        // arg(R L*) is the difference of the phases in one step, without wrapping twice.
        var re = (rightRe * leftRe) + (rightIm * leftIm);
        var im = (rightIm * leftRe) - (rightRe * leftIm);
        var tilt = 0.5 * double.RadiansToDegrees(Math.Atan2(im, re));
        return tilt <= -90.0 ? tilt + 180.0 : tilt;
    }
}
