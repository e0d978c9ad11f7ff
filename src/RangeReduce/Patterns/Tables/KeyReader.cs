using System.Buffers.Binary;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Reads one key column: a cell that says the same as in the row before is not parsed again.</summary>
internal sealed class KeyReader(TableContext context, TableKey key, KeyIndex index)
{
    private readonly byte _decimal = (byte)context.Head.Dialect.Decimal;
    private ulong[] _texts = new ulong[64];
    private int _last;

    /// <summary>Reads a cell.</summary>
    /// <returns>Index of the value among the distinct values; -1 where the cell holds no number.</returns>
    /// <exception cref="MeasurementDataException">The value is none that this key can have.</exception>
    public int Read(ReadOnlySpan<byte> cell, RowSource row)
    {
        var text = Packed(cell);
        if (text != 0)
        {
            if (_texts[_last] == text)
            {
                return _last;
            }

            // A table mostly stays, steps on or starts again.
            if (_last + 1 < _texts.Length && _texts[_last + 1] == text)
            {
                return ++_last;
            }

            if (_texts[0] == text)
            {
                return _last = 0;
            }
        }

        var found = Parsed(cell, row);
        if (found < 0)
        {
            return found;
        }

        if (found >= _texts.Length)
        {
            Array.Resize(ref _texts, Math.Max(found + 1, 2 * _texts.Length));
        }

        _texts[found] = text;
        return _last = found;
    }

    /// <summary>Gives up to seven bytes and their number as one word; 0 for a longer cell.</summary>
    private static ulong Packed(ReadOnlySpan<byte> cell)
    {
        if (cell.Length > 7)
        {
            return 0;
        }

        var word = (ulong)cell.Length << 56;
        if (cell.Length >= 4)
        {
            // The first four bytes and the last three: together all of them, at least once.
            return word | BinaryPrimitives.ReadUInt32LittleEndian(cell) | ((ulong)(BinaryPrimitives.ReadUInt32LittleEndian(cell[^4..]) >> 8) << 32);
        }

        for (var at = 0; at < cell.Length; at++)
        {
            word |= (ulong)cell[at] << (8 * at);
        }

        return word;
    }

    private int Parsed(ReadOnlySpan<byte> cell, RowSource row)
    {
        if (!CellText.TryNumber(cell, _decimal, out var value) && !CellText.TryNumber(CellText.Trimmed(cell), _decimal, out value) && !CellText.TryOddNumber(CellText.Trimmed(cell), _decimal, out value))
        {
            return -1;
        }

        value *= key.Factor;
        var isFrequency = key.Kind == HeadingKind.Frequency;
        if (!double.IsFinite(value) || (isFrequency ? value <= 0.0 : Math.Abs(value) > 720.0))
        {
            throw TableFaults.KeyOutOfRange(row.Place(key.Column), cell, context, key);
        }

        return index.Find(isFrequency ? Whole(value) : WholeMicro(value));
    }

    /// <summary>Takes the last-digit noise of the change of unit off, so that 1.62 GHz and 1620 MHz are the same.</summary>
    internal static double Whole(double frequencyHz)
    {
        var whole = Math.Round(frequencyHz);
        return Math.Abs(whole - frequencyHz) <= 4e-16 * whole ? whole : frequencyHz;
    }

    private double WholeMicro(double angleDeg)
    {
        var whole = Math.Round(angleDeg, 6);
        return key.Factor != 1.0 && Math.Abs(whole - angleDeg) <= 1e-10 ? whole : angleDeg;
    }
}
