using System.Text;
using csFastFloat;

namespace RangeReduce.Patterns.Tables;

/// <summary>Reads the cells of a table: numbers, and the many ways to say that a sample is missing.</summary>
internal static class CellText
{
    /// <summary>Parses a number that fills the cell but for blanks around it.</summary>
    /// <param name="cell">Bytes of the cell.</param>
    /// <param name="decimalSign">The decimal sign of the table.</param>
    /// <param name="value">The number; it may be infinite where the text is beyond the range of a double.</param>
    /// <returns>False where the cell holds anything else.</returns>
    public static bool TryNumber(ReadOnlySpan<byte> cell, byte decimalSign, out double value)
    {
        if (!FastDoubleParser.TryParseDouble(cell, out var used, out value, decimal_separator: decimalSign) || used == 0)
        {
            return false;
        }

        return used == cell.Length || IsBlank(cell[used..]);
    }

    /// <summary>Parses a number in one of the spellings that other programs leave behind: Fortran exponents and the typographic minus.</summary>
    public static bool TryOddNumber(ReadOnlySpan<byte> cell, byte decimalSign, out double value)
    {
        value = double.NaN;
        if (cell.Length > 64)
        {
            return false;
        }

        Span<byte> plain = stackalloc byte[64];
        var length = 0;
        for (var at = 0; at < cell.Length; at++)
        {
            // U+2212, the minus sign of typography, in UTF-8.
            if (cell[at..].StartsWith("\u2212"u8))
            {
                plain[length++] = (byte)'-';
                at += 2;
            }
            else
            {
                plain[length++] = cell[at] is (byte)'D' or (byte)'d' && at > 0 ? (byte)'E' : cell[at];
            }
        }

        return TryNumber(plain[..length], decimalSign, out value);
    }

    /// <summary>Gives whether the cell says that there is no sample.</summary>
    public static bool IsMissing(ReadOnlySpan<byte> cell)
    {
        var text = Trimmed(cell);
        if (text.Length > 12)
        {
            return false;
        }

        if (text.Length == 0 || text.IndexOfAnyExcept((byte)'-') < 0 || text.IndexOfAnyExcept((byte)'*') < 0)
        {
            return true;
        }

        Span<byte> lower = stackalloc byte[12];
        _ = Ascii.ToLower(text, lower, out var length);
        var word = lower[..length];
        if (word[0] is (byte)'+' or (byte)'-')
        {
            word = word[1..];
        }

        return word.SequenceEqual("nan"u8) || word.SequenceEqual("n/a"u8) || word.SequenceEqual("na"u8) || word.SequenceEqual("#n/a"u8) || word.SequenceEqual("null"u8) || word.SequenceEqual("none"u8)
            || word.SequenceEqual("missing"u8) || word.SequenceEqual("inf"u8) || word.SequenceEqual("infinity"u8) || word.SequenceEqual("?"u8) || word.SequenceEqual("nan(ind)"u8)
            || word.SequenceEqual("1.#qnan"u8) || word.SequenceEqual("1.#inf"u8) || word.SequenceEqual("1.#ind"u8);
    }

    /// <summary>Gives whether a number is of the kind that stands for nothing: 999, -9999, 9999.99 and the like.</summary>
    public static bool IsFiller(double value)
    {
        var size = Math.Abs(value);
        if (size is < 999.0 or > 1e9)
        {
            return false;
        }

        var next = Math.Round(size * 100.0) / 100.0;
        return size is 999.0 or 9999.0 or 99999.0 or 999999.0 or 9999999.0 or 99999999.0 or 999999999.0
            || next is 999.9 or 999.99 or 9999.9 or 9999.99 or 99999.9 or 99999.99;
    }

    /// <summary>Takes blanks and a pair of quotes off.</summary>
    public static ReadOnlySpan<byte> Trimmed(ReadOnlySpan<byte> cell)
    {
        var text = cell.Trim(" \t\r"u8);
        return text is [(byte)'"', .., (byte)'"'] ? text[1..^1].Trim(" \t"u8) : text;
    }

    /// <summary>Gives the bytes as text: UTF-8 where they are that, one byte a character where not.</summary>
    public static string Decode(ReadOnlySpan<byte> bytes) =>
        System.Text.Unicode.Utf8.IsValid(bytes) ? Encoding.UTF8.GetString(bytes) : Encoding.Latin1.GetString(bytes);

    private static bool IsBlank(ReadOnlySpan<byte> rest) => rest.IndexOfAnyExcept(" \t\r"u8) < 0;
}
