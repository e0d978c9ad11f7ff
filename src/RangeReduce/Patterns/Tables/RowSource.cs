using System.Runtime.CompilerServices;
using CsvHelper;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>The rows of a table as spans of bytes: separated by one character (CsvHelper splits), or by runs of blanks (split here).</summary>
internal sealed class RowSource : IDisposable
{
    // CsvHelper knows no runs of blanks: for those it only finds the lines, with a separator that no text holds.
    private const char NoSeparator = '\u001F';

    private readonly CsvReader _reader;
    private readonly TableContext _context;
    private readonly bool _blanks;
    private (int Start, int Length)[] _fields = new (int, int)[16];
    private int _count;
    private long _line;

    /// <summary>Starts at the first row of samples.</summary>
    public RowSource(Stream stream, TableContext context)
    {
        _context = context;
        _blanks = context.Head.Dialect.IsBlanks;
        _line = context.Head.DataLine - 1L;
        _reader = CsvReader.Create(stream, new CsvReaderOptions
        {
            Separator = _blanks ? NoSeparator : context.Head.Dialect.Separator,
            Mode = _blanks ? CsvMode.NoEscape : CsvMode.Rfc4180,
            HasHeader = false,
            AllowLineBreaksInQuotes = false,
            SkipEmptyLines = false,
            MaxRecordSize = context.Options.MaxLineBytes,
            BufferSize = 128 * 1024,
        });
    }

    /// <summary>Gets the line of the current row.</summary>
    public int Line => (int)Math.Min(int.MaxValue, _line);

    /// <summary>Gets the number of fields of the current row.</summary>
    public int Count => _blanks ? _count : _reader.FieldCount;

    /// <summary>Gets the bytes of the current row.</summary>
    public ReadOnlySpan<byte> Record => _reader.RawRecord;

    /// <summary>Gives the bytes of one field as they stand in the file; quotes and blanks around them are left on.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public ReadOnlySpan<byte> Field(int at) => _blanks ? _reader.RawRecord.Slice(_fields[at].Start, _fields[at].Length) : _reader.GetRawSpan(at);

    /// <summary>Goes to the next line; an empty one is a row without anything in it.</summary>
    /// <exception cref="CsvFormatException">A line is longer than the limit.</exception>
    public bool Read()
    {
        if (!_reader.Read())
        {
            return false;
        }

        // Every line break ends a row, and empty lines are rows too: counting rows counts lines.
        _line++;
        if (_blanks)
        {
            SplitBlanks();
        }

        return true;
    }

    /// <summary>Gives the place of one field of the current row.</summary>
    public SourcePlace Place(int at)
    {
        var fields = FieldSplitter.Split(CellText.Decode(Record), _context.Head.Dialect.Separator);
        return new(_context.File, Line, at < fields.Count ? fields[at].Column : 0);
    }

    /// <inheritdoc/>
    public void Dispose() => _reader.Dispose();

    private void SplitBlanks()
    {
        var record = _reader.RawRecord;
        var at = 0;
        _count = 0;
        while (true)
        {
            while (at < record.Length && record[at] is (byte)' ' or (byte)'\t')
            {
                at++;
            }

            if (at >= record.Length)
            {
                return;
            }

            var start = at;
            while (at < record.Length && record[at] is not ((byte)' ' or (byte)'\t'))
            {
                at++;
            }

            if (_count == _fields.Length)
            {
                Array.Resize(ref _fields, 2 * _count);
            }

            _fields[_count++] = (start, at - start);
        }
    }
}
