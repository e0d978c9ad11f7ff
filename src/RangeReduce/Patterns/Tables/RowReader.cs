using System.Globalization;
using CsvHelper;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Reads the rows of a table into a store.</summary>
internal sealed class RowReader
{
    private readonly TableContext _context;
    private readonly TablePlan _plan;
    private readonly SampleStore _store;
    private readonly RowSource _rows;
    private readonly KeyReader?[] _keys = new KeyReader?[3];
    private readonly int[] _fixed = new int[3];
    private readonly int[] _keyColumns = new int[3];
    private readonly int[] _columns;
    private readonly double[] _low;
    private readonly double[] _high;
    private readonly MissingSamples _missing;
    private readonly byte _decimal;
    private bool _oddNumbers;
    private long _emptyRows;

    /// <summary>Makes a reader.</summary>
    public RowReader(TableContext context, TablePlan plan, SampleStore store, RowSource rows)
    {
        (_context, _plan, _store, _rows) = (context, plan, store, rows);
        _decimal = (byte)context.Head.Dialect.Decimal;
        _missing = new(context, plan.Values);
        _columns = [.. plan.Values.Select(value => value.Column)];
        (_low, _high) = (new double[plan.Values.Count], new double[plan.Values.Count]);
        for (var at = 0; at < plan.Values.Count; at++)
        {
            // Inside these bounds a number needs no second look.
            _high[at] = 999.0;
            _low[at] = plan.Values[at].Part switch
            {
                ChannelPart.Amplitude or ChannelPart.Power => 0.0,
                ChannelPart.StandingWaveRatio => 1.0,
                _ => -999.0,
            };
        }

        for (var slot = 0; slot < 3; slot++)
        {
            var key = plan.Keys[slot];
            _keys[slot] = key.Column >= 0 ? new KeyReader(context, key, store.Keys[slot]) : null;
            _keyColumns[slot] = key.Column;
            _fixed[slot] = key.Column >= 0 ? -1 : key.IsAcross ? 0 : store.Keys[slot].Find(key.Fixed);
        }
    }

    /// <summary>Reads all rows.</summary>
    /// <exception cref="MeasurementDataException">A row is not what the headings promise.</exception>
    public void ReadAll()
    {
        var most = Math.Min(_context.Options.MaxSamples / Math.Max(1, _columns.Length), int.MaxValue - 1);
        try
        {
            ReadRows(most);
        }
        catch (Exception fault) when (fault is CsvFormatException or InvalidDataException)
        {
            throw TableFaults.LineTooLong(new(_context.File), _context.Options.MaxLineBytes, fault.Message);
        }

        _missing.Finish(_store);
        if (_oddNumbers)
        {
            _context.Note("number-spelling", "Numbers with Fortran exponents (1.0D+03) or typographic minus signs were read as they are meant.", new(_context.File));
        }

        if (_emptyRows > 0)
        {
            _context.Note("empty-rows", string.Create(CultureInfo.InvariantCulture, $"{_emptyRows} rows of nothing but separators were passed over."), new(_context.File));
        }

        if (_store.Rows == 0)
        {
            throw TableFaults.NoRows(_context.HeadingsPlace);
        }
    }

    private void ReadRows(long most)
    {
        var expected = _context.Head.FieldCount;
        while (_rows.Read())
        {
            if ((_rows.Count != expected && !IsRow(expected)) || !Key(0, out var frequency) || !Key(1, out var first) || !Key(2, out var second) || !Samples())
            {
                continue;
            }

            if (_store.Rows >= most)
            {
                throw TableFaults.TooManySamples(new(_context.File, _rows.Line), _context.Options.MaxSamples);
            }

            _store.AddRow(_rows.Line, frequency, first, second);
        }
    }

    private bool Key(int slot, out int index)
    {
        index = _fixed[slot];
        if (_keys[slot] is not { } reader)
        {
            return true;
        }

        var column = _keyColumns[slot];
        index = reader.Read(_rows.Field(column), _rows);
        return index >= 0 || (IsPassedOver() ? false : throw TableFaults.BadNumber(_rows.Place(column), _rows.Field(column), _plan.Headings[column].Text, _context.Head.Dialect));
    }

    private bool Samples()
    {
        var (rows, columns, low, high, samples, sign) = (_rows, _columns, _low, _high, _store.Samples, _decimal);
        for (var at = 0; at < columns.Length; at++)
        {
            var column = columns[at];
            var cell = rows.Field(column);
            if (!PlainDecimal.TryParse(cell, sign, out var value) && !CellText.TryNumber(cell, sign, out value) && !TrySlowly(cell, column, out value))
            {
                return false;
            }

            if (!(value > low[at] && value < high[at]))
            {
                value = SecondLook(at, column, value, cell);
            }

            samples.Put(at, value);
        }

        return true;
    }

    private bool TrySlowly(ReadOnlySpan<byte> cell, int column, out double value)
    {
        value = double.NaN;
        var text = CellText.Trimmed(cell);
        if (CellText.IsMissing(text) || CellText.TryNumber(text, _decimal, out value))
        {
            return true;
        }

        if (IsPassedOver())
        {
            return false;
        }

        if (!CellText.TryOddNumber(text, _decimal, out value))
        {
            throw TableFaults.BadNumber(_rows.Place(column), cell, _plan.Headings[column].Text, _context.Head.Dialect);
        }

        return _oddNumbers = true;
    }

    private double SecondLook(int at, int column, double value, ReadOnlySpan<byte> cell)
    {
        var part = _plan.Values[at].Part;
        if (!double.IsFinite(value))
        {
            _missing.Add(_rows.Place(column), cell);
            return double.NaN;
        }

        if (CellText.IsFiller(value))
        {
            _missing.Suspect(at, _store.Rows, value, () => _rows.Place(column));
            return double.NaN;
        }

        var isBad = part switch
        {
            ChannelPart.Level or ChannelPart.ReturnLoss => true,
            ChannelPart.Amplitude or ChannelPart.Power => value < 0.0,
            ChannelPart.StandingWaveRatio => value < 1.0,
            _ => false,
        };
        return isBad ? throw TableFaults.SampleOutOfRange(_rows.Place(column), cell, _plan.Headings[column].Text, part) : value;
    }

    /// <summary>Decides about a row with an unexpected number of fields.</summary>
    private bool IsRow(int expected)
    {
        if (IsPassedOver())
        {
            return false;
        }

        var count = _rows.Count;
        while (count > expected && CellText.Trimmed(_rows.Field(count - 1)).IsEmpty)
        {
            count--;
        }

        return count == expected ? true : throw TableFaults.FieldCount(new(_context.File, _rows.Line), count, expected, _context.Head.Headings);
    }

    /// <summary>Gives whether the row is a comment, a repeated heading or empty; a comment may set a new fixed angle or frequency for the rows after it.</summary>
    private bool IsPassedOver()
    {
        var record = _rows.Record.Trim(" \t"u8);
        var only = record.IndexOfAnyExcept(TextSigns.Emptiness);
        if (only < 0)
        {
            _emptyRows += record.IsEmpty ? 0 : 1;
            return true;
        }

        var line = HeadLine.Of(_rows.Line, record[..Math.Min(record.Length, 1 << 16)]);
        if (line.IsComment)
        {
            Comment(line.Content);
            return true;
        }

        return _context.Head.HeadingText.Length > 0 && string.Equals(line.Text.Trim(), _context.Head.HeadingText, StringComparison.Ordinal);
    }

    private void Comment(string content)
    {
        if (!MetadataLine.TryParse(content, out var name, out var value))
        {
            return;
        }

        var heading = HeadingParser.Parse(name);
        for (var slot = 0; slot < 3; slot++)
        {
            var key = _plan.Keys[slot];
            var fits = heading.Kind == key.Kind || (key.Kind == HeadingKind.Unknown && slot == TableKey.Second && heading.Kind is HeadingKind.Phi or HeadingKind.Roll);
            if (!fits || heading.Kind == HeadingKind.Unknown || key.Column >= 0 || key.IsAcross)
            {
                continue;
            }

            var (kind, fallback) = heading.Kind == HeadingKind.Frequency ? (UnitKind.Frequency, heading.Unit) : (UnitKind.Angle, heading.Unit.Kind == UnitKind.None ? new HeadingUnit(UnitKind.Angle, 1.0, "deg") : heading.Unit);
            if (!MetadataLine.TryQuantity(value, kind, fallback, out var number))
            {
                throw TableFaults.BlockValue(new(_context.File, _rows.Line), content, heading.Kind);
            }

            _fixed[slot] = _store.Keys[slot].Find(kind == UnitKind.Frequency ? KeyReader.Whole(number) : number);
        }
    }
}
