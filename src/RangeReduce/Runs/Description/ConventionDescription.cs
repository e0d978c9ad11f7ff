namespace RangeReduce.Runs.Description;

/// <summary>One convention that is in use.</summary>
/// <param name="Name">What it is about.</param>
/// <param name="Value">What holds.</param>
/// <param name="From">Where it was taken from: <c>run.toml</c>, <c>headings</c>, <c>assumed</c> or <c>fixed</c>.</param>
public sealed record ConventionDescription(string Name, string Value, string From);
