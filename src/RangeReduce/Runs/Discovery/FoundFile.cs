namespace RangeReduce.Runs.Discovery;

/// <summary>A file that the walk through a measurement folder came by.</summary>
/// <param name="Path">Path relative to the folder, with forward slashes.</param>
/// <param name="FullPath">Path for opening.</param>
/// <param name="Bytes">Size in bytes.</param>
/// <param name="PassedOver">Why the file is listed but not looked into; null for an ordinary one.</param>
public sealed record FoundFile(string Path, string FullPath, long Bytes, string? PassedOver);
