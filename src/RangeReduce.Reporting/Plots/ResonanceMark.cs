namespace RangeReduce.Reporting.Plots;

/// <summary>A resonance to be marked on a curve.</summary>
/// <param name="State">Configuration state.</param>
/// <param name="X">Abscissa in the unit of the plot.</param>
/// <param name="Y">Ordinate.</param>
/// <param name="Label">Its frequency as text.</param>
internal sealed record ResonanceMark(string State, double X, double Y, string Label);
