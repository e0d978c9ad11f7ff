namespace RangeReduce.Runs.Discovery;

/// <summary>What the path of a file says about it.</summary>
internal sealed record NameFacts
{
    /// <summary>Gets whether a word of the path tells of a simulation.</summary>
    public bool IsSimulated { get; private init; }

    /// <summary>Gets whether a word of the path tells of the gain standard.</summary>
    public bool IsGainStandard { get; private init; }

    /// <summary>Gets the state by the innermost folder that names one; null where none does.</summary>
    public string? FolderState { get; private init; }

    /// <summary>Gets the words of the file name that may name a state, joined by hyphens; null where there are none.</summary>
    public string? NameState { get; private init; }

    /// <summary>Takes the facts out of a path.</summary>
    /// <param name="path">Path relative to the measurement folder, with forward slashes.</param>
    public static NameFacts Of(string path)
    {
        var parts = path.Split('/');
        var stem = Path.GetFileNameWithoutExtension(parts[^1]);
        var folders = parts[..^1];
        var words = folders.Append(stem).SelectMany(NameWords.Of).ToArray();
        var folderState = folders.Where(folder => Naming(folder).Length > 0).LastOrDefault();
        var naming = Naming(stem);
        return new()
        {
            IsSimulated = words.Any(NameWords.IsSimulated),
            IsGainStandard = words.Any(NameWords.IsGainStandard) || (folderState is null && naming.Length == 0 && words.Any(NameWords.IsReference)),
            FolderState = folderState is null ? null : string.Join('-', Naming(folderState)),
            NameState = naming.Length == 0 ? null : string.Join('-', naming),
        };
    }

    private static string[] Naming(string name) => [.. NameWords.Of(name).Where(word => !NameWords.IsSimulated(word) && !NameWords.IsGainStandard(word) && !NameWords.IsReference(word) && !NameWords.IsPlain(word))];
}
