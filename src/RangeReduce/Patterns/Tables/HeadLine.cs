namespace RangeReduce.Patterns.Tables;

/// <summary>One line of the head of a table; its text is made when somebody asks for it.</summary>
internal sealed class HeadLine
{
    private readonly byte[] _head;
    private readonly int _length;
    private string? _text;

    private HeadLine(int number, byte[] head, int start, int length) => (Number, _head, Start, _length) = (number, head, start, length);

    /// <summary>Gets the line number from 1.</summary>
    public int Number { get; }

    /// <summary>Gets the offset of the first byte in the head.</summary>
    public int Start { get; }

    /// <summary>Gets the line without its break.</summary>
    public string Text => _text ??= CellText.Decode(_head.AsSpan(Start, _length));

    /// <summary>Gives whether the line is marked as a comment.</summary>
    public bool IsComment => Text.AsSpan().TrimStart() is ['#' or '!' or '%', ..] or ['/', '/', ..];

    /// <summary>Gives the line without its comment mark.</summary>
    public string Content => IsComment ? Text.Trim().TrimStart('#', '!', '%', '/').Trim() : Text.Trim();

    /// <summary>Makes a line of bytes that were read elsewhere.</summary>
    public static HeadLine Of(int number, ReadOnlySpan<byte> bytes) => new(number, bytes.ToArray(), 0, bytes.Length);

    /// <summary>Splits a head into lines; the last one is left out where the head may end inside it.</summary>
    public static List<HeadLine> Split(byte[] head, bool isWhole)
    {
        var lines = new List<HeadLine>();
        var start = 0;
        while (start < head.Length)
        {
            var length = head.AsSpan(start).IndexOfAny((byte)'\r', (byte)'\n');
            if (length < 0 && !isWhole)
            {
                break;
            }

            length = length < 0 ? head.Length - start : length;
            lines.Add(new(lines.Count + 1, head, start, length));
            start += length;
            start += start + 1 < head.Length && head[start] == '\r' && head[start + 1] == '\n' ? 2 : 1;
        }

        return lines;
    }
}
