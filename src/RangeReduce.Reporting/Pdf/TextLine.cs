namespace RangeReduce.Reporting.Pdf;

/// <summary>A line of wrapped text.</summary>
/// <param name="Words">Its pieces from left to right.</param>
internal sealed record TextLine(IReadOnlyList<PlacedWord> Words)
{
    /// <summary>Gets the width from the start of the line to the end of its last piece.</summary>
    public float Width => Words.Count == 0 ? 0f : Words[^1].X + Words[^1].Width;
}
