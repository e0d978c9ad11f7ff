using System.Runtime.InteropServices;

namespace RangeReduce.Patterns.Tables;

/// <summary>All samples of a table in the order of its rows, with the keys of each row.</summary>
internal sealed class SampleStore : IDisposable
{
    /// <summary>Makes an empty store.</summary>
    /// <param name="columns">Number of columns of samples.</param>
    public SampleStore(int columns) => Columns = [.. Enumerable.Range(0, columns).Select(_ => new GrowingColumn())];

    /// <summary>Gets the distinct values of frequency (hertz), theta-like and phi-like angle (degrees).</summary>
    public KeyIndex[] Keys { get; } = [new(), new(), new()];

    /// <summary>Gets the runs of rows in the order of the file.</summary>
    public List<SampleRun> Runs { get; } = [];

    /// <summary>Gets the samples, one entry a column.</summary>
    public GrowingColumn[] Columns { get; }

    /// <summary>Gets the number of rows.</summary>
    public int Rows { get; private set; }

    /// <summary>Adds the keys of a row; its samples go to <see cref="Columns"/>.</summary>
    public void AddRow(int line, int frequency, int first, int second)
    {
        Rows++;
        if (Runs.Count == 0 || !CollectionsMarshal.AsSpan(Runs)[^1].TryExtend(line, frequency, first, second))
        {
            Runs.Add(new(line, frequency, first, second));
        }
    }

    /// <inheritdoc/>
    public void Dispose() => Array.ForEach(Columns, column => column.Dispose());
}
