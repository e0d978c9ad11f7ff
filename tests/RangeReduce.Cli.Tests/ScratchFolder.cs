namespace RangeReduce.Cli.Tests;

/// <summary>A folder for one test, removed afterwards.</summary>
internal sealed class ScratchFolder : IDisposable
{
    public ScratchFolder() => Directory.CreateDirectory(Path);

    public string Path { get; } = System.IO.Path.Combine(System.IO.Path.GetTempPath(), "rangereduce-" + Guid.NewGuid().ToString("N"));

    public string Of(params string[] parts) => System.IO.Path.Combine([Path, .. parts]);

    public string Write(string name, string text)
    {
        var path = Of(name);
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(path)!);
        File.WriteAllText(path, text);
        return path;
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
