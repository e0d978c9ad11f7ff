namespace RangeReduce.Reporting.Pdf;

/// <summary>Something that is placed whole: a line of a paragraph, a row of a table, a row of plots.</summary>
internal abstract class FlowPiece
{
    /// <summary>Gets the height in points.</summary>
    public abstract float Height { get; }

    /// <summary>Gets the space above, dropped at the top of a page.</summary>
    public float SpaceBefore { get; init; }

    /// <summary>Gets whether the next piece must stand on the same page.</summary>
    public bool KeepWithNext { get; init; }

    /// <summary>Gets whether the piece starts a page.</summary>
    public bool StartsPage { get; init; }

    /// <summary>Gets the piece that is set again at the top of a page that starts with this one: the head of its table.</summary>
    public FlowPiece? Head { get; init; }

    /// <summary>Gets the anchor at its top; null for none.</summary>
    public string? Anchor { get; init; }

    /// <summary>Gets the bookmark that leads to it; null for none.</summary>
    public Bookmark? Bookmark { get; init; }

    /// <summary>Draws the piece.</summary>
    /// <param name="brush">Draws onto the page.</param>
    /// <param name="x">Left end of the text.</param>
    /// <param name="y">Top of the piece.</param>
    public abstract void Draw(PageBrush brush, float x, float y);
}
