namespace RangeReduce.Quantities;

/// <summary>The kind of place that a figure was taken at.</summary>
public enum FigurePlace
{
    /// <summary>No particular place.</summary>
    None,

    /// <summary>At a resonance of a reflection sweep.</summary>
    Resonance,

    /// <summary>On the axis that the antenna is stated to point along.</summary>
    Axis,

    /// <summary>At the maximum of the cut.</summary>
    Peak,

    /// <summary>Over a cone about the axis.</summary>
    Cone,
}
