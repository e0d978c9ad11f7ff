namespace RangeReduce.Networks.Touchstone;

/// <summary>Goes through the items of a line, which white space separates.</summary>
internal ref struct ItemCursor(ReadOnlySpan<byte> text)
{
    private ReadOnlySpan<byte> _rest = text;

    /// <summary>Gives the next item; none at the end of the line.</summary>
    public bool Next(out ReadOnlySpan<byte> item)
    {
        var start = 0;
        while (start < _rest.Length && _rest[start] is (byte)' ' or (byte)'\t')
        {
            start++;
        }

        var end = start;
        while (end < _rest.Length && _rest[end] is not ((byte)' ' or (byte)'\t'))
        {
            end++;
        }

        item = _rest[start..end];
        _rest = _rest[end..];
        return item.Length > 0;
    }
}
