namespace RangeReduce.Patterns.Tables;

/// <summary>Gain over frequency, as it comes with a gain standard.</summary>
/// <param name="FrequencyHz">Frequencies in hertz, strictly rising.</param>
/// <param name="GainDbi">Gain over an isotropic radiator in dB, one a frequency.</param>
/// <param name="UncertaintyDb">Uncertainty column as the table gives it, in dB; null where it has none. The table's own text says which coverage factor it carries.</param>
public sealed record GainTable(double[] FrequencyHz, double[] GainDbi, double[]? UncertaintyDb = null);
