using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>The readers of data files, seen from a measurement folder.</summary>
internal interface IInputReaders
{
    /// <summary>Says by its name and first bytes what a file seems to hold; <see cref="InputKind.Other"/> where it seems to be no measurement data.</summary>
    /// <param name="path">Path, for its ending.</param>
    /// <param name="head">The first bytes of the file, cut anywhere.</param>
    InputKind Recognise(string path, ReadOnlySpan<byte> head);

    /// <summary>Reads a file.</summary>
    /// <param name="fullPath">Path for opening.</param>
    /// <param name="displayPath">Path for messages.</param>
    /// <param name="columns">What the manifest says about headings.</param>
    /// <exception cref="Diagnostics.MeasurementDataException">The file is wrong.</exception>
    InputContent Read(string fullPath, string displayPath, IReadOnlyList<ManifestColumn> columns);
}
