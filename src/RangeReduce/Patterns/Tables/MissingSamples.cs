using System.Globalization;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Counts missing samples and decides about numbers that may stand for one.</summary>
internal sealed class MissingSamples(TableContext context, IReadOnlyList<ValueColumn> columns)
{
    private const int MostSuspects = 1_000_000;

    private readonly List<(int Row, double Value, SourcePlace Place)>?[] _suspects = new List<(int, double, SourcePlace)>?[columns.Count];
    private readonly long[] _suspectCount = new long[columns.Count];
    private long _count;
    private SourcePlace _first;
    private string _firstText = string.Empty;

    /// <summary>Counts a cell that says that there is no sample.</summary>
    public void Add(SourcePlace place, ReadOnlySpan<byte> cell)
    {
        if (_count++ == 0)
        {
            var text = CellText.Decode(CellText.Trimmed(cell));
            (_first, _firstText) = (place, text.Length == 0 ? "blank" : $"\"{text}\"");
        }
    }

    /// <summary>Keeps a number such as -9999 that may stand for a missing sample; the store holds NaN meanwhile.</summary>
    public void Suspect(int column, int row, double value, Func<SourcePlace> place)
    {
        var list = _suspects[column] ??= [];
        _suspectCount[column]++;
        if (list.Count < MostSuspects)
        {
            list.Add((row, value, list.Count == 0 ? place() : default));
        }
    }

    /// <summary>Decides about the suspects once the range of the other samples is known, and writes the remark.</summary>
    public void Finish(SampleStore store)
    {
        for (var column = 0; column < columns.Count; column++)
        {
            if (_suspects[column] is { } list)
            {
                Decide(store.Samples, column, list);
            }
        }

        if (_count > 0)
        {
            context.Doubt("missing-samples", string.Create(CultureInfo.InvariantCulture, $"{_count} {(_count == 1 ? "sample is" : "samples are")} missing ({_firstText} first); they are left out of every figure."), _first);
        }
    }

    private void Decide(SampleBlocks samples, int column, List<(int Row, double Value, SourcePlace Place)> list)
    {
        var largest = 0.0;
        for (var block = 0; block < samples.BlockCount; block++)
        {
            foreach (var value in samples.Block(column, block))
            {
                largest = Math.Max(largest, double.IsNaN(value) ? 0.0 : Math.Abs(value));
            }
        }

        var smallest = list.Min(suspect => Math.Abs(suspect.Value));
        if (columns[column].IsDecibel || largest < smallest / 2.0)
        {
            if (_count == 0)
            {
                (_first, _firstText) = (list[0].Place, string.Create(CultureInfo.InvariantCulture, $"the filler {list[0].Value:R}"));
            }

            _count += _suspectCount[column];
            return;
        }

        // The column reaches so far that 999 is a value like any other.
        if (_suspectCount[column] > list.Count)
        {
            throw TableFaults.AmbiguousFiller(list[0].Place, list[0].Value, largest, columns[column].Heading.Text);
        }

        foreach (var (row, value, _) in list)
        {
            samples.At(column, row) = value;
        }
    }
}
