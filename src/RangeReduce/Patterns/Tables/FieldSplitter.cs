namespace RangeReduce.Patterns.Tables;

/// <summary>Splits one line of the head, or the line of a fault, into fields.</summary>
internal static class FieldSplitter
{
    /// <summary>Splits at a separator; quoted fields stay whole and lose their quotes.</summary>
    /// <param name="line">The line without its break.</param>
    /// <param name="separator">The separator; a blank stands for runs of blanks and tabs.</param>
    /// <returns>Text of each field without blanks around it, and its column from 1.</returns>
    public static List<(string Text, int Column)> Split(ReadOnlySpan<char> line, char separator)
    {
        var fields = new List<(string, int)>();
        var at = 0;
        while (true)
        {
            while (at < line.Length && IsBlank(line[at]) && line[at] != separator)
            {
                at++;
            }

            if (separator == ' ')
            {
                while (at < line.Length && IsBlank(line[at]))
                {
                    at++;
                }

                if (at >= line.Length)
                {
                    return fields;
                }
            }

            var start = at;
            var quoted = at < line.Length && line[at] == '"';
            var close = quoted ? line[(at + 1)..].IndexOf('"') : -1;
            at = close >= 0 ? at + close + 2 : at;
            while (at < line.Length && line[at] != separator && !(separator == ' ' && IsBlank(line[at])))
            {
                at++;
            }

            var text = line[start..at].Trim();
            fields.Add((close >= 0 && text[^1] == '"' ? text[1..^1].Trim().ToString() : text.ToString(), start + 1));
            if (at >= line.Length)
            {
                return fields;
            }

            at++;
        }
    }

    private static bool IsBlank(char sign) => sign is ' ' or '\t' or '\u00A0';
}
