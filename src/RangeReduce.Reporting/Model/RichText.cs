namespace RangeReduce.Reporting.Model;

/// <summary>Text made of spans.</summary>
/// <param name="Spans">The spans in order.</param>
public sealed record RichText(IReadOnlyList<TextSpan> Spans)
{
    /// <summary>No text.</summary>
    public static readonly RichText Empty = new([]);

    /// <summary>Gets the letters without style.</summary>
    public string Plain => string.Concat(Spans.Select(span => span.Text));

    /// <summary>Takes plain text.</summary>
    public static implicit operator RichText(string text) => FromString(text);

    /// <summary>Takes plain text.</summary>
    public static RichText FromString(string text) => new([new TextSpan(text)]);

    /// <summary>Makes stressed text.</summary>
    public static RichText Strong(string text) => new([new TextSpan(text) { Strong = true }]);

    /// <summary>Stresses the whole text.</summary>
    public RichText AsStrong() => new([.. Spans.Select(span => span with { Strong = true })]);

    /// <summary>Makes quiet text.</summary>
    public static RichText Quiet(string text) => new([new TextSpan(text) { Tone = TextTone.Quiet }]);

    /// <summary>Makes text in letters of equal width.</summary>
    public static RichText Code(string text) => new([new TextSpan(text) { Code = true }]);

    /// <summary>Makes text that leads to an anchor.</summary>
    public static RichText Link(string text, string anchor) => new([new TextSpan(text) { LinkTo = anchor }]);

    /// <summary>Puts another text behind this one.</summary>
    public RichText Then(RichText other)
    {
        ArgumentNullException.ThrowIfNull(other);
        return new([.. Spans, .. other.Spans]);
    }

    /// <inheritdoc/>
    public override string ToString() => Plain;
}
