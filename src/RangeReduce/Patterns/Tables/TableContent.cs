namespace RangeReduce.Patterns.Tables;

/// <summary>What kind of data a table holds.</summary>
internal enum TableContent
{
    /// <summary>Pattern cuts.</summary>
    Cuts,

    /// <summary>A reflection sweep.</summary>
    Sweep,

    /// <summary>Gain over frequency.</summary>
    Gain,
}
