namespace RangeReduce.Runs.Description;

/// <summary>The sweep of a file.</summary>
/// <param name="Points">Number of frequencies.</param>
/// <param name="LowHz">Lowest frequency in hertz.</param>
/// <param name="HighHz">Highest frequency in hertz.</param>
/// <param name="Ports">Number of ports.</param>
/// <param name="ReferenceOhm">Reference impedance in ohm, one a port.</param>
/// <param name="HasPhase">Whether the phase was recorded.</param>
public sealed record SweepDescription(int Points, double LowHz, double HighHz, int Ports, IReadOnlyList<double> ReferenceOhm, bool HasPhase);
