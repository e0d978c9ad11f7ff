using System.Numerics;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>A minimum of |Γ| over frequency.</summary>
/// <param name="FrequencyHz">Its frequency in hertz, refined between samples.</param>
/// <param name="Reflection">Γ there; a real magnitude where the phase is not known.</param>
/// <param name="RiseDb">How far the return loss falls on the way to the next deeper dip or to the end of the sweep, the nearer of the two sides counting.</param>
public readonly record struct Resonance(double FrequencyHz, Complex Reflection, double RiseDb);
