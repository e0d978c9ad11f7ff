using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Reads text tables of pattern cuts, reflection sweeps and standard gains in whatever wording, separators and form a laboratory writes them.</summary>
/// <remarks>
/// Long form: a row a sample. Wide form: angles down and frequencies across, or the other way round. The content decides what a table is: with an angle it is a cut;
/// with a reflection (S11, return loss, VSWR) over frequency a sweep; with nothing but a gain over frequency a gain table.
/// The longest line, the number of columns and of samples are limited by <see cref="TableOptions"/>; preamble and headings have to lie in the first 256 KiB.
/// </remarks>
public static class TableReader
{
    /// <summary>Reads a file.</summary>
    /// <param name="path">Path to open.</param>
    /// <param name="displayPath">Path as the user knows it, for errors and remarks; its last part may tell frequency, fixed angle and channel.</param>
    /// <param name="options">What is known beside the file; null for nothing.</param>
    /// <returns>What the table holds.</returns>
    /// <exception cref="MeasurementDataException">The content is no table that can be understood; the message says where and what to do.</exception>
    /// <exception cref="IOException">The file cannot be opened or read.</exception>
    public static MeasurementTable Read(string path, string displayPath, TableOptions? options = null)
    {
        using var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 0, FileOptions.SequentialScan);
        return Read(stream, displayPath, options);
    }

    /// <summary>Reads bytes in memory.</summary>
    /// <param name="bytes">The whole content of a file.</param>
    /// <param name="displayPath">Name for errors and remarks.</param>
    /// <param name="options">What is known beside the content; null for nothing.</param>
    /// <returns>What the table holds.</returns>
    /// <exception cref="MeasurementDataException">The content is no table that can be understood.</exception>
    public static MeasurementTable Read(byte[] bytes, string displayPath, TableOptions? options = null)
    {
        using var stream = new MemoryStream(bytes, writable: false);
        return Read(stream, displayPath, options);
    }

    /// <summary>Reads a stream from where it stands to its end.</summary>
    /// <param name="stream">The content; it need not be seekable and is left open.</param>
    /// <param name="displayPath">Name for errors and remarks.</param>
    /// <param name="options">What is known beside the content; null for nothing.</param>
    /// <returns>What the table holds.</returns>
    /// <exception cref="MeasurementDataException">The content is no table that can be understood.</exception>
    public static MeasurementTable Read(Stream stream, string displayPath, TableOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(stream);
        ArgumentNullException.ThrowIfNull(displayPath);
        options ??= new();
        var remarks = new List<Remark>();
        var input = TableInput.Open(stream, displayPath, remarks);
        var head = TableHeadFinder.Find(input.Head, input.IsWhole, options.Columns, out var bare)
            ?? throw (input.Head.Length == 0 ? TableFaults.Empty(displayPath) : bare is { } found ? TableFaults.NoHeadings(new(displayPath, found.Line.Number), found.Fields) : TableFaults.NoTable(displayPath));
        var context = new TableContext(displayPath, head, options, remarks);
        var plan = TablePlanner.Plan(context);
        using var store = new SampleStore(plan.Values.Count);
        using (var rows = new RowSource(input.From(head.DataStart), context))
        {
            new RowReader(context, plan, store, rows).ReadAll();
        }

        return new()
        {
            Cuts = plan.Content == TableContent.Cuts ? CutAssembler.Assemble(context, plan, store) : [],
            Sweep = plan.Content == TableContent.Sweep ? SweepAssembler.Sweep(context, plan, store) : null,
            Gain = plan.Content == TableContent.Gain ? SweepAssembler.Gain(context, plan, store) : null,
            Columns = plan.Meanings,
            Metadata = head.Metadata,
            Remarks = remarks,
        };
    }

    /// <summary>Gives whether the first bytes of a file look like a table: rows of numbers, with headings or without, and no Touchstone file.</summary>
    /// <param name="head">The first bytes; a few kilobytes will do.</param>
    /// <returns>True also for a table whose headings are not understood, so that reading it can say why.</returns>
    public static bool LooksLikeTable(ReadOnlySpan<byte> head) => TableSniffer.LooksLikeTable(head);
}
