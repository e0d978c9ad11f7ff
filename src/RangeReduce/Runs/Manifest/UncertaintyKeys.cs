namespace RangeReduce.Runs.Manifest;

/// <summary>The terms of the budget that a manifest can state, and in which kinds of unit.</summary>
internal static class UncertaintyKeys
{
    /// <summary>Terms by key, in the order in which messages list them.</summary>
    public static readonly IReadOnlyDictionary<string, UnitDimension[]> All = new Dictionary<string, UnitDimension[]>(StringComparer.Ordinal)
    {
        ["gain-standard"] = [UnitDimension.Ratio],
        ["receiver-linearity"] = [UnitDimension.Ratio],
        ["mismatch"] = [UnitDimension.Ratio],
        ["reflectivity"] = [UnitDimension.Ratio],
        ["noise-floor"] = [UnitDimension.Ratio, UnitDimension.Power],
        ["drift"] = [UnitDimension.Ratio, UnitDimension.Angle],
        ["probe-balance"] = [UnitDimension.Ratio],
        ["probe-balance-phase"] = [UnitDimension.Angle],
        ["probe-cross-polar"] = [UnitDimension.Ratio],
        ["alignment"] = [UnitDimension.Angle],
        ["distance"] = [UnitDimension.Length],
        ["repeatability"] = [UnitDimension.Ratio],
        ["reflection-directivity"] = [UnitDimension.Ratio],
    };
}
