namespace RangeReduce.Reporting.Plots;

/// <summary>How the values under the pointer are printed.</summary>
/// <param name="XName">Name of the abscissa.</param>
/// <param name="XUnit">Its unit.</param>
/// <param name="XDecimals">Its decimals.</param>
/// <param name="YUnit">Unit of the ordinate.</param>
/// <param name="YDecimals">Its decimals.</param>
internal sealed record PlotReadout(string XName, string XUnit, int XDecimals, string YUnit, int YDecimals)
{
    /// <summary>Gets the level at the centre of a polar plot; null for a rectangular one.</summary>
    public double? PolarFloor { get; init; }

    /// <summary>Gets the level at the outer ring of a polar plot.</summary>
    public double PolarTop { get; init; }
}
