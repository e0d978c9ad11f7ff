using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Manifest;

/// <summary>One table of the manifest with its keys in order.</summary>
/// <param name="Name">Name of the table; empty for keys above the first one.</param>
/// <param name="IsArrayItem">Whether it is one of several tables of this name, written with double brackets.</param>
/// <param name="Place">Where it begins.</param>
/// <param name="Entries">Its keys.</param>
internal sealed record ManifestSection(string Name, bool IsArrayItem, SourcePlace Place, List<ManifestEntry> Entries);
