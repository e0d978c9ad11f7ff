using RangeReduce.Diagnostics;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs.Assembly;

/// <summary>Settles, once the content is known, what each file counts as.</summary>
internal static class KindSettler
{
    /// <summary>Gives the reading with its final kind; a file whose content contradicts the manifest beyond use loses its content.</summary>
    public static FileReading Settle(FileReading reading, List<Remark> remarks)
    {
        if (reading.Content is not { } content)
        {
            return reading;
        }

        var (planned, found) = (reading.File.Input.Kind, KindOf(reading.File, content));
        if (planned == found)
        {
            return reading;
        }

        var stated = string.Equals(reading.File.Input.Reason, Assignment.ByManifest, StringComparison.Ordinal);
        if (!stated || reading.File.IsKindOpen || (planned == InputKind.GainStandardCut && found == InputKind.GainTable))
        {
            return found == InputKind.GainTable ? As(reading, found, state: null) : As(reading, found, reading.File.Input.State);
        }

        if (planned is InputKind.GainTable || found is InputKind.GainTable)
        {
            remarks.Add(new(RemarkSeverity.Fault, "kind-contradiction", $"run.toml calls the file {Words(planned)}, but it holds {Words(found)}, so it was not used.", new(reading.File.Input.Path), reading.File.Input.State));
            return As(reading, InputKind.Other, reading.File.Input.State) with { Content = null };
        }

        remarks.Add(new(RemarkSeverity.Doubt, "kind-contradiction", $"run.toml calls the file {Words(planned)}, but it holds {Words(found)}, and was used as that.", new(reading.File.Input.Path), reading.File.Input.State));
        return As(reading, found, reading.File.Input.State);
    }

    private static InputKind KindOf(PlannedFile file, InputContent content) =>
        content.Kind == InputKind.Cut && file.IsOfGainStandard ? InputKind.GainStandardCut : content.Kind;

    private static FileReading As(FileReading reading, InputKind kind, string? state)
    {
        var ofStandard = reading.File.IsOfGainStandard || kind == InputKind.GainTable;
        var input = reading.File.Input with { Kind = kind, State = state, Source = kind == InputKind.GainTable ? null : reading.File.Input.Source };
        return reading with { File = reading.File with { Input = input, IsOfGainStandard = ofStandard } };
    }

    private static string Words(InputKind kind) => kind switch
    {
        InputKind.Sweep => "a sweep",
        InputKind.GainTable => "the gain table of the standard",
        _ => "cuts",
    };
}
