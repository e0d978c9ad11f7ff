using System.Text;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>The bytes of a table as UTF-8 (or an older one-byte encoding): a head that was read ahead, and all of it as a stream.</summary>
internal sealed class TableInput
{
    /// <summary>How much is read ahead: preamble, heading and the first rows have to fit in.</summary>
    internal const int HeadBytes = 256 * 1024;

    private readonly Stream _rest;
    private readonly byte[] _head;

    private TableInput(byte[] head, bool whole, Stream rest) => (_head, IsWhole, _rest) = (head, whole, rest);

    /// <summary>Gets the first bytes, without a byte order mark.</summary>
    public byte[] Head => _head;

    /// <summary>Gets whether the head is all there is.</summary>
    public bool IsWhole { get; }

    /// <summary>Reads ahead and undoes UTF-16.</summary>
    /// <exception cref="MeasurementDataException">The content is not text.</exception>
    public static TableInput Open(Stream stream, string file, List<Remark> remarks)
    {
        var start = ReadUpTo(stream, 4);
        Encoding? wide = start switch
        {
            [0xFF, 0xFE, 0, 0] => throw TableFaults.Utf32(file),
            [0xFF, 0xFE, ..] => Encoding.Unicode,
            [0xFE, 0xFF, ..] => Encoding.BigEndianUnicode,
            [not 0, 0, not 0, 0] => Encoding.Unicode,
            [0, not 0, 0, not 0] => Encoding.BigEndianUnicode,
            _ => null,
        };
        Stream text = new HeadedStream(start, stream);
        if (wide is not null)
        {
            text = Encoding.CreateTranscodingStream(text, wide, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false), leaveOpen: true);
            remarks.Add(new(RemarkSeverity.Note, "utf-16", "The file is written in UTF-16 and was read as such.", new(file)));
        }

        var head = ReadUpTo(text, HeadBytes);
        var whole = head.Length < HeadBytes;
        if (head.AsSpan().StartsWith("\uFEFF"u8))
        {
            head = head[3..];
        }

        var nul = head.AsSpan().IndexOf((byte)0);
        return nul < 0 ? new(head, whole, text) : throw TableFaults.Binary(file, nul);
    }

    /// <summary>Gives everything from one place of the head on; may be called once.</summary>
    /// <param name="offset">Number of bytes of the head to leave out.</param>
    public Stream From(int offset) => new HeadedStream(_head.AsMemory(offset), _rest);

    private static byte[] ReadUpTo(Stream stream, int limit)
    {
        var buffer = new byte[limit];
        var got = stream.ReadAtLeast(buffer, limit, throwOnEndOfStream: false);
        return got == limit ? buffer : buffer[..got];
    }
}
