namespace RangeReduce.Runs;

/// <summary>The gain standard: its gain and its levels through the same probe and receiver.</summary>
/// <param name="TableInputId">Id of the input file with the gain.</param>
/// <param name="FrequencyHz">Frequencies of the gain table in hertz, strictly rising.</param>
/// <param name="GainDbi">Gain of the (linearly polarized) standard in dBi, as many as <paramref name="FrequencyHz"/>.</param>
/// <param name="Readings">Levels of the standard: component First and Second are the same probe ports as in the cuts of the states. One reading a file; for linear ports the port along the standard shows the larger level.</param>
public sealed record GainStandard(string TableInputId, double[] FrequencyHz, double[] GainDbi, IReadOnlyList<StateCut> Readings)
{
    /// <summary>State name that the readings and sweeps of the standard carry.</summary>
    public const string StateName = "gain-standard";

    /// <summary>Gets the reflection sweeps of the standard, where there are any.</summary>
    public IReadOnlyList<StateSweep> Sweeps { get; init; } = [];
}
