namespace RangeReduce.Runs.Discovery;

/// <summary>Follows symbolic links to where they really lead.</summary>
internal static class RealPath
{
    private const int MostHops = 64;

    /// <summary>Gives the path with every symbolic link in it replaced by its target; null where a link leads in a circle.</summary>
    /// <param name="path">Any path.</param>
    public static string? Of(string path)
    {
        var left = new Stack<string>(Path.GetFullPath(path).Split(Path.DirectorySeparatorChar, StringSplitOptions.RemoveEmptyEntries).Reverse());
        var real = Path.GetPathRoot(Path.GetFullPath(path)) ?? string.Empty;
        for (var hops = 0; left.TryPop(out var part);)
        {
            var next = Path.Combine(real, part);
            if (new FileInfo(next).LinkTarget is not { } target)
            {
                real = next;
                continue;
            }

            if (++hops > MostHops)
            {
                return null;
            }

            var full = Path.GetFullPath(Path.Combine(real, target));
            real = Path.GetPathRoot(full) ?? string.Empty;
            foreach (var piece in full.Split(Path.DirectorySeparatorChar, StringSplitOptions.RemoveEmptyEntries).Reverse())
            {
                left.Push(piece);
            }
        }

        return real;
    }

    /// <summary>Says whether a path is a folder or lies below it; both must be real paths.</summary>
    public static bool IsInside(string path, string folder) =>
        string.Equals(path, folder, StringComparison.Ordinal) || path.StartsWith(Path.TrimEndingDirectorySeparator(folder) + Path.DirectorySeparatorChar, StringComparison.Ordinal);
}
