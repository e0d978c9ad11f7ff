using System.Text;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Reads Touchstone files of versions 1.0, 1.1, 2.0 and 2.1 (IBIS Open Forum, Touchstone File Format Specification).</summary>
public static class TouchstoneReader
{
    /// <summary>Reads a file.</summary>
    /// <param name="path">Path for opening.</param>
    /// <param name="displayPath">Path for messages; its ending .sNp tells the number of ports.</param>
    /// <param name="options">Limits; null for the usual ones.</param>
    /// <exception cref="MeasurementDataException">The file is wrong; the error says line and column.</exception>
    /// <exception cref="IOException">The file cannot be read.</exception>
    public static TouchstoneFile Read(string path, string displayPath, TouchstoneOptions? options = null)
    {
        options ??= new();
        using var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 0, FileOptions.SequentialScan);
        RefuseBinary(stream, displayPath);
        if (stream.Length > options.LargestFile)
        {
            throw TouchstoneErrors.TooMuch(new(displayPath), FormattableString.Invariant($"a file of {stream.Length} bytes"), FormattableString.Invariant($"at most {options.LargestFile}"));
        }

        stream.Position = 0;
        var bytes = new byte[stream.Length];
        stream.ReadExactly(bytes);
        return Parse(bytes, displayPath, options);
    }

    /// <summary>Reads a text that is in memory.</summary>
    /// <param name="bytes">The text.</param>
    /// <param name="displayPath">Path for messages; its ending .sNp tells the number of ports.</param>
    /// <param name="options">Limits; null for the usual ones.</param>
    /// <exception cref="MeasurementDataException">The text is wrong; the error says line and column.</exception>
    public static TouchstoneFile Parse(ReadOnlySpan<byte> bytes, string displayPath, TouchstoneOptions? options = null)
    {
        var remarks = new List<Remark>();
        var text = Decoded(bytes, displayPath, remarks);
        var zero = text.IndexOf((byte)0);
        if (zero >= 0)
        {
            var before = text[..zero];
            throw TouchstoneErrors.NotText(new(displayPath, before.Count((byte)'\n') + 1, zero - (before.LastIndexOf((byte)'\n') + 1) + 1));
        }

        return new TouchstoneParser(displayPath, options ?? new(), remarks).Parse(text);
    }

    /// <summary>Tells by its first bytes whether a file seems to be Touchstone: its first line that is neither blank nor comment begins with # and options or with [Version].</summary>
    /// <param name="head">The first bytes of the file, cut anywhere.</param>
    public static bool LooksLikeTouchstone(ReadOnlySpan<byte> head)
    {
        var lines = new LineCursor(Decoded(head, string.Empty, []), string.Empty);
        while (lines.Next())
        {
            var line = lines.Line.Trim(" \t"u8);
            if (line.Length == 0 || line[0] == (byte)'!')
            {
                continue;
            }

            if (line[0] == (byte)'[')
            {
                return Ascii.EqualsIgnoreCase(line[..Math.Min(9, line.Length)], "[version]"u8);
            }

            return line[0] == (byte)'#' && IsOptionLine(line[1..], lines);
        }

        return false;
    }

    private static bool IsOptionLine(ReadOnlySpan<byte> text, LineCursor line)
    {
        // Tables start comments with # too: an option line has nothing but options.
        var comment = text.IndexOf((byte)'!');
        try
        {
            _ = OptionLine.Read(comment < 0 ? text : text[..comment], line, (_, _) => { });
            return true;
        }
        catch (MeasurementDataException)
        {
            // A wrong option line is still one if it names a format: better its error than a silent pass.
            var items = new ItemCursor(text);
            while (items.Next(out var item))
            {
                if (Ascii.EqualsIgnoreCase(item, "ma"u8) || Ascii.EqualsIgnoreCase(item, "ri"u8) || Ascii.EqualsIgnoreCase(item, "db"u8))
                {
                    return true;
                }
            }

            return false;
        }
    }

    private static ReadOnlySpan<byte> Decoded(ReadOnlySpan<byte> bytes, string file, List<Remark> remarks)
    {
        if (bytes.StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]))
        {
            remarks.Add(new(RemarkSeverity.Note, "byte-order-mark", "The file begins with a byte-order mark, which was passed over.", new(file, 1)));
            return bytes[3..];
        }

        var isLittle = bytes.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]);
        if (isLittle || bytes.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            remarks.Add(new(RemarkSeverity.Note, "utf-16", "The file is written in UTF-16 and was read as such.", new(file, 1)));
            return Encoding.UTF8.GetBytes((isLittle ? Encoding.Unicode : Encoding.BigEndianUnicode).GetString(bytes[2..]));
        }

        return bytes;
    }

    private static void RefuseBinary(FileStream stream, string displayPath)
    {
        Span<byte> head = stackalloc byte[4096];
        var read = stream.ReadAtLeast(head, head.Length, throwOnEndOfStream: false);
        if (!head.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) && !head.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]) && head[..read].Contains((byte)0))
        {
            throw TouchstoneErrors.NotText(new(displayPath, 1, 1));
        }
    }
}
