namespace RangeReduce.Runs.Planning;

/// <summary>A file and what it is going to be read as.</summary>
/// <param name="Input">The file with its kind, state and source.</param>
/// <param name="FullPath">Path for opening.</param>
public sealed record PlannedFile(InputFile Input, string FullPath)
{
    /// <summary>Gets whether the file belongs to the gain standard.</summary>
    public bool IsOfGainStandard { get; init; }

    /// <summary>Gets whether the manifest leaves it to the content whether the file is a sweep or a cut.</summary>
    public bool IsKindOpen { get; init; }

    /// <summary>Gets whether the file is read as data.</summary>
    public bool IsRead => Input.Kind is not (InputKind.Other or InputKind.Manifest);
}
