namespace RangeReduce.Reporting.Pdf;

/// <summary>An entry of the outline.</summary>
/// <param name="Title">Its text.</param>
/// <param name="Level">1 for a section, 2 for a part of it.</param>
/// <param name="Anchor">The named destination that it leads to.</param>
internal sealed record Bookmark(string Title, int Level, string Anchor);
