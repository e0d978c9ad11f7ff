namespace RangeReduce.Reporting.Model;

/// <summary>A table. Its head is repeated on each page that it reaches, and no row is broken.</summary>
/// <param name="Caption">What it shows.</param>
/// <param name="Columns">Its columns.</param>
/// <param name="Rows">Its rows.</param>
public sealed record TableBlock(RichText Caption, IReadOnlyList<TableColumn> Columns, IReadOnlyList<TableRow> Rows) : ReportBlock
{
    /// <summary>Gets notes that stand below the table.</summary>
    public IReadOnlyList<RichText> Notes { get; init; } = [];

    /// <summary>Gets whether a reader on a screen may sort and filter the rows.</summary>
    public bool Sortable { get; init; }
}
