namespace RangeReduce.Reporting.Model;

/// <summary>A run of text in one style.</summary>
/// <param name="Text">The text.</param>
public sealed record TextSpan(string Text)
{
    /// <summary>Gets whether it is stressed.</summary>
    public bool Strong { get; init; }

    /// <summary>Gets whether its letters have equal widths.</summary>
    public bool Code { get; init; }

    /// <summary>Gets the tone.</summary>
    public TextTone Tone { get; init; }

    /// <summary>Gets the anchor in this report that it leads to; null for none.</summary>
    public string? LinkTo { get; init; }
}
