namespace RangeReduce.Comparison;

/// <summary>One value that a requirement is held against.</summary>
/// <param name="Value">The value in the unit of the quantity; +∞ where a curve has none smaller.</param>
/// <param name="FrequencyHz">Its frequency in hertz.</param>
/// <param name="DirectionDeg">Its angle along the cut in degrees, for a requirement over a cone.</param>
/// <param name="State">Its configuration state.</param>
/// <param name="Id">Id of the figure or trace that it was read from.</param>
internal readonly record struct RequirementPoint(double Value, double? FrequencyHz, double? DirectionDeg, string? State, string Id);
