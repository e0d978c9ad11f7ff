namespace RangeReduce.Reporting.Model;

/// <summary>A heading inside a section.</summary>
/// <param name="Id">Anchor, unique in the report.</param>
/// <param name="Text">The heading.</param>
public sealed record HeadingBlock(string Id, string Text) : ReportBlock
{
    /// <summary>Gets the configuration state that the part is about; null for none. It gives the heading its mark.</summary>
    public string? State { get; init; }
}
