using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Goes through the lines of a text, ended by CR, LF or CR LF, and knows where it is.</summary>
internal ref struct LineCursor(ReadOnlySpan<byte> bytes, string file)
{
    private readonly ReadOnlySpan<byte> _bytes = bytes;
    private readonly string _file = file;
    private int _next;

    /// <summary>Gets the number of the line, from 1.</summary>
    public int Number { get; private set; }

    /// <summary>Gets the line without its end.</summary>
    public ReadOnlySpan<byte> Line { get; private set; }

    /// <summary>Goes to the next line; false at the end of the text.</summary>
    public bool Next()
    {
        if (_next >= _bytes.Length)
        {
            return false;
        }

        Number++;
        var rest = _bytes[_next..];
        var length = rest.IndexOfAny((byte)'\n', (byte)'\r');
        if (length < 0)
        {
            Line = rest;
            _next = _bytes.Length;
            return true;
        }

        Line = rest[..length];
        _next += length + (rest[length] == (byte)'\r' && length + 1 < rest.Length && rest[length + 1] == (byte)'\n' ? 2 : 1);
        return true;
    }

    /// <summary>Gives the place of the first character of the line that is not blank.</summary>
    public readonly SourcePlace Place() => new(_file, Number, Math.Max(Line.IndexOfAnyExcept((byte)' ', (byte)'\t'), 0) + 1);

    /// <summary>Gives the place of an item, which must be a part of the line.</summary>
    public readonly SourcePlace PlaceOf(ReadOnlySpan<byte> item)
    {
        var offset = (long)Unsafe.ByteOffset(ref MemoryMarshal.GetReference(Line), ref MemoryMarshal.GetReference(item));
        return new(_file, Number, (int)Math.Clamp(offset, 0, Line.Length) + 1);
    }
}
