using RangeReduce.Quantities;

namespace RangeReduce.Runs;

/// <summary>One file of the measurement folder and what it was taken for.</summary>
/// <param name="Id">Id within the run: <c>i1</c>, <c>i2</c>, ... in the order of the paths.</param>
/// <param name="Path">Path relative to the measurement folder, with forward slashes.</param>
/// <param name="Sha256">SHA-256 of the bytes in lower-case hexadecimal.</param>
/// <param name="Bytes">Size in bytes.</param>
/// <param name="Kind">What the file holds.</param>
/// <param name="State">Configuration state; null where it belongs to none.</param>
/// <param name="Source">Measured or simulated; null where neither applies.</param>
/// <param name="Reason">Why it was taken for this, in a few words (<c>run.toml</c>, <c>folder name</c>, <c>file content</c>).</param>
public sealed record InputFile(string Id, string Path, string Sha256, long Bytes, InputKind Kind, string? State, DataSource? Source, string Reason);
