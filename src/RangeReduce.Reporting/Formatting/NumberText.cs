using System.Globalization;

namespace RangeReduce.Reporting.Formatting;

/// <summary>Prints numbers for readers: a point as decimal sign, a true minus, no grouping.</summary>
public static class NumberText
{
    /// <summary>The minus sign.</summary>
    public const char Minus = '\u2212';

    /// <summary>What stands where there is no number.</summary>
    public const string Missing = "\u2013";

    /// <summary>Prints a number with a fixed count of decimals; halves are rounded away from zero, and a zero has no sign.</summary>
    /// <param name="value">The number.</param>
    /// <param name="decimals">Digits after the point, at most 15. A negative count rounds to tens, hundreds and so on.</param>
    /// <returns>The text; <see cref="Missing"/> for NaN and an infinity sign for an infinity.</returns>
    public static string Fixed(double value, int decimals)
    {
        if (double.IsNaN(value))
        {
            return Missing;
        }

        if (double.IsInfinity(value))
        {
            return value < 0 ? "\u2212\u221E" : "\u221E";
        }

        var rounded = Round(value, decimals);
        var text = Math.Abs(rounded).ToString("F" + Math.Clamp(decimals, 0, 15).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return rounded < 0 ? Minus + text : text;
    }

    /// <summary>Prints a number with at most so many decimals and no trailing zeros.</summary>
    public static string Trimmed(double value, int mostDecimals)
    {
        var text = Fixed(value, mostDecimals);
        return text.Contains('.', StringComparison.Ordinal) ? text.TrimEnd('0').TrimEnd('.') : text;
    }

    /// <summary>Rounds to a count of decimals, halves away from zero.</summary>
    internal static double Round(double value, int decimals)
    {
        if (decimals >= 0)
        {
            return Math.Round(value, Math.Min(decimals, 15), MidpointRounding.AwayFromZero);
        }

        var step = Math.Pow(10.0, -decimals);
        return Math.Round(value / step, MidpointRounding.AwayFromZero) * step;
    }
}
