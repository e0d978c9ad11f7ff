using System.Globalization;
using System.Text;

namespace RangeReduce.Runs.Manifest;

/// <summary>Writes texts and keys as TOML 1.0 has them.</summary>
internal static class TomlText
{
    /// <summary>Gives a basic string in quotes.</summary>
    public static string Quoted(string text)
    {
        var quoted = new StringBuilder("\"");
        foreach (var character in text)
        {
            _ = character switch
            {
                '"' => quoted.Append("\\\""),
                '\\' => quoted.Append("\\\\"),
                '\n' => quoted.Append("\\n"),
                '\t' => quoted.Append("\\t"),
                _ when char.IsControl(character) => quoted.Append(CultureInfo.InvariantCulture, $"\\u{(int)character:X4}"),
                _ => quoted.Append(character),
            };
        }

        return quoted.Append('"').ToString();
    }

    /// <summary>Gives a key: bare where that is allowed, else in quotes.</summary>
    public static string Key(string key) => key.Length > 0 && key.All(character => char.IsAsciiLetterOrDigit(character) || character is '-' or '_') ? key : Quoted(key);

    /// <summary>Gives a list of strings on one line, or on several where it would be long.</summary>
    public static string List(IReadOnlyCollection<string> texts)
    {
        const int Widest = 100;
        var line = $"[{string.Join(", ", texts.Select(Quoted))}]";
        return line.Length <= Widest ? line : $"[\n{string.Concat(texts.Select(text => $"  {Quoted(text)},\n"))}]";
    }
}
