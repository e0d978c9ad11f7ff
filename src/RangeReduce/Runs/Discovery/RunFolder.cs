using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Discovery;

/// <summary>Walks a measurement folder without ever leaving it.</summary>
/// <remarks>Links to folders are not followed, which rules out loops; a link to a file is followed only where its target lies in the same folder.</remarks>
public static class RunFolder
{
    /// <summary>Files at most; a folder with more is not a measurement folder but a disk.</summary>
    public const int MostFiles = 20_000;

    /// <summary>Folders inside one another at most.</summary>
    public const int Deepest = 16;

    private static readonly EnumerationOptions Everything = new() { AttributesToSkip = FileAttributes.None, ReturnSpecialDirectories = false, IgnoreInaccessible = false };

    /// <summary>Lists the files of a folder.</summary>
    /// <param name="folder">The measurement folder.</param>
    /// <param name="cancellationToken">Stops the walk.</param>
    /// <exception cref="MeasurementDataException">The folder does not exist, is a file, or holds too many files.</exception>
    public static RunFolderListing Walk(string folder, CancellationToken cancellationToken = default)
    {
        ArgumentException.ThrowIfNullOrEmpty(folder);
        var root = Path.TrimEndingDirectorySeparator(Path.GetFullPath(folder));
        if (!Directory.Exists(root))
        {
            throw File.Exists(root)
                ? new MeasurementDataException(new(folder), "not-a-folder", "a file", "a measurement folder", "Name the folder that holds the sweeps and cuts.")
                : new MeasurementDataException(new(folder), "no-folder", "nothing", "a measurement folder", "Check the spelling of the path.");
        }

        var (files, remarks) = (new List<FoundFile>(), new List<Remark>());
        var realRoot = RealPath.Of(root) ?? root;
        var waiting = new Stack<(DirectoryInfo Folder, string Relative, int Depth, bool Own)>();
        waiting.Push((new(root), string.Empty, 0, false));
        while (waiting.TryPop(out var here))
        {
            cancellationToken.ThrowIfCancellationRequested();
            foreach (var entry in EntriesOf(here.Folder, here.Relative, remarks))
            {
                var relative = here.Relative + Shown(entry.Name);
                var place = new SourcePlace(relative);
                if (entry.LinkTarget is not null && WhyNotFollowed(entry, realRoot) is { } why)
                {
                    remarks.Add(new(RemarkSeverity.Doubt, "link-not-followed", $"A symbolic link was not followed: {why}.", place));
                }
                else if (entry is DirectoryInfo inner)
                {
                    var own = here.Own || (here.Depth == 0 && OwnOutput.Writes(entry.Name, isFolder: true) && OwnOutput.IsIn(root));
                    if (entry.Name.StartsWith('.'))
                    {
                        remarks.Add(new(RemarkSeverity.Note, "hidden-folder", "A hidden folder was passed over.", place));
                    }
                    else if (OwnOutput.IsIn(inner.FullName))
                    {
                        remarks.Add(new(RemarkSeverity.Note, "own-output", "A report folder of an earlier reduction was passed over.", place));
                    }
                    else if (here.Depth >= Deepest)
                    {
                        remarks.Add(new(RemarkSeverity.Fault, "too-deep", $"A folder more than {Deepest} levels down was passed over.", place));
                    }
                    else
                    {
                        waiting.Push((inner, relative + "/", here.Depth + 1, own));
                    }
                }
                else
                {
                    var own = here.Own || (here.Depth == 0 && OwnOutput.Writes(entry.Name, isFolder: false) && OwnOutput.IsIn(root));
                    // The length of a link is that of its text, so the target is asked.
                    var real = entry.LinkTarget is null ? (FileInfo)entry : new(RealPath.Of(entry.FullName)!);
                    files.Add(new(relative, real.FullName, real.Length, PassedOver(entry.Name, relative, own)));
                }

                if (files.Count > MostFiles)
                {
                    throw new MeasurementDataException(new(folder), "too-many-files", $"more than {MostFiles} files", "a measurement folder", "Name the folder of one run.");
                }
            }
        }

        return new(root, [.. files.OrderBy(file => file.Path, StringComparer.Ordinal)], [.. remarks.OrderBy(remark => remark.Place?.File, StringComparer.Ordinal)]);
    }

    private static FileSystemInfo[] EntriesOf(DirectoryInfo folder, string relative, List<Remark> remarks)
    {
        try
        {
            return [.. folder.EnumerateFileSystemInfos("*", Everything).Take(MostFiles + 2)];
        }
        catch (Exception error) when (relative.Length > 0 && error is IOException or UnauthorizedAccessException)
        {
            remarks.Add(new(RemarkSeverity.Fault, "unreadable-folder", "The folder could not be listed; its files are missing from the run. Check its permissions.", new(relative.TrimEnd('/'))));
            return [];
        }
    }

    private static string? WhyNotFollowed(FileSystemInfo link, string realRoot)
    {
        var target = RealPath.Of(link.FullName);
        return target switch
        {
            null => "it leads in a circle",
            _ when link is DirectoryInfo && RealPath.IsInside(link.FullName, target) => "it leads to a folder that it lies in, so it would never end",
            _ when !RealPath.IsInside(target, realRoot) => "it leads out of the measurement folder; copy the data into it",
            _ when link is DirectoryInfo => "it leads to a folder of the same run, which is read anyway",
            _ when !File.Exists(target) => "its target does not exist",
            _ => null,
        };
    }

    private static string? PassedOver(string name, string relative, bool own) =>
        own ? "output of an earlier reduction" :
        name.StartsWith('.') ? "hidden" :
        !relative.EndsWith(name, StringComparison.Ordinal) ? "control characters in the name" :
        null;

    private static string Shown(string name) => name.Any(char.IsControl) ? string.Concat(name.Select(character => char.IsControl(character) ? $"\\u{(int)character:X4}" : character.ToString())) : name;
}
