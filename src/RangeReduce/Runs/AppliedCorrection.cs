namespace RangeReduce.Runs;

/// <summary>A correction that was applied, as one line of the report.</summary>
/// <param name="Name">Stable name, such as <c>gain-standard</c>.</param>
/// <param name="Text">What it did and to which data.</param>
/// <param name="Inputs">Ids of the input files that it took its numbers from.</param>
public sealed record AppliedCorrection(string Name, string Text, IReadOnlyList<string> Inputs);
