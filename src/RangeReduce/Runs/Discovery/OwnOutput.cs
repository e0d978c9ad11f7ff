namespace RangeReduce.Runs.Discovery;

/// <summary>Knows a report folder that an earlier reduction wrote, so that figures are never read back as measurements.</summary>
internal static class OwnOutput
{
    /// <summary>Word that the results file carries as its format.</summary>
    public const string Format = "rangereduce-results";

    private const int HeadBytes = 4096;
    private static readonly string[] Names = ["report.pdf", "report.html", "results.json", "figures.csv"];
    private static readonly string[] Folders = ["traces", "plots"];

    /// <summary>Says whether a folder holds a results file of ours.</summary>
    public static bool IsIn(string folder)
    {
        try
        {
            var file = new FileInfo(Path.Combine(folder, "results.json"));
            if (!file.Exists || file.LinkTarget is not null || file.Length == 0)
            {
                return false;
            }

            var head = new byte[HeadBytes];
            using var stream = file.OpenRead();
            var length = stream.ReadAtLeast(head, HeadBytes, throwOnEndOfStream: false);
            return head.AsSpan(0, length).IndexOf("\"rangereduce-results\""u8) >= 0;
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return false;
        }
    }

    /// <summary>Says whether a name directly inside a report folder is one that a reduction writes.</summary>
    public static bool Writes(string name, bool isFolder) => (isFolder ? Folders : Names).Contains(name, StringComparer.Ordinal);
}
