using System.Globalization;
using System.Text;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Runs.Manifest;

/// <summary>Writes the manifest that says what was understood of a folder, ready to be corrected. Read back, it gives the same run.</summary>
public static class ManifestDraft
{
    /// <summary>Writes the text of a run.toml.</summary>
    /// <param name="run">The run as it was read.</param>
    /// <param name="manifest">The manifest that it was read with; null where there was none.</param>
    public static string Write(MeasurementRun run, RunManifest? manifest)
    {
        ArgumentNullException.ThrowIfNull(run);
        var draft = new StringBuilder();
        Table(draft, "[run]", ("name", run.Information.Name), ("date", run.Information.Date), ("operator", run.Information.Operator), ("chamber", run.Information.Chamber), ("notes", run.Information.Notes), ("antenna", run.Information.Antenna), ("serial", run.Information.Serial));
        Lists(draft, ("tags", run.Information.Tags));
        Conventions(draft, run, manifest);
        var axis = UnitText.Write(run.AxisDeg, UnitDimension.Angle);
        Table(draft, "[antenna]" + Assumed(manifest?.AxisDeg is null ? "assumed" : string.Empty), ("axis", axis), ("largest-dimension", run.LargestDimensionM is { } size ? UnitText.Write(size, UnitDimension.Length) : null));
        if (run.RangeLengthM is { } length)
        {
            Table(draft, "[range]", ("length", UnitText.Write(length, UnitDimension.Length)));
        }

        Files(draft, run);
        if (run.UncertaintyTerms.Count > 0)
        {
            Table(draft, "[uncertainty]", [.. run.UncertaintyTerms.Select(term => (term.Name, (string?)string.Create(CultureInfo.InvariantCulture, $"{term.Value:R} {term.Unit}")))]);
        }

        if (run.Information.ReportFields.Count > 0)
        {
            Table(draft, "[report]", [.. run.Information.ReportFields.OrderBy(field => field.Key, StringComparer.Ordinal).Select(field => (field.Key, (string?)field.Value))]);
        }

        foreach (var column in manifest?.Columns ?? [])
        {
            Table(draft, "[[columns]]", ("heading", column.Heading), ("meaning", column.Meaning));
        }

        foreach (var requirement in run.Requirements)
        {
            Requirement(draft, requirement);
        }

        return draft.ToString();
    }

    private static void Conventions(StringBuilder draft, MeasurementRun run, RunManifest? manifest)
    {
        var used = run.Conventions;
        Table(draft, "[conventions]" + Assumed(used.TimeFrom), ("time", TimeFactorText.Write(used.Time)));
        if (manifest?.Probe is { } probe && (probe.Theta ?? probe.Right) is not null)
        {
            Table(draft, "[probe]", ("theta", probe.Theta), ("phi", probe.Phi), ("right", probe.Right), ("left", probe.Left));
        }
        else if (used.PortsFrom is "assumed" && run.Cuts.Any(cut => cut.Cut.Basis == PolarizationBasis.ThetaPhi))
        {
            Table(draft, "[probe]" + Assumed(used.PortsFrom), ("theta", used.ThetaPort), ("phi", used.PhiPort));
        }
    }

    private static void Files(StringBuilder draft, MeasurementRun run)
    {
        foreach (var state in run.States)
        {
            Table(draft, "[[state]]", ("name", state.Name), ("intended-hand", state.IntendedHand is { } meant ? HandText.Write(meant) : null), ("known-hand", state.KnownHand is { } known ? HandText.Write(known) : null));
            Lists(
                draft,
                ("sweeps", Patterns(run, input => IsOf(input, state, InputKind.Sweep, DataSource.Measured))),
                ("cuts", Patterns(run, input => IsOf(input, state, InputKind.Cut, DataSource.Measured))),
                ("simulated-sweeps", Patterns(run, input => IsOf(input, state, InputKind.Sweep, DataSource.Simulated))),
                ("simulated-cuts", Patterns(run, input => IsOf(input, state, InputKind.Cut, DataSource.Simulated))));
        }

        var table = run.Inputs.FirstOrDefault(input => run.GainStandard is { } standard ? string.Equals(input.Id, standard.TableInputId, StringComparison.Ordinal) : input.Kind == InputKind.GainTable);
        var cuts = Patterns(run, input => input.Kind == InputKind.GainStandardCut);
        var sweeps = Patterns(run, input => input is { Kind: InputKind.Sweep, State: null });
        if (table is not null || cuts.Length + sweeps.Length > 0)
        {
            Table(draft, "[gain-standard]", ("table", table is null ? null : Literal(table.Path)));
            Lists(draft, ("cuts", cuts), ("sweeps", sweeps));
        }
    }

    private static void Requirement(StringBuilder draft, Requirement requirement)
    {
        var unit = UnitText.DimensionOf(requirement.Quantity.Unit);
        Table(
            draft,
            "[[requirement]]",
            ("quantity", requirement.Quantity.Id),
            ("state", requirement.State),
            ("other-state", requirement.OtherState),
            ("component", requirement.Component == FieldComponent.None ? null : HandText.Write(requirement.Component)),
            ("band", requirement is { BandLowHz: { } low, BandHighHz: { } high } ? $"{UnitText.Write(low, UnitDimension.Frequency)} {UnitText.RangeMark} {UnitText.Write(high, UnitDimension.Frequency)}" : null),
            ("cone", requirement.ConeDeg is { } cone ? UnitText.Write(cone, UnitDimension.Angle) : null),
            ("at-least", requirement.AtLeast is { } least ? UnitText.Write(least, unit) : null),
            ("at-most", requirement.AtMost is { } most ? UnitText.Write(most, unit) : null),
            ("equals", requirement.EqualTo is { } hand ? HandText.Write(hand) : null));
    }

    /// <summary>Gives patterns for a group of files: one for a folder and ending where it fits the group only, else the paths.</summary>
    private static string[] Patterns(MeasurementRun run, Func<InputFile, bool> belongs)
    {
        var patterns = new List<string>();
        foreach (var alike in run.Inputs.Where(belongs).GroupBy(input => FolderAndEnding(input.Path), StringComparer.Ordinal))
        {
            var pattern = GlobPattern.Parse(alike.Key, default);
            var fits = run.Inputs.Where(input => pattern.Matches(input.Path)).ToArray();
            var several = alike.Skip(1).Any();
            patterns.AddRange(several && fits.All(input => belongs(input) || input.Kind == InputKind.GainTable) ? [alike.Key] : alike.Select(input => Literal(input.Path)));
        }

        return [.. patterns];
    }

    private static string FolderAndEnding(string path) => $"{Literal(path)[..(path.LastIndexOf('/') + 1)]}*{Literal(Path.GetExtension(path))}";

    // A pattern has no escape; a question mark stands for the one character that would mean something else.
    private static string Literal(string path) => path.Replace('*', '?').Replace('\\', '?').Replace(':', '?');

    private static bool IsOf(InputFile input, ConfigurationState state, InputKind kind, DataSource source) =>
        input.Kind == kind && input.Source == source && string.Equals(input.State, state.Name, StringComparison.Ordinal);

    private static string Assumed(string from) => from is "assumed" ? "  # assumed: correct it where it is wrong" : string.Empty;

    private static void Table(StringBuilder draft, string header, params ReadOnlySpan<(string Key, string? Value)> entries)
    {
        _ = draft.Length > 0 ? draft.Append('\n') : draft;
        draft.Append(header).Append('\n');
        foreach (var (key, value) in entries)
        {
            _ = value is null ? draft : draft.Append(TomlText.Key(key)).Append(" = ").Append(TomlText.Quoted(value)).Append('\n');
        }
    }

    private static void Lists(StringBuilder draft, params ReadOnlySpan<(string Key, IReadOnlyList<string> Values)> lists)
    {
        foreach (var (key, values) in lists)
        {
            _ = values.Count == 0 ? draft : draft.Append(key).Append(" = ").Append(TomlText.List([.. values])).Append('\n');
        }
    }
}
