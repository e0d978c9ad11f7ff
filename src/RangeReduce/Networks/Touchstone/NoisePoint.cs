using System.Numerics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Noise parameters of a two-port at one frequency.</summary>
/// <param name="FrequencyHz">Frequency in hertz.</param>
/// <param name="MinimumNoiseFigureDb">Minimum noise figure in dB.</param>
/// <param name="SourceReflection">Source reflection coefficient for it.</param>
/// <param name="NoiseResistanceOhm">Effective noise resistance in ohm.</param>
public sealed record NoisePoint(double FrequencyHz, double MinimumNoiseFigureDb, Complex SourceReflection, double NoiseResistanceOhm);
