using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Pdf;

/// <summary>A piece of a line: one style, one place.</summary>
/// <param name="Text">The letters.</param>
/// <param name="Span">The span that they come from.</param>
/// <param name="X">Distance from the left end of the line.</param>
/// <param name="Width">Advance width.</param>
internal readonly record struct PlacedWord(string Text, TextSpan Span, float X, float Width);
