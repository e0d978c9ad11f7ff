namespace RangeReduce.Patterns;

/// <summary>Readings of a cut that were taken again at a frequency and angle that it already had, such as the overlap of a closed turn.</summary>
/// <param name="Cell">Index of the first reading in the channels of the cut, one a repeat: frequency * number of angles + angle.</param>
/// <param name="Channels">The repeated samples, one an entry of <paramref name="Cell"/>, in the order of the channels of the cut.</param>
public sealed record RepeatedReadings(int[] Cell, IReadOnlyList<PatternChannel> Channels);
