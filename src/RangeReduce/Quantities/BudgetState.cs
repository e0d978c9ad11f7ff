namespace RangeReduce.Quantities;

/// <summary>How complete the uncertainty budget behind a figure is.</summary>
public enum BudgetState
{
    /// <summary>No term is known.</summary>
    Absent,

    /// <summary>Some of the terms that matter for the quantity are known.</summary>
    Partial,

    /// <summary>All terms that the manifest can state for the quantity are known.</summary>
    Full,
}
