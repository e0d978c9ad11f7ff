namespace RangeReduce.Patterns.Tables;

/// <summary>What one column of a table was taken for.</summary>
/// <param name="Heading">Heading as it stands in the file.</param>
/// <param name="Meaning">The meaning in words, such as <c>level of channel h</c>.</param>
/// <param name="Unit">Unit that the values were read in; empty where there is none.</param>
/// <param name="Channel">Channel that the column belongs to; null for a frequency, an angle or a column that is not used.</param>
public sealed record ColumnMeaning(string Heading, string Meaning, string Unit, string? Channel = null);
