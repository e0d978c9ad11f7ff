namespace RangeReduce.Patterns.Tables;

/// <summary>Splits a line of headings into as many as there are columns.</summary>
internal static class HeadingSplitter
{
    /// <summary>Splits by the separator of the samples and, for a table that blanks separate, by any way that gives the right number.</summary>
    /// <returns>The headings and their columns from 1; null where no way gives that number.</returns>
    public static List<(string Text, int Column)>? Split(HeadLine line, Dialect dialect, int count)
    {
        var text = line.Text;
        var offset = 0;
        if (line.IsComment)
        {
            offset = text.Length - text.TrimStart().TrimStart('#', '!', '%', '/').TrimStart().Length;
            text = text[offset..];
        }

        var fields = FieldSplitter.Split(text, dialect.Separator);
        if (Fits(fields, count) is not { } fit)
        {
            fit = dialect.IsBlanks ? Fits(Wide(text), count) ?? Fits(Merged(fields), count) ?? OtherSeparator(text, count) : null;
        }

        return fit?.ConvertAll(field => (field.Text, field.Column + offset));
    }

    private static List<(string Text, int Column)>? OtherSeparator(string text, int count)
    {
        foreach (var separator in Dialect.Separators)
        {
            if (separator != ' ' && Fits(FieldSplitter.Split(text, separator), count) is { } fit)
            {
                return fit;
            }
        }

        return null;
    }

    /// <summary>Takes a list of the right length, or one that is longer by empty fields at its end.</summary>
    private static List<(string Text, int Column)>? Fits(List<(string Text, int Column)> fields, int count)
    {
        while (fields.Count > count && fields[^1].Text.Length == 0)
        {
            fields.RemoveAt(fields.Count - 1);
        }

        return fields.Count == count ? fields : null;
    }

    /// <summary>Splits where two blanks or a tab stand.</summary>
    private static List<(string Text, int Column)> Wide(string text)
    {
        var marked = text.Replace('\t', '\u001F').Replace("  ", "\u001F\u001F", StringComparison.Ordinal);
        return FieldSplitter.Split(marked, '\u001F').Where(field => field.Text.Length > 0).ToList();
    }

    /// <summary>Joins a unit in brackets, and a part or unit without them, to the word before it.</summary>
    private static List<(string Text, int Column)> Merged(List<(string Text, int Column)> fields)
    {
        var merged = new List<(string Text, int Column)>();
        foreach (var field in fields)
        {
            if (merged.Count > 0 && (field.Text is ['[' or '(' or '{', ..] || HeadingUnit.TryParseBare(field.Text, out _)))
            {
                merged[^1] = ($"{merged[^1].Text} {field.Text}", merged[^1].Column);
            }
            else
            {
                merged.Add(field);
            }
        }

        return merged;
    }
}
