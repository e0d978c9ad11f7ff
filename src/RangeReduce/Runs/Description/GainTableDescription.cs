namespace RangeReduce.Runs.Description;

/// <summary>The gain table of a file.</summary>
/// <param name="Points">Number of frequencies.</param>
/// <param name="LowHz">Lowest frequency in hertz.</param>
/// <param name="HighHz">Highest frequency in hertz.</param>
/// <param name="LowDbi">Lowest gain in dBi.</param>
/// <param name="HighDbi">Highest gain in dBi.</param>
public sealed record GainTableDescription(int Points, double LowHz, double HighHz, double LowDbi, double HighDbi);
