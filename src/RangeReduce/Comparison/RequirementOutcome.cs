using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>How a requirement came out.</summary>
/// <param name="Requirement">The requirement.</param>
/// <param name="Text">The requirement in words.</param>
/// <param name="Verdict">The verdict.</param>
/// <param name="FigureIds">Ids of the figures that decided, the worst first.</param>
/// <param name="Margin">Distance of the worst value from the bound in the unit of the quantity, positive on the good side; NaN where there is none.</param>
/// <param name="Reason">Why it is undecided, or where the worst value was found.</param>
public sealed record RequirementOutcome(Requirement Requirement, string Text, RequirementVerdict Verdict, IReadOnlyList<string> FigureIds, double Margin, string Reason)
{
    /// <summary>Gets the worst value, in the unit of the quantity; NaN where there is none.</summary>
    public double Worst { get; init; } = double.NaN;
}
