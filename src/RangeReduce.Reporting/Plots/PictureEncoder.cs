using System.Buffers.Binary;
using System.IO.Compression;
using System.Runtime.InteropServices;
using System.Text;

namespace RangeReduce.Reporting.Plots;

/// <summary>Writes an opaque picture as PNG (ISO/IEC 15948) with its resolution. Made for plots: few colours, long runs.</summary>
/// <remarks>The general encoder of the drawing library spends more time on a plot than the drawing, and does not state a resolution.</remarks>
internal static class PictureEncoder
{
    private static readonly byte[] Signature = [0x89, (byte)'P', (byte)'N', (byte)'G', 0x0D, 0x0A, 0x1A, 0x0A];
    private static readonly uint[] Crc = MakeCrc();

    /// <summary>Encodes a picture.</summary>
    /// <param name="rgba">Pixels by rows, four bytes each; the fourth is ignored.</param>
    /// <param name="width">Width in pixels.</param>
    /// <param name="height">Height in pixels.</param>
    /// <param name="rowBytes">Distance of the rows in bytes.</param>
    /// <param name="dotsPerInch">Resolution.</param>
    public static byte[] Encode(ReadOnlySpan<byte> rgba, int width, int height, int rowBytes, double dotsPerInch)
    {
        using var png = new MemoryStream();
        png.Write(Signature);
        Span<byte> header = stackalloc byte[13];
        BinaryPrimitives.WriteInt32BigEndian(header, width);
        BinaryPrimitives.WriteInt32BigEndian(header[4..], height);
        (header[8], header[9]) = (8, 3); // eight bits a pixel, an index into the palette
        WriteChunk(png, "IHDR", header);
        Span<byte> resolution = stackalloc byte[9];
        var dotsPerMetre = (int)Math.Round(dotsPerInch / 0.0254);
        BinaryPrimitives.WriteInt32BigEndian(resolution, dotsPerMetre);
        BinaryPrimitives.WriteInt32BigEndian(resolution[4..], dotsPerMetre);
        resolution[8] = 1; // the metre
        WriteChunk(png, "pHYs", resolution);
        var palette = new PicturePalette();
        var data = Compress(rgba, width, height, rowBytes, palette);
        WriteChunk(png, "PLTE", palette.ToBytes());
        WriteChunk(png, "IDAT", data);
        WriteChunk(png, "IEND", []);
        return png.ToArray();
    }

    // Rows of indices without filter: a plot is mostly runs of one colour, and a row mostly equals the one above.
    private static byte[] Compress(ReadOnlySpan<byte> rgba, int width, int height, int rowBytes, PicturePalette palette)
    {
        using var data = new MemoryStream();
        using (var zlib = new ZLibStream(data, CompressionLevel.Fastest, leaveOpen: true))
        {
            var row = new byte[1 + width];
            for (var y = 0; y < height; y++)
            {
                var pixels = MemoryMarshal.Cast<byte, uint>(rgba.Slice(y * rowBytes, 4 * width));
                var at = 0;
                while (at < width)
                {
                    var end = pixels[at..].IndexOfAnyExcept(pixels[at]);
                    end = end < 0 ? width : at + end;
                    row.AsSpan(1 + at, end - at).Fill(palette.IndexOf(pixels[at]));
                    at = end;
                }

                zlib.Write(row);
            }
        }

        return data.ToArray();
    }

    private static void WriteChunk(MemoryStream png, string type, ReadOnlySpan<byte> data)
    {
        Span<byte> number = stackalloc byte[4];
        BinaryPrimitives.WriteInt32BigEndian(number, data.Length);
        png.Write(number);
        var name = Encoding.ASCII.GetBytes(type);
        png.Write(name);
        png.Write(data);
        BinaryPrimitives.WriteUInt32BigEndian(number, ~Add(Add(uint.MaxValue, name), data));
        png.Write(number);
    }

    private static uint Add(uint crc, ReadOnlySpan<byte> data)
    {
        foreach (var value in data)
        {
            crc = Crc[(byte)(crc ^ value)] ^ (crc >> 8);
        }

        return crc;
    }

    // Table of the cyclic redundancy check, polynomial 0xEDB88320 (ISO/IEC 15948, annex D).
    private static uint[] MakeCrc()
    {
        var table = new uint[256];
        for (var at = 0u; at < table.Length; at++)
        {
            var value = at;
            for (var bit = 0; bit < 8; bit++)
            {
                value = (value & 1) == 0 ? value >> 1 : 0xEDB88320u ^ (value >> 1);
            }

            table[at] = value;
        }

        return table;
    }
}
