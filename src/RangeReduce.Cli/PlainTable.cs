namespace RangeReduce.Cli;

/// <summary>A table of text: columns as wide as their widest cell, two blanks between, the last one as long as it needs; reads well on a terminal and through a pipe.</summary>
/// <param name="heads">Heads of the columns.</param>
internal sealed class PlainTable(params string[] heads)
{
    private readonly List<string[]> _rows = [heads];

    /// <summary>Adds a row.</summary>
    /// <exception cref="ArgumentException">It has not as many cells as there are heads.</exception>
    public void Add(params string[] cells) => _rows.Add(cells.Length == _rows[0].Length ? cells : throw new ArgumentException("A row needs a cell a column.", nameof(cells)));

    /// <summary>Writes the table, the heads underlined.</summary>
    public void Write(TextWriter output)
    {
        var widths = Enumerable.Range(0, _rows[0].Length).Select(column => _rows.Max(row => row[column].Length)).ToArray();
        for (var i = 0; i < _rows.Count; i++)
        {
            output.WriteLine("  " + string.Join("  ", _rows[i].Select((cell, column) => cell.PadRight(widths[column]))).TrimEnd());
            if (i == 0)
            {
                output.WriteLine("  " + string.Join("  ", _rows[0].Select((_, column) => new string('-', column == widths.Length - 1 ? _rows[0][column].Length : widths[column]))));
            }
        }
    }
}
