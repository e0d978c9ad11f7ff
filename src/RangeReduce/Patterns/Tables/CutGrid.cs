namespace RangeReduce.Patterns.Tables;

/// <summary>The grid of one cut: its frequencies and angles, and which of its cells the table fills.</summary>
internal sealed class CutGrid
{
    private int[] _frequencyAt = [];
    private int[] _angleAt = [];

    /// <summary>Makes a grid over the frequencies and angles that the table has in all.</summary>
    public CutGrid(int frequencies, int angles) => (HasFrequency, HasAngle) = (new bool[frequencies], new bool[angles]);

    /// <summary>Gets which of the table's frequencies occur.</summary>
    public bool[] HasFrequency { get; }

    /// <summary>Gets which of the table's angles occur.</summary>
    public bool[] HasAngle { get; }

    /// <summary>Gets the frequencies in hertz, rising.</summary>
    public double[] FrequencyHz { get; private set; } = [];

    /// <summary>Gets the angles in degrees, rising.</summary>
    public double[] AngleDeg { get; private set; } = [];

    /// <summary>Gets which cells are filled.</summary>
    public bool[] Filled { get; private set; } = [];

    /// <summary>Gets the number of filled cells.</summary>
    public int FilledCount { get; private set; }

    /// <summary>Gets the readings beyond the first of a cell.</summary>
    public List<(int Row, int Across, int Cell)> Repeats { get; } = [];

    /// <summary>Gets the first and last line.</summary>
    public (int First, int Last) Lines { get; private set; } = (int.MaxValue, 0);

    /// <summary>Gets the number of cells.</summary>
    public long CellCount => (long)FrequencyHz.Length * AngleDeg.Length;

    /// <summary>Takes the lines of rows in.</summary>
    public void Take(int first, int last) => Lines = (Math.Min(Lines.First, first), Math.Max(Lines.Last, last));

    /// <summary>Marks consecutive angles as occurring.</summary>
    public void MarkAngles(int first, int count) => HasAngle.AsSpan(first, count).Fill(true);

    /// <summary>Sorts the axes once all keys are marked.</summary>
    /// <param name="frequencyHz">The frequency of each index.</param>
    /// <param name="angleDeg">The angle of each index; several indices may share one.</param>
    public void Sort(IReadOnlyList<double> frequencyHz, IReadOnlyList<double> angleDeg)
    {
        (FrequencyHz, _frequencyAt) = Ranks(HasFrequency, frequencyHz);
        (AngleDeg, _angleAt) = Ranks(HasAngle, angleDeg);
        IsStraight = AngleDeg.Length == _angleAt.Length && !_angleAt.Where((rank, at) => rank != at).Any();
    }

    /// <summary>Makes the map of filled cells; the axes must be sorted and the number of cells checked.</summary>
    public void Open() => Filled = new bool[CellCount];

    /// <summary>Gives the cell of a frequency and an angle by their indices in the table.</summary>
    public int Cell(int frequency, int angle) => (_frequencyAt[frequency] * AngleDeg.Length) + _angleAt[angle];

    /// <summary>Gets whether the angles come in rising order and all belong to this cut, so that rows along the angle are cells along the angle.</summary>
    public bool IsStraight { get; private set; }

    /// <summary>Marks consecutive cells that consecutive rows fill.</summary>
    public void Fill(int cell, int count, int row, int across)
    {
        var filled = Filled.AsSpan(cell, count);
        if (!filled.Contains(true))
        {
            filled.Fill(true);
            FilledCount += count;
            return;
        }

        for (var at = 0; at < count; at++)
        {
            if (filled[at])
            {
                Repeats.Add((row + at, across, cell + at));
            }
            else
            {
                filled[at] = true;
                FilledCount++;
            }
        }
    }

    private static (double[] Values, int[] At) Ranks(bool[] has, IReadOnlyList<double> values)
    {
        var used = Enumerable.Range(0, has.Length).Where(at => has[at]).ToArray();
        var sorted = used.Select(at => values[at]).Distinct().Order().ToArray();
        var ranks = new int[has.Length];
        foreach (var at in used)
        {
            ranks[at] = Array.BinarySearch(sorted, values[at]);
        }

        return (sorted, ranks);
    }
}
