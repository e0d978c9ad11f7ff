namespace RangeReduce.Reduction;

/// <summary>A lobe of a level along a cut.</summary>
/// <param name="AngleDeg">Direction of its maximum in degrees, refined between samples; it may pass the first or last angle of a closed turn.</param>
/// <param name="LevelDb">Level of its maximum in dB, refined likewise.</param>
/// <param name="RiseDb">How far its highest sample stands above the higher of the two minima that part it from higher lobes (or the ends of the data); the span of the data for the highest lobe.</param>
public readonly record struct Lobe(double AngleDeg, double LevelDb, double RiseDb);
