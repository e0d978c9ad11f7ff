using System.Globalization;
using System.Text;

namespace RangeReduce.Runs.Manifest;

/// <summary>Shows text out of a file inside a message: shortened, in quotes, with nothing in it that a terminal would obey.</summary>
internal static class FoundText
{
    private const int Longest = 60;

    /// <summary>Gives the text in double quotes; control characters as \uXXXX, more than 60 characters cut with an ellipsis.</summary>
    public static string Show(string text)
    {
        var shown = new StringBuilder("\"");
        foreach (var character in text.Length > Longest ? text[..Longest] : text)
        {
            var harmless = !char.IsControl(character) && CharUnicodeInfo.GetUnicodeCategory(character) is not (UnicodeCategory.Format or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator or UnicodeCategory.Surrogate);
            _ = harmless ? shown.Append(character) : shown.Append(CultureInfo.InvariantCulture, $"\\u{(int)character:X4}");
        }

        return shown.Append(text.Length > Longest ? "…\"" : "\"").ToString();
    }

    /// <summary>Gives names in double quotes, joined by commas and a last "or".</summary>
    public static string AnyOf(IEnumerable<string> names)
    {
        var shown = names.Select(name => $"\"{name}\"").ToArray();
        return shown.Length < 2 ? string.Concat(shown) : $"{string.Join(", ", shown[..^1])} or {shown[^1]}";
    }
}
