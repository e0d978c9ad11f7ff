namespace RangeReduce.Quantities;

/// <summary>Where data or a figure comes from.</summary>
public enum DataSource
{
    /// <summary>Taken on a range or with an analyser.</summary>
    Measured,

    /// <summary>From a field simulation.</summary>
    Simulated,

    /// <summary>From a closed-form model.</summary>
    Expected,
}
