namespace RangeReduce.Reporting.Plots;

/// <summary>A band to be drawn as a bar.</summary>
/// <param name="State">Configuration state.</param>
/// <param name="Low">Lower edge in the unit of the abscissa.</param>
/// <param name="High">Upper edge.</param>
/// <param name="Simulated">Whether it comes from a simulation.</param>
/// <param name="Label">Edges as text.</param>
internal sealed record BandBar(string State, double Low, double High, bool Simulated, string Label);
