namespace RangeReduce.Runs.Manifest;

/// <summary>The <c>[probe]</c> table: which recorded channel is which component. A leading minus turns the sign.</summary>
/// <param name="Theta">Channel along theta; null where not stated.</param>
/// <param name="Phi">Channel along phi; null where not stated.</param>
/// <param name="Right">Right-hand channel; null where not stated.</param>
/// <param name="Left">Left-hand channel; null where not stated.</param>
public sealed record ManifestProbe(string? Theta = null, string? Phi = null, string? Right = null, string? Left = null);
