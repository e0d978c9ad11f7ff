using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Reads one key column: a cell that says the same as in the row before is not parsed again.</summary>
internal sealed class KeyReader(TableContext context, TableKey key, KeyIndex index)
{
    private readonly byte[] _text = new byte[32];
    private readonly byte _decimal = (byte)context.Head.Dialect.Decimal;
    private int _length = -1;
    private int _last;

    /// <summary>Reads a cell.</summary>
    /// <returns>Index of the value among the distinct values; -1 where the cell holds no number.</returns>
    /// <exception cref="MeasurementDataException">The value is none that this key can have.</exception>
    public int Read(ReadOnlySpan<byte> cell, RowSource row)
    {
        if (cell.Length == _length && cell.SequenceEqual(_text.AsSpan(0, _length)))
        {
            return _last;
        }

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

        _last = index.Find(isFrequency ? Whole(value) : WholeMicro(value));
        _length = cell.Length <= _text.Length ? cell.Length : -1;
        cell[..Math.Max(0, _length)].CopyTo(_text);
        return _last;
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
