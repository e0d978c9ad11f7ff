namespace RangeReduce.Quantities;

/// <summary>Uncertainty of a figure (JCGM 100, JCGM 101).</summary>
/// <param name="Expanded">Half width of the coverage interval in the unit of the quantity; NaN where the budget is absent.</param>
/// <param name="Coverage">Coverage factor k that belongs to <paramref name="Expanded"/>; NaN where the interval is a Monte Carlo one without a factor.</param>
/// <param name="Budget">How complete the budget is.</param>
public sealed record Uncertainty(double Expanded, double Coverage, BudgetState Budget)
{
    /// <summary>The uncertainty of a figure about whose errors nothing was stated.</summary>
    public static readonly Uncertainty None = new(double.NaN, double.NaN, BudgetState.Absent);

    /// <summary>Gets the lower end of the coverage interval where it is not symmetric about the value.</summary>
    public double? Low { get; init; }

    /// <summary>Gets the upper end of the coverage interval where it is not symmetric about the value.</summary>
    public double? High { get; init; }

    /// <summary>Gets the standard uncertainty, in the unit of the quantity, where it is known.</summary>
    public double? Standard { get; init; }

    /// <summary>Gets each term's share: its name and its standard uncertainty contribution in the unit of the quantity.</summary>
    public IReadOnlyList<UncertaintyShare> Shares { get; init; } = [];
}
