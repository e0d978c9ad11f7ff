using RangeReduce.Quantities;

namespace RangeReduce.Runs;

/// <summary>One configuration state of the antenna.</summary>
/// <param name="Name">Its name, as in the manifest or the folder.</param>
/// <param name="IntendedHand">The hand that it is meant to have; null where that was not stated.</param>
/// <param name="KnownHand">The hand that it is known to have beyond doubt, which makes it a referee of the conventions; null for an ordinary state.</param>
public sealed record ConfigurationState(string Name, Hand? IntendedHand = null, Hand? KnownHand = null);
