namespace RangeReduce.Runs;

/// <summary>How one column of a table was understood.</summary>
/// <param name="Heading">The heading as it stands in the file.</param>
/// <param name="Meaning">What it was taken for, in words.</param>
public sealed record ColumnDescription(string Heading, string Meaning);
