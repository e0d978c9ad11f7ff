namespace RangeReduce.Reporting.Model;

/// <summary>A column of a table.</summary>
/// <param name="Head">Its heading.</param>
/// <param name="Alignment">How its cells are aligned.</param>
public sealed record TableColumn(RichText Head, ColumnAlignment Alignment = ColumnAlignment.Left)
{
    /// <summary>Gets the configuration state whose mark stands in the heading; null for none.</summary>
    public string? State { get; init; }
}
