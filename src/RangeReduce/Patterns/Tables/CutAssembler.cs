using System.Globalization;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Sorts the samples of a table into cuts.</summary>
internal sealed class CutAssembler
{
    private readonly TableContext _context;
    private readonly TablePlan _plan;
    private readonly SampleStore _store;
    private readonly CutFrame _frame;
    private readonly CutGrid[] _grids;
    private readonly double[] _fixedDeg;
    private readonly int[] _cutOf;
    private readonly int _acrossSlot;
    private readonly int[] _acrossIndex;

    private CutAssembler(TableContext context, TablePlan plan, SampleStore store)
    {
        (_context, _plan, _store) = (context, plan, store);
        _acrossSlot = plan.Values.Select(value => value.AcrossSlot).DefaultIfEmpty(-1).Max();
        _acrossIndex = [.. plan.Values.Select(value => _acrossSlot < 0 ? 0 : store.Keys[_acrossSlot].Find(value.Across))];
        _frame = CutFrame.Choose(context, plan, store);
        _fixedDeg = [.. _frame.FixedDeg.Distinct().Order()];
        _cutOf = Array.ConvertAll(_frame.FixedDeg, deg => Array.BinarySearch(_fixedDeg, deg));
        var (cuts, frequencies, angles) = (_fixedDeg.Length, store.Keys[TableKey.Frequency].Values.Count, _frame.MovingDeg.Length);
        if (cuts * ((long)frequencies + angles) > (16L * store.Rows * plan.Values.Count) + 4_000_000)
        {
            throw TableFaults.Sparse(context.HeadingsPlace, store.Rows, cuts, frequencies, angles);
        }

        _grids = [.. Enumerable.Range(0, cuts).Select(_ => new CutGrid(frequencies, angles))];
    }

    /// <summary>Sorts the samples; the store is empty afterwards.</summary>
    /// <exception cref="MeasurementDataException">The samples form no grid.</exception>
    public static IReadOnlyList<RawCut> Assemble(TableContext context, TablePlan plan, SampleStore store)
    {
        var assembler = new CutAssembler(context, plan, store);
        assembler.Mark();
        var parts = assembler.Fill();
        var cuts = new List<RawCut>();
        for (var cut = 0; cut < assembler._grids.Length; cut++)
        {
            if (assembler._grids[cut].FilledCount > 0)
            {
                cuts.Add(assembler.Cut(cut, parts));
            }
        }

        assembler.Remarks(cuts);
        return cuts;
    }

    /// <summary>Finds the grid of each cut and which cells are filled.</summary>
    private void Mark()
    {
        var across = _acrossSlot < 0 ? [0] : _acrossIndex.Distinct().ToArray();
        foreach (var run in _store.Runs)
        {
            foreach (var one in across)
            {
                MarkKeys(run, one);
            }
        }

        var cells = 0L;
        foreach (var grid in _grids)
        {
            grid.Sort(_store.Keys[TableKey.Frequency].Values, _frame.MovingDeg);
            cells += grid.CellCount;
            if (cells > (16L * _store.Rows * _plan.Values.Count) + 4_000_000 || cells > Array.MaxLength)
            {
                throw TableFaults.Sparse(_context.HeadingsPlace, _store.Rows, _grids.Length, grid.FrequencyHz.Length, grid.AngleDeg.Length);
            }

            grid.Open();
        }

        var row = 0;
        foreach (var run in _store.Runs)
        {
            foreach (var one in across)
            {
                MarkCells(run, row, one);
            }

            row += run.Count;
        }
    }

    private void MarkKeys(in SampleRun run, int across)
    {
        if (IsAlongCut(run))
        {
            var grid = _grids[CutAt(run, 0, across)];
            grid.HasFrequency[Index(run, 0, TableKey.Frequency, across)] = true;
            grid.MarkAngles(Index(run, 0, _frame.MovingSlot, across), run.Count);
            grid.Take(run.Line, run.Line + run.Count - 1);
            return;
        }

        for (var at = 0; at < run.Count; at++)
        {
            var grid = _grids[CutAt(run, at, across)];
            grid.HasFrequency[Index(run, at, TableKey.Frequency, across)] = true;
            grid.MarkAngles(Index(run, at, _frame.MovingSlot, across), 1);
            grid.Take(run.Line + at, run.Line + at);
        }
    }

    private void MarkCells(in SampleRun run, int row, int across)
    {
        if (IsAlongCut(run) && _grids[CutAt(run, 0, across)] is { IsStraight: true } straight)
        {
            straight.Fill(straight.Cell(Index(run, 0, TableKey.Frequency, across), Index(run, 0, _frame.MovingSlot, across)), run.Count, row, across);
            return;
        }

        for (var at = 0; at < run.Count; at++)
        {
            var grid = _grids[CutAt(run, at, across)];
            grid.Fill(grid.Cell(Index(run, at, TableKey.Frequency, across), Index(run, at, _frame.MovingSlot, across)), 1, row + at, across);
        }
    }

    /// <summary>Gives whether the rows of a run step upwards along one cut at one frequency.</summary>
    private bool IsAlongCut(in SampleRun run) =>
        run.Step(_frame.MovingSlot) == 1 && _acrossSlot != _frame.MovingSlot && (run.FrequencyStep == 0 || _acrossSlot == TableKey.Frequency) && (run.Step(_frame.FixedSlot) == 0 || _acrossSlot == _frame.FixedSlot);

    private int CutAt(in SampleRun run, int at, int across) =>
        _cutOf[_acrossSlot == _frame.FixedSlot ? across : run.Start(_frame.FixedSlot) + (at * run.Step(_frame.FixedSlot))];

    private int Index(in SampleRun run, int at, int slot, int across) => _acrossSlot == slot ? across : run.Start(slot) + (at * run.Step(slot));

    /// <summary>Copies the samples to their cells, one part of one channel at a time, and gives each block of rows back as soon as it is copied.</summary>
    private Dictionary<(string Channel, ChannelPart Part), PartArrays> Fill()
    {
        var parts = new Dictionary<(string, ChannelPart), PartArrays>();
        foreach (var group in Enumerable.Range(0, _plan.Values.Count).GroupBy(at => (_plan.Values[at].Channel, _plan.Values[at].Part)))
        {
            var arrays = new PartArrays(_grids);
            foreach (var column in group)
            {
                arrays.TakeRepeats(_grids, _store.Samples, column, _acrossIndex[column], _plan.Values[column].Factor);
                Scatter(arrays, column);
            }

            arrays.FillGaps(_grids);
            parts.Add(group.Key, arrays);
        }

        return parts;
    }

    /// <summary>Walks the rows backwards, so that the first reading of a cell is the one that stays.</summary>
    private void Scatter(PartArrays arrays, int column)
    {
        var samples = _store.Samples;
        var (factor, across) = (_plan.Values[column].Factor, _acrossIndex[column]);
        var runs = _store.Runs;
        var block = samples.BlockCount - 1;
        var blockStart = samples.BlockStart(block);
        var end = _store.Rows;
        for (var which = runs.Count - 1; which >= 0; which--)
        {
            var run = runs[which];
            var start = end - run.Count;
            while (end > start)
            {
                var from = Math.Max(start, blockStart);
                var values = samples.Block(column, block)[(from - blockStart)..(end - blockStart)];
                Copy(values, factor, run, from - start, across, arrays.Cells);
                end = from;
                if (end == blockStart && block > 0)
                {
                    samples.Release(column, block--);
                    blockStart = samples.BlockStart(block);
                }
            }
        }
    }

    /// <summary>Copies consecutive rows of one run.</summary>
    private void Copy(ReadOnlySpan<double> values, double factor, in SampleRun run, int offset, int across, double[][] arrays)
    {
        var cut = CutAt(run, offset, across);
        if (factor == 1.0 && IsAlongCut(run) && _grids[cut].IsStraight)
        {
            values.CopyTo(arrays[cut].AsSpan(_grids[cut].Cell(Index(run, offset, TableKey.Frequency, across), Index(run, offset, _frame.MovingSlot, across))));
            return;
        }

        for (var at = values.Length - 1; at >= 0; at--)
        {
            cut = CutAt(run, offset + at, across);
            arrays[cut][_grids[cut].Cell(Index(run, offset + at, TableKey.Frequency, across), Index(run, offset + at, _frame.MovingSlot, across))] = values[at] * factor;
        }
    }

    private RawCut Cut(int cut, Dictionary<(string Channel, ChannelPart Part), PartArrays> parts)
    {
        var grid = _grids[cut];
        var channels = new List<(string, PatternChannel)>();
        var repeats = new List<PatternChannel>();
        foreach (var channel in parts.GroupBy(part => part.Key.Channel, StringComparer.Ordinal))
        {
            var entries = channel.Select(part => (part.Key.Part, part.Value)).ToArray();
            channels.Add((channel.Key, SampleConversion.ToChannel(entries.Select(entry => (entry.Part, entry.Value.Cells[cut])))));
            repeats.Add(SampleConversion.ToChannel(entries.Select(entry => (entry.Part, entry.Value.Repeats[cut]))));
        }

        return new()
        {
            Axis = _frame.Axis,
            FixedDeg = _fixedDeg[cut],
            FrequencyHz = grid.FrequencyHz,
            AngleDeg = grid.AngleDeg,
            Channels = channels,
            Reference = _plan.Reference,
            Lines = grid.Lines,
            Repeats = grid.Repeats.Count == 0 ? null : new([.. grid.Repeats.Select(repeat => repeat.Cell)], repeats),
        };
    }

    private void Remarks(List<RawCut> cuts)
    {
        var repeats = _grids.Sum(grid => grid.Repeats.Count);
        if (repeats > 0)
        {
            var grid = Array.Find(_grids, grid => grid.Repeats.Count > 0)!;
            var angle = grid.AngleDeg[grid.Repeats[0].Cell % grid.AngleDeg.Length];
            _context.Note("repeated-angles", string.Create(CultureInfo.InvariantCulture, $"{repeats} readings repeat a frequency and angle (the first at {angle:0.###} degrees): the first reading is the one that counts, the others are kept for repeatability."));
        }

        var holes = _grids.Sum(grid => grid.FilledCount == 0 ? 0 : grid.CellCount - grid.FilledCount);
        if (holes > 0)
        {
            var at = Array.FindIndex(_grids, grid => grid.FilledCount > 0 && grid.FilledCount < grid.CellCount);
            var hole = Enumerable.Range(0, (int)_grids[at].CellCount).First(cell => !_grids[at].Filled[cell]);
            var (frequency, angle) = (_grids[at].FrequencyHz[hole / _grids[at].AngleDeg.Length], _grids[at].AngleDeg[hole % _grids[at].AngleDeg.Length]);
            _context.Doubt("grid-holes", string.Create(CultureInfo.InvariantCulture, $"{holes} combinations of frequency and angle are missing from the table (the first at {frequency / 1e6:0.######} MHz, {angle:0.###} degrees); they are left out of every figure."));
        }

        var deg = _frame.MovingDeg;
        var rising = Rising(deg);
        var falling = Rising([.. deg.Reverse()]);
        if (!rising && !falling && cuts.Count > 0 && repeats == 0 && !_context.Remarks.Exists(remark => remark.Code is "whole-turn"))
        {
            _context.Note("angles-sorted", "The angles are not in order in the file; they were sorted.");
        }

        if (!Rising([.. _store.Keys[TableKey.Frequency].Values]))
        {
            _context.Note("frequencies-sorted", "The frequencies are not in rising order in the file; they were sorted.");
        }
    }

    private static bool Rising(double[] values) => !values.Where((value, at) => at > 0 && !(value > values[at - 1])).Any();
}
