using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>What NEC-2 printed for one frequency.</summary>
/// <param name="FrequencyHz">The frequency.</param>
/// <param name="ImpedanceOhm">Impedance at the source.</param>
/// <param name="InputPowerW">Power into the source of 1 V peak.</param>
/// <param name="Directions">The far field, in the order of the RP card; empty where there was none.</param>
internal sealed record NecFrequency(double FrequencyHz, Complex ImpedanceOhm, double InputPowerW, IReadOnlyList<NecDirection> Directions);
