using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Breaks text into lines at spaces and behind hyphens; a word wider than the line is broken between letters.</summary>
internal static class TextWrapper
{
    /// <summary>Height of a line over the size of the letters.</summary>
    public const float Leading = 1.32f;

    /// <summary>Gives the face of a span.</summary>
    public static TextFace FaceOf(TextSpan span) => span.Code ? TextFace.Mono : span.Strong ? TextFace.Bold : TextFace.Regular;

    /// <summary>Gives the size of a span: letters of equal width look large beside the others and are set smaller.</summary>
    public static float SizeOf(TextSpan span, float size) => span.Code ? 0.86f * size : size;

    /// <summary>Gives the width of the text on one line.</summary>
    public static float Natural(RichText text, float size) => text.Spans.Sum(span => TextMeter.Width(span.Text, FaceOf(span), SizeOf(span, size)));

    /// <summary>Gives the width of the widest word.</summary>
    public static float WidestWord(RichText text, float size) =>
        text.Spans.SelectMany(span => Words(span.Text).Select(word => TextMeter.Width(word.TrimEnd(' '), FaceOf(span), SizeOf(span, size)))).DefaultIfEmpty(0f).Max();

    /// <summary>Breaks a text into lines.</summary>
    public static IReadOnlyList<TextLine> Wrap(RichText text, float size, float width)
    {
        var lines = new List<TextLine>();
        var line = new List<PlacedWord>();
        var at = 0f;
        foreach (var span in text.Spans)
        {
            var (face, own) = (FaceOf(span), SizeOf(span, size));
            foreach (var word in Words(span.Text))
            {
                var rest = word;
                while (rest.Length > 0)
                {
                    var needed = TextMeter.Width(rest.TrimEnd(' '), face, own);
                    if (at + needed <= width + 0.01f)
                    {
                        var whole = TextMeter.Width(rest, face, own);
                        line.Add(new(rest, span, at, whole));
                        at += whole;
                        break;
                    }

                    if (at > 0f)
                    {
                        lines.Add(Ended(line));
                        (line, at) = ([], 0f);
                        continue;
                    }

                    var taken = LettersThatFit(rest, face, own, width);
                    line.Add(new(rest[..taken], span, 0f, TextMeter.Width(rest[..taken], face, own)));
                    lines.Add(Ended(line));
                    (line, rest) = ([], rest[taken..]);
                }
            }
        }

        if (line.Count > 0)
        {
            lines.Add(Ended(line));
        }

        return lines;
    }

    // The pieces of one span are drawn as one string: the text of the page stays whole for a reader that copies or searches it.
    private static TextLine Ended(List<PlacedWord> words)
    {
        var joined = new List<PlacedWord>();
        foreach (var word in words)
        {
            if (joined.Count > 0 && ReferenceEquals(joined[^1].Span, word.Span))
            {
                joined[^1] = joined[^1] with { Text = joined[^1].Text + word.Text, Width = joined[^1].Width + word.Width };
            }
            else
            {
                joined.Add(word);
            }
        }

        return new(joined);
    }

    // Each word keeps the spaces behind it; a hyphen, a slash or an underscore ends a part of a word.
    private static IEnumerable<string> Words(string text)
    {
        var start = 0;
        for (var at = 1; at < text.Length; at++)
        {
            if (text[at] != ' ' && (text[at - 1] == ' ' || (text[at - 1] is '-' or '/' or '_' && at > start + 3 && char.IsLetterOrDigit(text[at]))))
            {
                yield return text[start..at];
                start = at;
            }
        }

        if (start < text.Length)
        {
            yield return text[start..];
        }
    }

    private static int LettersThatFit(string word, TextFace face, float size, float width)
    {
        var count = 1;
        while (count < word.Length && TextMeter.Width(word[..(count + 1)], face, size) <= width)
        {
            count++;
        }

        // Where a number with its uncertainty is too wide for its column after all, it is parted before the sign and not between digits.
        var space = word.LastIndexOf(Formatting.UnitText.NoBreakSpace, count - 1);
        return space > 0 && count < word.Length ? space : count;
    }
}
