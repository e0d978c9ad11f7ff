namespace RangeReduce.Patterns.Tables;

/// <summary>One line of the head of a table.</summary>
/// <param name="Number">Line number from 1.</param>
/// <param name="Start">Offset of its first byte in the head.</param>
/// <param name="Text">The line without its break.</param>
internal readonly record struct HeadLine(int Number, int Start, string Text)
{
    /// <summary>Gives whether the line is marked as a comment.</summary>
    public bool IsComment => Text.AsSpan().TrimStart() is ['#' or '!' or '%', ..] or ['/', '/', ..];

    /// <summary>Gives the line without its comment mark.</summary>
    public string Content => IsComment ? Text.Trim().TrimStart('#', '!', '%', '/').Trim() : Text.Trim();

    /// <summary>Splits a head into lines; the last one is left out where the head may end inside it.</summary>
    public static List<HeadLine> Split(ReadOnlySpan<byte> head, bool isWhole)
    {
        var lines = new List<HeadLine>();
        var start = 0;
        while (start < head.Length)
        {
            var length = head[start..].IndexOfAny((byte)'\r', (byte)'\n');
            if (length < 0 && !isWhole)
            {
                break;
            }

            length = length < 0 ? head.Length - start : length;
            lines.Add(new(lines.Count + 1, start, CellText.Decode(head.Slice(start, length))));
            start += length;
            start += start + 1 < head.Length && head[start] == '\r' && head[start + 1] == '\n' ? 2 : 1;
        }

        return lines;
    }
}
