using System.Runtime.InteropServices;

namespace RangeReduce.Patterns.Tables;

/// <summary>Doubles of one column in the order of the rows, in blocks outside the managed heap that can be given back one by one.</summary>
/// <remarks>The number of rows is known at the end only. Doubling an array would hold the samples twice; blocks that are given back while the result is filled hold them once.</remarks>
internal sealed unsafe class GrowingColumn : IDisposable
{
    /// <summary>Rows of the first block; each further one is twice as long, up to <see cref="LongestBlock"/>.</summary>
    public const int FirstBlock = 512;

    /// <summary>Rows of the longest blocks: 32 MB, which the C library always maps and unmaps on its own.</summary>
    public const int LongestBlock = 1 << 22;

    private readonly List<(nint Start, int Length)> _blocks = [];
    private double* _block;
    private int _used;
    private int _length;

    /// <summary>Gets the number of blocks.</summary>
    public int BlockCount => _blocks.Count;

    /// <summary>Adds a value.</summary>
    public void Add(double value)
    {
        if (_used == _length)
        {
            Grow();
        }

        _block[_used++] = value;
    }

    /// <summary>Gives the values of one block; those of the last one as far as it is filled.</summary>
    public Span<double> Block(int at) => new((void*)_blocks[at].Start, at == _blocks.Count - 1 ? _used : _blocks[at].Length);

    /// <summary>Gives back one block; it must not be used afterwards.</summary>
    public void Release(int at)
    {
        NativeMemory.Free((void*)_blocks[at].Start);
        _blocks[at] = (0, _blocks[at].Length);
    }

    /// <summary>Gives or sets the value of one row.</summary>
    public double this[int row]
    {
        get => *Find(row);
        set => *Find(row) = value;
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        for (var at = 0; at < _blocks.Count; at++)
        {
            Release(at);
        }

        _blocks.Clear();
        _block = null;
        (_used, _length) = (0, 0);
    }

    private double* Find(int row)
    {
        foreach (var (start, length) in _blocks)
        {
            if (row < length)
            {
                return (double*)start + row;
            }

            row -= length;
        }

        throw new ArgumentOutOfRangeException(nameof(row));
    }

    private void Grow()
    {
        var length = _blocks.Count == 0 ? FirstBlock : Math.Min(2 * _length, LongestBlock);
        _block = (double*)NativeMemory.Alloc((nuint)length, sizeof(double));
        _blocks.Add(((nint)_block, length));
        (_used, _length) = (0, length);
    }
}
