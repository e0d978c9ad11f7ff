namespace RangeReduce.Patterns.Tables;

/// <summary>Parses the short decimals that measurement tables are full of, faster than a general parser can.</summary>
/// <remarks>
/// Up to 15 digits are an exact integer in a double, and so are the powers of ten up to 10^15: one division of two exact numbers is rounded correctly
/// (W. D. Clinger, How to Read Floating Point Numbers Accurately, 1990). Anything else is left to csFastFloat.
/// </remarks>
internal static class PlainDecimal
{
    private const int MostDigits = 15;

    private static ReadOnlySpan<double> PowersOfTen => [1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15];

    /// <summary>Parses a cell that is nothing but a sign, digits and at most one decimal sign.</summary>
    /// <returns>False for every other cell, which may be a number all the same.</returns>
    public static bool TryParse(ReadOnlySpan<byte> cell, byte decimalSign, out double value)
    {
        value = 0.0;
        var start = cell.Length > 0 && cell[0] == (byte)'-' ? 1 : 0;
        if (cell.Length == start || cell.Length - start > MostDigits + 1)
        {
            return false;
        }

        var digits = 0L;
        var at = start;
        uint digit;
        while (at < cell.Length && (digit = (uint)(cell[at] - '0')) <= 9)
        {
            digits = (10 * digits) + digit;
            at++;
        }

        if (at == cell.Length)
        {
            value = digits;
            value = start == 0 ? value : -value;
            return cell.Length - start <= MostDigits;
        }

        if (cell[at] != decimalSign)
        {
            return false;
        }

        var point = ++at;
        while (at < cell.Length && (digit = (uint)(cell[at] - '0')) <= 9)
        {
            digits = (10 * digits) + digit;
            at++;
        }

        value = digits / PowersOfTen[at - point];
        value = start == 0 ? value : -value;
        return at == cell.Length && cell.Length - start > 1;
    }
}
