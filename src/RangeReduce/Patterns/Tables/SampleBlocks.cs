using System.Runtime.InteropServices;

namespace RangeReduce.Patterns.Tables;

/// <summary>Doubles of several columns in the order of the rows, in blocks outside the managed heap that can be given back one by one.</summary>
/// <remarks>The number of rows is known at the end only. Doubling arrays would hold the samples twice; blocks that are given back while the result is filled hold them once.</remarks>
internal sealed unsafe class SampleBlocks : IDisposable
{
    /// <summary>Rows of the longest blocks: 32 MB, which the C library always maps and unmaps on its own.</summary>
    private const int LongestBlock = 1 << 22;

    private const int FirstBlock = 512;

    private readonly List<(nint[] Columns, int Start, int Length)> _blocks = [];
    private nint[] _current;
    private int _used;
    private int _length;

    /// <summary>Makes room for the first rows.</summary>
    public SampleBlocks(int columns)
    {
        Columns = columns;
        _current = [];
        Grow();
    }

    /// <summary>Gets the number of columns.</summary>
    public int Columns { get; }

    /// <summary>Gets the number of rows.</summary>
    public int Rows { get; private set; }

    /// <summary>Gets the number of blocks.</summary>
    public int BlockCount => _blocks.Count;

    /// <summary>Writes a value of the row that comes next; it counts once <see cref="NextRow"/> was called.</summary>
    public void Put(int column, double value) => ((double*)_current[column])[_used] = value;

    /// <summary>Keeps the row that was written.</summary>
    public void NextRow()
    {
        Rows++;
        if (++_used == _length)
        {
            Grow();
        }
    }

    /// <summary>Gives the first row of a block.</summary>
    public int BlockStart(int block) => _blocks[block].Start;

    /// <summary>Gives the values of one column in one block.</summary>
    public Span<double> Block(int column, int block)
    {
        var (columns, start, length) = _blocks[block];
        return new((void*)columns[column], Math.Min(length, Rows - start));
    }

    /// <summary>Gives back one column of one block; it must not be used afterwards.</summary>
    public void Release(int column, int block)
    {
        NativeMemory.Free((void*)_blocks[block].Columns[column]);
        _blocks[block].Columns[column] = 0;
    }

    /// <summary>Gives the place of one value.</summary>
    public ref double At(int column, int row)
    {
        var block = _blocks.Count - 1;
        while (_blocks[block].Start > row)
        {
            block--;
        }

        return ref Block(column, block)[row - _blocks[block].Start];
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        for (var block = 0; block < _blocks.Count; block++)
        {
            for (var column = 0; column < Columns; column++)
            {
                Release(column, block);
            }
        }

        _blocks.Clear();
    }

    private void Grow()
    {
        _length = _blocks.Count == 0 ? FirstBlock : Math.Min(2 * _length, LongestBlock);
        _used = 0;
        _current = new nint[Columns];
        _blocks.Add((_current, Rows, _length));
        for (var column = 0; column < Columns; column++)
        {
            _current[column] = (nint)NativeMemory.Alloc((nuint)_length, sizeof(double));
        }
    }
}
