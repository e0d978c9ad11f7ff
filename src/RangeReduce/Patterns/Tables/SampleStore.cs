namespace RangeReduce.Patterns.Tables;

/// <summary>All samples of a table in the order of its rows, with the keys of each row.</summary>
internal sealed class SampleStore : IDisposable
{
    private readonly List<SampleRun> _runs = [];
    private (int Line, int Frequency, int First, int Second) _start;
    private (int Line, int Frequency, int First, int Second) _next;
    private (int Frequency, int First, int Second) _step;
    private int _count;

    /// <summary>Makes an empty store.</summary>
    /// <param name="columns">Number of columns of samples.</param>
    public SampleStore(int columns) => Samples = new(columns);

    /// <summary>Gets the distinct values of frequency (hertz), theta-like and phi-like angle (degrees).</summary>
    public KeyIndex[] Keys { get; } = [new(), new(), new()];

    /// <summary>Gets the samples.</summary>
    public SampleBlocks Samples { get; }

    /// <summary>Gets the number of rows.</summary>
    public int Rows => Samples.Rows;

    /// <summary>Gets the runs of rows in the order of the file; all rows must have been added.</summary>
    public IReadOnlyList<SampleRun> Runs
    {
        get
        {
            Close();
            return _runs;
        }
    }

    /// <summary>Keeps the row that was written to <see cref="Samples"/>, with its keys.</summary>
    public void AddRow(int line, int frequency, int first, int second)
    {
        Samples.NextRow();
        if (_count > 1 && line == _next.Line && frequency == _next.Frequency && first == _next.First && second == _next.Second)
        {
            _count++;
            Advance(line, frequency, first, second);
        }
        else if (_count == 1 && line == _start.Line + 1 && IsStep(frequency - _start.Frequency) && IsStep(first - _start.First) && IsStep(second - _start.Second))
        {
            _step = (frequency - _start.Frequency, first - _start.First, second - _start.Second);
            _count = 2;
            Advance(line, frequency, first, second);
        }
        else
        {
            Close();
            _start = (line, frequency, first, second);
            _count = 1;
        }
    }

    /// <inheritdoc/>
    public void Dispose() => Samples.Dispose();

    private static bool IsStep(int difference) => difference is >= -1 and <= 1;

    private void Advance(int line, int frequency, int first, int second) => _next = (line + 1, frequency + _step.Frequency, first + _step.First, second + _step.Second);

    private void Close()
    {
        if (_count > 0)
        {
            _runs.Add(new(_start.Line, _start.Frequency, _start.First, _start.Second, _count, (sbyte)_step.Frequency, (sbyte)_step.First, (sbyte)_step.Second));
        }

        (_count, _step) = (0, default);
    }
}
