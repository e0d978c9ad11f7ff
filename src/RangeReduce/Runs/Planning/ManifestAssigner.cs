using RangeReduce.Diagnostics;
using RangeReduce.Runs.Discovery;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>Assigns files by the patterns of the manifest.</summary>
internal sealed class ManifestAssigner
{
    private readonly List<Claim> _claims;
    private readonly HashSet<Claim> _used = [];
    private readonly List<Remark> _remarks;
    private readonly HashSet<string> _gainTables;

    /// <summary>Prepares the patterns.</summary>
    public ManifestAssigner(RunManifest manifest, IReadOnlyList<FoundFile> files, List<Remark> remarks)
    {
        _claims = Claim.Of(manifest);
        _remarks = remarks;
        var table = manifest.GainStandard?.Table;
        _gainTables = [.. files.Where(file => file.PassedOver is null && table?.Matches(file.Path) == true).Select(file => file.Path)];
        if (_gainTables.Count > 1)
        {
            remarks.Add(new(RemarkSeverity.Fault, "several-gain-tables", $"The pattern {table} of the gain table fits {_gainTables.Count} files, so none is used. Name one.", table!.Place));
        }
    }

    /// <summary>Assigns a file; null where no pattern fits.</summary>
    /// <param name="path">Path relative to the measurement folder.</param>
    /// <param name="guess">What its content seems to be.</param>
    public Assignment? Assign(string path, InputKind guess)
    {
        // The gain table may lie among the cuts of the standard: its own line in the manifest wins.
        var isGainTable = _gainTables.Contains(path);
        Claim[] claims = [.. _claims.Where(claim => claim.Pattern.Matches(path) && (!isGainTable || claim.Kind == InputKind.GainTable || claim.State is not null))];
        _used.UnionWith(claims);
        if (claims.Length == 0)
        {
            return null;
        }

        var owners = claims.Select(claim => claim.State).Distinct(StringComparer.Ordinal).Select(state => state is null ? "the gain standard" : $"state {state}").ToArray();
        if (owners.Length > 1)
        {
            return Refuse(path, "claimed-twice", $"run.toml gives the file to {string.Join(" and to ", owners)}, so it was not used. Give it to one.");
        }

        if (claims.Select(claim => claim.Source).Distinct().Count() > 1)
        {
            return Refuse(path, "claimed-twice", $"run.toml calls the file both measured and simulated for {owners[0]}, so it was not used. Give it to one.");
        }

        if (isGainTable && _gainTables.Count > 1)
        {
            return Assignment.Other("one of several gain tables");
        }

        var kinds = claims.Select(claim => claim.Kind).Distinct().ToArray();
        var kind = kinds.Length == 1 ? kinds[0] : guess == InputKind.Sweep ? InputKind.Sweep : kinds.First(each => each != InputKind.Sweep);
        return new(kind, claims[0].State, claims[0].Source, Assignment.ByManifest) { IsOfGainStandard = claims[0].State is null, IsKindOpen = kinds.Length > 1 };
    }

    /// <summary>Remarks on every pattern that fitted no file.</summary>
    public void Finish(IEnumerable<string> paths)
    {
        var all = paths.ToArray();
        foreach (var claim in _claims.Where(claim => !_used.Contains(claim)))
        {
            var nearest = all.Length == 0 ? string.Empty : $" The nearest path is {NearestName.Of(claim.Pattern.Text, all)}.";
            _remarks.Add(new(RemarkSeverity.Fault, "pattern-without-file", $"No file fits {FoundText.Show(claim.Pattern.Text)}.{nearest}", claim.Pattern.Place, claim.State));
        }
    }

    private Assignment Refuse(string path, string code, string text)
    {
        _remarks.Add(new(RemarkSeverity.Fault, code, text, new(path)));
        return Assignment.Other("claimed twice in run.toml");
    }
}
