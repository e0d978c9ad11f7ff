namespace RangeReduce.Quantities;

/// <summary>What one term of a budget contributes to the uncertainty of one figure.</summary>
/// <param name="Term">Name of the term as in the manifest.</param>
/// <param name="Contribution">Standard uncertainty that the term alone brings, in the unit of the quantity.</param>
public sealed record UncertaintyShare(string Term, double Contribution);
