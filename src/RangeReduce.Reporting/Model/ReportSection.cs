namespace RangeReduce.Reporting.Model;

/// <summary>A part of the report.</summary>
/// <param name="Id">Anchor, unique in the report.</param>
/// <param name="Title">Heading.</param>
/// <param name="Blocks">What it holds, in order.</param>
public sealed record ReportSection(string Id, string Title, IReadOnlyList<ReportBlock> Blocks)
{
    /// <summary>Gets whether the section starts a page in print.</summary>
    public bool StartsPage { get; init; }
}
