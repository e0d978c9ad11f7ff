namespace RangeReduce.Runs.Description;

/// <summary>One state and what there is of it, after joining.</summary>
/// <param name="State">The state.</param>
/// <param name="MeasuredSweeps">Number of measured sweeps.</param>
/// <param name="MeasuredCuts">Number of measured cuts.</param>
/// <param name="SimulatedSweeps">Number of simulated sweeps.</param>
/// <param name="SimulatedCuts">Number of simulated cuts.</param>
public sealed record StateDescription(ConfigurationState State, int MeasuredSweeps, int MeasuredCuts, int SimulatedSweeps, int SimulatedCuts);
