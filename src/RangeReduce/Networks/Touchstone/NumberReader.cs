using csFastFloat;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Turns the bytes of one item into a number by the shapes that the format knows.</summary>
internal static class NumberReader
{
    /// <summary>Reads a number; reports a Fortran exponent.</summary>
    /// <param name="item">Bytes of the item, without blanks.</param>
    /// <param name="shift">Power of ten to multiply by; done in the text, so that 4.1 GHz is 4.1e9 to the last bit.</param>
    /// <param name="place">Where the item stands.</param>
    /// <param name="fortran">Set where the exponent is written with D.</param>
    /// <exception cref="MeasurementDataException">It is no number.</exception>
    public static double Read(ReadOnlySpan<byte> item, int shift, SourcePlace place, ref bool fortran)
    {
        Span<byte> copy = stackalloc byte[64];
        var digits = item.Length > 0 && item[0] == (byte)'+' ? item[1..] : item;
        if (!HasShape(digits, out var exponentAt, out var isFortran) || item.StartsWith("+-"u8))
        {
            throw item.Contains((byte)',') ? TouchstoneErrors.DecimalComma(place, TouchstoneErrors.Quote(item)) : TouchstoneErrors.BadNumber(place, TouchstoneErrors.Quote(item));
        }

        // The common case needs no copy: no D, no shift.
        bool isNumber;
        double value;
        if (!isFortran && shift == 0)
        {
            isNumber = FastDoubleParser.TryParseDouble(digits, out value);
        }
        else
        {
            // Nobody writes sixty digits: a longer item is damage.
            fortran |= isFortran;
            value = 0.0;
            isNumber = digits.Length < copy.Length - 8 && FastDoubleParser.TryParseDouble(copy[..WithExponent(digits, exponentAt, shift, copy)], out value);
        }

        return isNumber && double.IsFinite(value) ? value : throw TouchstoneErrors.BadNumber(place, TouchstoneErrors.Quote(item));
    }

    /// <summary>Checks sign, digits with or without point, optional exponent; the parser behind would take words such as inf as well.</summary>
    private static bool HasShape(ReadOnlySpan<byte> text, out int exponentAt, out bool isFortran)
    {
        (exponentAt, isFortran) = (-1, false);
        var i = text.Length > 0 && text[0] == (byte)'-' ? 1 : 0;
        var (digits, points) = (0, 0);
        for (; i < text.Length; i++)
        {
            var letter = text[i];
            if ((uint)(letter - '0') <= 9)
            {
                digits++;
            }
            else if (letter == (byte)'.' && points == 0)
            {
                points++;
            }
            else
            {
                break;
            }
        }

        if (digits == 0 || i == text.Length)
        {
            return digits > 0;
        }

        var mark = text[i] | 0x20;
        if (mark is not ('e' or 'd'))
        {
            return false;
        }

        (exponentAt, isFortran) = (i++, mark == 'd');
        if (i < text.Length && text[i] is (byte)'+' or (byte)'-')
        {
            i++;
        }

        // Four digits are more than any exponent of a double; a longer one is damage.
        var first = i;
        while (i < text.Length && (uint)(text[i] - '0') <= 9)
        {
            i++;
        }

        return i == text.Length && i > first && i - first <= 4;
    }

    private static int WithExponent(ReadOnlySpan<byte> digits, int exponentAt, int shift, Span<byte> copy)
    {
        var mantissa = exponentAt < 0 ? digits : digits[..exponentAt];
        var exponent = 0;
        if (exponentAt >= 0)
        {
            var text = digits[(exponentAt + 1)..];
            var negative = text[0] == (byte)'-';
            foreach (var digit in text[0] is (byte)'+' or (byte)'-' ? text[1..] : text)
            {
                exponent = (exponent * 10) + (digit - '0');
            }

            exponent = negative ? -exponent : exponent;
        }

        mantissa.CopyTo(copy);
        var at = mantissa.Length;
        copy[at++] = (byte)'e';
        _ = (exponent + shift).TryFormat(copy[at..], out var written, provider: System.Globalization.CultureInfo.InvariantCulture);
        return at + written;
    }
}
