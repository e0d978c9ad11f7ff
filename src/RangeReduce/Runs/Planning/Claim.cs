using RangeReduce.Quantities;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>One pattern of the manifest and what it makes of the files that fit.</summary>
/// <param name="Pattern">The pattern.</param>
/// <param name="State">State that claims; null for the gain standard.</param>
/// <param name="Source">Measured or simulated; null for a gain table.</param>
/// <param name="Kind">What the file is claimed to hold.</param>
internal sealed record Claim(GlobPattern Pattern, string? State, DataSource? Source, InputKind Kind)
{
    /// <summary>Gives all claims of a manifest.</summary>
    public static List<Claim> Of(RunManifest manifest)
    {
        var claims = new List<Claim>();
        if (manifest.GainStandard is { } standard)
        {
            Add(standard.Table is null ? [] : [standard.Table], null, null, InputKind.GainTable);
            Add(standard.Cuts, null, DataSource.Measured, InputKind.GainStandardCut);
            Add(standard.Sweeps, null, DataSource.Measured, InputKind.Sweep);
        }

        foreach (var state in manifest.States)
        {
            Add(state.Sweeps, state.Name, DataSource.Measured, InputKind.Sweep);
            Add(state.Cuts, state.Name, DataSource.Measured, InputKind.Cut);
            Add(state.SimulatedSweeps, state.Name, DataSource.Simulated, InputKind.Sweep);
            Add(state.SimulatedCuts, state.Name, DataSource.Simulated, InputKind.Cut);
        }

        return claims;

        void Add(IEnumerable<GlobPattern> patterns, string? state, DataSource? source, InputKind kind) =>
            claims.AddRange(patterns.Select(pattern => new Claim(pattern, state, source, kind)));
    }
}
