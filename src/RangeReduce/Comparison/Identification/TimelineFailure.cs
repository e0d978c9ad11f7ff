namespace RangeReduce.Comparison.Identification;

/// <summary>A sweep that was not in the state that it should have been in, or in none that is known.</summary>
/// <param name="Index">Index of the sweep, from 0.</param>
/// <param name="Expected">The state that was due; null where none was stated.</param>
/// <param name="Identification">The answer.</param>
/// <param name="Text">What is wrong, as a sentence.</param>
public sealed record TimelineFailure(int Index, string? Expected, SweepIdentification Identification, string Text);
