using RangeReduce.Diagnostics;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs.Assembly;

/// <summary>Finds files with the same bytes: copies inside a state are used once, copies across states are a sign of a mix-up.</summary>
internal static class RepeatedFiles
{
    /// <summary>Gives the ids of files that are byte for byte copies of an earlier file with the same use.</summary>
    public static HashSet<string> CopiesAmong(IEnumerable<PlannedFile> files, List<Remark> remarks)
    {
        var copies = new HashSet<string>(StringComparer.Ordinal);
        foreach (var same in files.Where(file => file.IsRead && file.Input.Sha256.Length > 0).GroupBy(file => file.Input.Sha256, StringComparer.Ordinal).Where(group => group.Skip(1).Any()))
        {
            var seen = new List<PlannedFile>();
            foreach (var file in same)
            {
                if (seen.Find(known => Use(known) == Use(file)) is { } first)
                {
                    copies.Add(file.Input.Id);
                    remarks.Add(new(RemarkSeverity.Note, "same-file-twice", $"The file is byte for byte the same as {first.Input.Path} and was used once.", new(file.Input.Path), file.Input.State));
                }
                else
                {
                    if (seen.Count > 0)
                    {
                        remarks.Add(new(RemarkSeverity.Doubt, "same-bytes-elsewhere", $"The file is byte for byte the same as {seen[0].Input.Path}, which {Words(seen[0])}, while this one {Words(file)}. One of them is probably mislabelled.", new(file.Input.Path), file.Input.State));
                    }

                    seen.Add(file);
                }
            }
        }

        return copies;
    }

    private static (string? State, Quantities.DataSource? Source, bool IsOfGainStandard) Use(PlannedFile file) => (file.Input.State, file.Input.Source, file.IsOfGainStandard);

    private static string Words(PlannedFile file) =>
        file.IsOfGainStandard ? "belongs to the gain standard" : $"is {(file.Input.Source == Quantities.DataSource.Simulated ? "simulated" : "measured")} for state {file.Input.State}";
}
