using System.Text;

namespace RangeReduce.Patterns.Tables;

/// <summary>Finds where the preamble ends, which line holds the headings, and how fields and decimals are written.</summary>
internal static class TableHeadFinder
{
    private const int RowsLookedAt = 400;

    /// <summary>Looks through the head of a file.</summary>
    /// <returns>Null where nothing looks like rows of numbers under a line of headings; <paramref name="bare"/> then tells of rows without headings.</returns>
    public static TableHead? Find(byte[] bytes, bool isWhole, IReadOnlyDictionary<string, string> laidDown, out (HeadLine Line, int Fields)? bare)
    {
        var lines = HeadLine.Split(bytes, isWhole);
        bare = null;
        var samples = new HashSet<int>();
        for (var at = 0; at < lines.Count; at++)
        {
            if (lines[at].IsComment || string.IsNullOrWhiteSpace(lines[at].Text) || Probe(lines[at].Text) is not { } probe)
            {
                continue;
            }

            samples.Add(at);
            var dialect = new Dialect(probe.Separator, DecimalSign(lines, at, probe.Separator));
            var heading = HeadingOver(lines, samples, laidDown, dialect, probe.Fields);

            // A separator at the end of each row makes an empty last field without a heading.
            heading ??= probe.EndsEmpty ? HeadingOver(lines, samples, laidDown, dialect, probe.Fields - 1) : null;
            if (heading is { } found)
            {
                return Make(lines, at, dialect, found.Texts.Count, found);
            }

            bare ??= probe.AllNumbers ? (lines[at], probe.Fields) : null;
            if (laidDown.Count > 0 && bare is { } first)
            {
                return Make(lines, at, dialect, first.Fields, (-1, -1, [], []));
            }
        }

        return null;
    }

    /// <summary>Finds the separator under which a line is a row of samples; null where there is none.</summary>
    private static (char Separator, int Fields, bool AllNumbers, bool EndsEmpty)? Probe(string line)
    {
        (char Separator, int Fields, bool AllNumbers, bool EndsEmpty)? best = null;
        foreach (var separator in Dialect.Separators)
        {
            var fields = FieldSplitter.Split(line, separator);
            var numbers = fields.Count(field => IsNumber(field.Text, separator));
            var filled = fields.Count(field => field.Text.Length > 0);
            var missing = fields.Count(field => field.Text.Length > 0 && !IsNumber(field.Text, separator) && CellText.IsMissing(Encoding.UTF8.GetBytes(field.Text)));
            if (fields.Count < 2 || numbers == 0 || 2 * (numbers + missing) < filled || filled < 2)
            {
                continue;
            }

            // Texts between the numbers are spare columns, unless they are headings of the wide form.
            var all = numbers + missing == filled;
            if (!all && fields.Exists(field => !IsNumber(field.Text, separator) && field.Text.Exists(char.IsLetter) && (HeadingParser.Parse(field.Text).IsKnown || HeadingResolver.TryCorner(field.Text, out _, out _))))
            {
                continue;
            }

            if (best is null || (all && !best.Value.AllNumbers))
            {
                best = (separator, fields.Count, all, fields[^1].Text.Length == 0);
            }
        }

        return best;
    }

    private static bool IsNumber(string text, char separator) =>
        text.Length is > 0 and < 64 && Encoding.UTF8.GetBytes(text) is var bytes
        && (IsNumber(bytes, '.') || (separator != ',' && IsNumber(bytes, ',')));

    private static bool IsNumber(byte[] bytes, char sign) => CellText.TryNumber(bytes, (byte)sign, out _) || CellText.TryOddNumber(bytes, (byte)sign, out _);

    private static char DecimalSign(List<HeadLine> lines, int from, char separator)
    {
        if (separator == ',')
        {
            return '.';
        }

        foreach (var line in lines.Skip(from).Take(RowsLookedAt).Where(line => !line.IsComment))
        {
            foreach (var (text, _) in FieldSplitter.Split(line.Text, separator))
            {
                var sign = text.IndexOfAny(['.', ',']);
                if (sign >= 0 && IsNumber(text, separator))
                {
                    return text[sign];
                }
            }
        }

        return '.';
    }

    /// <summary>Finds the nearest line over the samples that reads as headings of the right number.</summary>
    private static (int Names, int Units, List<string> Texts, List<int> Columns)? HeadingOver(List<HeadLine> lines, HashSet<int> samples, IReadOnlyDictionary<string, string> laidDown, Dialect dialect, int count)
    {
        var data = samples.Max();
        var units = -1;
        List<string>? unitTexts = null;
        for (var at = data - 1; at >= 0 && at >= data - 12; at--)
        {
            var line = lines[at];
            if (samples.Contains(at) || string.IsNullOrWhiteSpace(line.Content) || HeadingSplitter.Split(line, dialect, count) is not { } fields)
            {
                continue;
            }

            var texts = fields.ConvertAll(field => field.Text);
            if (units < 0 && at > 0 && texts.TrueForAll(text => text.Length == 0 || HeadingUnit.TryParse(HeadingParser.Plain(text).AsSpan().Trim("[](){}"), out _)) && texts.Exists(text => text.Length > 0))
            {
                (units, unitTexts) = (at, texts);
                continue;
            }

            if (unitTexts is not null)
            {
                texts = WithUnits(texts, unitTexts);
            }

            var known = texts.Where((text, column) => HeadingParser.Parse(text).IsKnown || (column == 0 && HeadingResolver.TryCorner(text, out _, out _)) || HeadingResolver.LaidDownMeaning(laidDown, text, column) is not null).Count();
            var words = texts.Exists(text => text.Exists(char.IsLetter));
            if (words && known >= 1 && 2 * known >= texts.Count(text => text.Length > 0))
            {
                return (at, units, texts, fields.ConvertAll(field => field.Column));
            }
        }

        return null;
    }

    private static List<string> WithUnits(List<string> names, List<string> units)
    {
        var joined = new List<string>(names.Count);
        var group = string.Empty;
        for (var at = 0; at < names.Count; at++)
        {
            // A name that spans several columns is written over the first of them.
            group = names[at].Length > 0 ? names[at] : group;
            var unit = HeadingParser.Plain(units[at]).Trim('[', ']', '(', ')', '{', '}');
            joined.Add(unit.Length > 0 ? $"{group} [{unit}]" : group);
        }

        return joined;
    }

    private static TableHead Make(List<HeadLine> lines, int data, Dialect dialect, int count, (int Names, int Units, List<string> Texts, List<int> Columns) heading)
    {
        var metadata = new Dictionary<string, string>(StringComparer.Ordinal);
        var titles = 0;
        for (var at = 0; at < data; at++)
        {
            if (at == heading.Names || at == heading.Units || string.IsNullOrWhiteSpace(lines[at].Content))
            {
                continue;
            }

            if (MetadataLine.TryParse(lines[at].Content, out var key, out var value))
            {
                metadata.TryAdd(key, value);
            }
            else if (!lines[at].IsComment)
            {
                titles++;
            }
        }

        return new()
        {
            Dialect = dialect,
            Headings = heading.Texts,
            HeadingColumns = heading.Columns,
            HeadingLine = heading.Names < 0 ? 0 : lines[heading.Names].Number,
            HeadingText = heading.Names < 0 ? string.Empty : lines[heading.Names].Text.Trim(),
            FieldCount = count,
            DataLine = lines[data].Number,
            DataStart = lines[data].Start,
            Metadata = metadata,
            TitleLines = titles,
        };
    }

    private static bool Exists(this string text, Func<char, bool> test) => text.Any(test);
}
