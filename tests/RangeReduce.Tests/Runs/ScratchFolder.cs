using System.Globalization;

namespace RangeReduce.Tests.Runs;

/// <summary>A folder below the system's temporary one that goes away at the end of the test.</summary>
internal sealed class ScratchFolder : IDisposable
{
    public ScratchFolder() => Path = Directory.CreateTempSubdirectory("rangereduce-test-").FullName;

    /// <summary>Gets the full path.</summary>
    public string Path { get; }

    /// <summary>Gives the full path of something inside.</summary>
    public string At(string relative) => System.IO.Path.Combine(Path, relative);

    /// <summary>Writes a file, with the folders above it.</summary>
    public void Write(string relative, string text)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(At(relative))!);
        File.WriteAllText(At(relative), text);
    }

    /// <summary>Writes a file of bytes.</summary>
    public void Write(string relative, byte[] bytes)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(At(relative))!);
        File.WriteAllBytes(At(relative), bytes);
    }

    /// <summary>Formats with the invariant culture.</summary>
    public static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
