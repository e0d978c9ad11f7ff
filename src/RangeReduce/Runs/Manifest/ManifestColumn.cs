using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Manifest;

/// <summary>One <c>[[columns]]</c> table: what a heading of the data tables means.</summary>
/// <param name="Heading">The heading as it stands in the file.</param>
/// <param name="Meaning">Its meaning, in the words of the table reader.</param>
/// <param name="Place">Where it stands in the manifest.</param>
public sealed record ManifestColumn(string Heading, string Meaning, SourcePlace Place);
