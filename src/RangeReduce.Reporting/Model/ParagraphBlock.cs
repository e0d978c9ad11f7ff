namespace RangeReduce.Reporting.Model;

/// <summary>A paragraph.</summary>
/// <param name="Text">Its text.</param>
public sealed record ParagraphBlock(RichText Text) : ReportBlock
{
    /// <summary>Gets whether it is set large, as the first sentences of the report are.</summary>
    public bool Lead { get; init; }

    /// <summary>Gets whether it stays on the page of what follows, as an introduction does.</summary>
    public bool KeepWithNext { get; init; }

    /// <summary>Gets the configuration state whose mark stands before it; null for none.</summary>
    public string? State { get; init; }
}
