using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Planning;

/// <summary>What a first look at a file gave.</summary>
/// <param name="Guess">What it seems to hold.</param>
/// <param name="Sha256">SHA-256 of its bytes; empty where it is no data and too large to be worth it, or cannot be read.</param>
/// <param name="Fault">What makes it unusable; null where nothing does.</param>
internal sealed record Inspection(InputKind Guess, string Sha256, MeasurementDataException? Fault);
