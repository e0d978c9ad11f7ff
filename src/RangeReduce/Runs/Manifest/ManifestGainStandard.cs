namespace RangeReduce.Runs.Manifest;

/// <summary>The <c>[gain-standard]</c> table.</summary>
/// <param name="Table">Pattern of the one file with the gain over frequency; null where none is named.</param>
/// <param name="Cuts">Patterns of the levels of the standard; the gain table never counts as one of them.</param>
/// <param name="Sweeps">Patterns of the reflection sweeps of the standard.</param>
public sealed record ManifestGainStandard(GlobPattern? Table, IReadOnlyList<GlobPattern> Cuts, IReadOnlyList<GlobPattern> Sweeps);
