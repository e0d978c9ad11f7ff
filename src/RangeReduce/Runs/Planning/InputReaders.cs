using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>The readers of the house.</summary>
internal sealed class InputReaders : IInputReaders
{
    /// <summary>All readers.</summary>
    public static readonly IInputReaders All = new InputReaders();

    /// <inheritdoc/>
    public InputKind Recognise(string path, ReadOnlySpan<byte> head) => InputKind.Other;

    /// <inheritdoc/>
    public InputContent Read(string fullPath, string displayPath, IReadOnlyList<ManifestColumn> columns) => throw new NotSupportedException();
}
