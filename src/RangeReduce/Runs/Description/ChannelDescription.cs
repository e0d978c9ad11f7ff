using RangeReduce.Quantities;

namespace RangeReduce.Runs.Description;

/// <summary>How one recorded channel was understood.</summary>
/// <param name="Channel">Name of the channel in the file.</param>
/// <param name="Component">Component that it was taken for; None where it was not understood.</param>
/// <param name="IsTurned">Whether its sign is turned.</param>
/// <param name="HasPhase">Whether the phase was recorded.</param>
public sealed record ChannelDescription(string Channel, FieldComponent Component, bool IsTurned, bool HasPhase);
