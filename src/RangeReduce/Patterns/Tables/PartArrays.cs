namespace RangeReduce.Patterns.Tables;

/// <summary>One part of one channel, sorted into the cells of every cut.</summary>
internal sealed class PartArrays
{
    /// <summary>Makes room for the cells of every cut.</summary>
    public PartArrays(CutGrid[] grids)
    {
        // Pages that are not yet written cost no memory: the array fills while the blocks of rows are given back.
        Cells = Array.ConvertAll(grids, grid => GC.AllocateUninitializedArray<double>((int)grid.CellCount));
        Repeats = Array.ConvertAll(grids, grid => new double[grid.Repeats.Count]);
    }

    /// <summary>Gets the samples, [cut][frequency, angle].</summary>
    public double[][] Cells { get; }

    /// <summary>Gets the repeated samples, [cut][repeat].</summary>
    public double[][] Repeats { get; }

    /// <summary>Takes the repeated samples out of a column before it is scattered.</summary>
    public void TakeRepeats(CutGrid[] grids, SampleBlocks samples, int column, int across, double factor)
    {
        for (var cut = 0; cut < grids.Length; cut++)
        {
            for (var at = 0; at < grids[cut].Repeats.Count; at++)
            {
                if (grids[cut].Repeats[at].Across == across)
                {
                    Repeats[cut][at] = samples.At(column, grids[cut].Repeats[at].Row) * factor;
                }
            }
        }
    }

    /// <summary>Marks the cells that the table does not fill as missing.</summary>
    public void FillGaps(CutGrid[] grids)
    {
        for (var cut = 0; cut < grids.Length; cut++)
        {
            if (grids[cut].FilledCount == grids[cut].CellCount)
            {
                continue;
            }

            for (var cell = 0; cell < Cells[cut].Length; cell++)
            {
                if (!grids[cut].Filled[cell])
                {
                    Cells[cut][cell] = double.NaN;
                }
            }
        }
    }
}
