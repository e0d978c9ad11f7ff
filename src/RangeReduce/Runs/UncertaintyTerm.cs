namespace RangeReduce.Runs;

/// <summary>One term of the uncertainty budget as the manifest states it.</summary>
/// <param name="Name">Key in the manifest, such as <c>gain-standard</c>.</param>
/// <param name="Value">Its value.</param>
/// <param name="Unit">Its unit, such as <c>dB</c> or <c>deg</c>.</param>
public sealed record UncertaintyTerm(string Name, double Value, string Unit);
