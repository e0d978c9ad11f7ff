using System.Globalization;

namespace RangeReduce.Patterns.Tables;

/// <summary>A line of the form <c>key: value</c> or <c>key = value</c>, and the values in it.</summary>
internal static class MetadataLine
{
    /// <summary>Takes a line apart.</summary>
    /// <returns>False where the line has no such form.</returns>
    public static bool TryParse(string content, out string key, out string value)
    {
        (key, value) = (string.Empty, string.Empty);
        var at = content.AsSpan().IndexOfAny(':', '=');
        if (at < 0)
        {
            at = content.AsSpan().IndexOfAny(',', ';', '\t');
        }

        if (at is <= 0 or > 60 || !char.IsLetter(content[0]))
        {
            return false;
        }

        key = content[..at].Trim().Trim('"').ToLowerInvariant();
        value = content[(at + 1)..].Trim(' ', '\t', ',', ';', '"');
        return key.Length > 0 && value.Length > 0;
    }

    /// <summary>Finds a number with a unit of the given kind, such as <c>1.62 GHz</c>.</summary>
    /// <param name="text">The text; a unit in the key, as in <c>frequency [GHz]: 1.62</c>, comes in <paramref name="fallback"/>.</param>
    /// <param name="kind">What the unit has to measure.</param>
    /// <param name="fallback">Unit where the text gives none; with the kind <see cref="UnitKind.None"/> a unit is due.</param>
    /// <param name="value">The value in the base unit.</param>
    /// <returns>False where the text is anything else.</returns>
    public static bool TryQuantity(string text, UnitKind kind, HeadingUnit fallback, out double value)
    {
        value = double.NaN;
        var plain = HeadingParser.Plain(text);
        var end = plain.AsSpan().IndexOfAnyExcept(TextSigns.Number);
        end = end < 0 ? plain.Length : end;
        while (end > 0 && plain[end - 1] is 'e' or 'E' or ' ')
        {
            end--;
        }

        var unit = fallback;
        var unitText = plain.AsSpan(end).Trim().Trim("[]()");
        if (unitText.Length > 0 && !HeadingUnit.TryParse(unitText, out unit))
        {
            return false;
        }

        if (unit.Kind != kind || !double.TryParse(plain.AsSpan(0, end).ToString().Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture, out var number) || !double.IsFinite(number))
        {
            return false;
        }

        value = number * unit.Factor;
        return true;
    }
}
