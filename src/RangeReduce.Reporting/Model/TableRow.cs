namespace RangeReduce.Reporting.Model;

/// <summary>A row of a table.</summary>
/// <param name="Cells">As many cells as there are columns.</param>
public sealed record TableRow(IReadOnlyList<RichText> Cells)
{
    /// <summary>Gets whether a line above the row starts a group.</summary>
    public bool StartsGroup { get; init; }

    /// <summary>Gets the anchor of the row; null for none.</summary>
    public string? Id { get; init; }
}
