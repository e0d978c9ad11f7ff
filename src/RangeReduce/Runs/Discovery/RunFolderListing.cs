using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Discovery;

/// <summary>What a measurement folder holds.</summary>
/// <param name="Folder">Full path of the folder.</param>
/// <param name="Files">Its files, in ordinal order of their paths.</param>
/// <param name="Remarks">What was not followed or could not be opened.</param>
public sealed record RunFolderListing(string Folder, IReadOnlyList<FoundFile> Files, IReadOnlyList<Remark> Remarks);
