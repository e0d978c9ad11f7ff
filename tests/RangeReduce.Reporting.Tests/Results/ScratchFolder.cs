namespace RangeReduce.Reporting.Tests.Results;

/// <summary>A folder of its own for one test, gone afterwards.</summary>
internal sealed class ScratchFolder : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("results-");

    /// <summary>Gives the path of something in it.</summary>
    public string Of(string name) => Path.Combine(_folder.FullName, name);

    /// <summary>Gives the names of everything in it, hidden things included.</summary>
    public string[] Names => [.. _folder.EnumerateFileSystemInfos().Select(entry => entry.Name).Order(StringComparer.Ordinal)];

    /// <inheritdoc/>
    public void Dispose() => _folder.Delete(recursive: true);
}
