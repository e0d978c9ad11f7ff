namespace RangeReduce.Tests.EndToEnd;

/// <summary>Finds the files of the repository from wherever the tests run.</summary>
internal static class Repository
{
    /// <summary>Gets the folder that holds the solution.</summary>
    public static string Root { get; } = FindRoot();

    /// <summary>Gives a path below the root.</summary>
    public static string PathOf(params string[] parts) => Path.Combine([Root, .. parts]);

    private static string FindRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "RangeReduce.sln")))
            {
                return folder.FullName;
            }
        }

        throw new InvalidOperationException("The tests must run inside the repository.");
    }
}
