using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Manifest;

/// <summary>Checks of a manifest that look at more than one key.</summary>
internal static class ManifestChecks
{
    private static readonly string[] Known = ["run", "conventions", "probe", "antenna", "range", "state", "gain-standard", "uncertainty", "report", "columns", "requirement"];
    private static readonly string[] Repeated = ["state", "columns", "requirement"];

    /// <summary>Holds the names of the tables and their brackets to what is known.</summary>
    public static void Tables(List<ManifestSection> sections, List<MeasurementDataException> errors)
    {
        foreach (var section in sections)
        {
            if (section.Name.Length == 0)
            {
                errors.AddRange(section.Entries.Select(entry => new MeasurementDataException(
                    entry.KeyPlace, "key-without-table", $"the key {FoundText.Show(entry.Key)} above the first table", "keys below a table such as [run]", $"Write a table above it; the nearest table name is [{NearestName.Of(entry.Key, Known)}].")));
            }
            else if (!Known.Contains(section.Name, StringComparer.Ordinal))
            {
                var nearest = NearestName.Of(section.Name, Known);
                var written = Repeated.Contains(nearest, StringComparer.Ordinal) ? $"[[{nearest}]]" : $"[{nearest}]";
                errors.Add(new(section.Place, "unknown-table", $"the unknown table {FoundText.Show(section.Name)}", $"one of {string.Join(", ", Known)}", $"The nearest known table is {written}."));
            }
            else if (section.IsArrayItem != Repeated.Contains(section.Name, StringComparer.Ordinal))
            {
                var written = section.IsArrayItem ? $"[{section.Name}], which there is only once" : $"[[{section.Name}]], since there can be several";
                errors.Add(new(section.Place, "bad-table", $"the table {section.Name} in {(section.IsArrayItem ? "double" : "single")} brackets", written, "Correct the brackets."));
            }
        }
    }

    /// <summary>Holds the probe ports to one channel for each component, stated in pairs.</summary>
    public static void Probe(ManifestProbe? probe, List<ManifestSection> sections, List<MeasurementDataException> errors)
    {
        var entries = sections.Where(section => section.Name is "probe").SelectMany(section => section.Entries).ToArray();
        if (probe is null || entries.Length == 0)
        {
            return;
        }

        var place = entries[0].KeyPlace;
        string[] stated = [.. new[] { probe.Theta, probe.Phi, probe.Right, probe.Left }.OfType<string>()];
        var channels = stated.Select(ProbePort.NameOf).ToArray();
        if (channels.Any(channel => channel.Length == 0))
        {
            errors.Add(new(place, "bad-value", "a port without name", "the name of a recorded channel, such as \"H\" or \"-H\"", "Name the channel."));
        }
        else if (channels.Distinct(StringComparer.OrdinalIgnoreCase).Count() < channels.Length)
        {
            errors.Add(new(place, "bad-value", "one channel named for two components", "a channel for each component", "Give each component its own channel."));
        }
        else if ((probe.Theta is null) != (probe.Phi is null) || (probe.Right is null) != (probe.Left is null))
        {
            errors.Add(new(place, "missing-key", "one port of a pair", "both theta and phi, or both right and left", "State the other port too, since a half-stated pair is how a hand gets lost."));
        }
    }

    /// <summary>Holds state names to be unique, and the states that requirements name to exist.</summary>
    public static void States(RunManifest manifest, List<ManifestSection> sections, List<MeasurementDataException> errors)
    {
        var names = manifest.States.Select(state => state.Name).ToArray();
        foreach (var again in manifest.States.Where((state, index) => names.Take(index).Contains(state.Name, StringComparer.OrdinalIgnoreCase)))
        {
            errors.Add(new(new(manifest.Path, again.Line), "duplicate-state", $"the state {FoundText.Show(again.Name)} a second time", "a name of its own for each state", "Join the two tables or rename one."));
        }

        errors.AddRange(manifest.States.Where(state => string.Equals(state.Name, GainStandard.StateName, StringComparison.OrdinalIgnoreCase)).Select(state => new MeasurementDataException(
            new(manifest.Path, state.Line), "reserved-state", FoundText.Show(state.Name), "another name", "The readings of the gain standard carry this name; call the state something else.")));
        if (names.Length == 0)
        {
            return;
        }

        foreach (var entry in sections.Where(section => section.Name is "requirement").SelectMany(section => section.Entries).Where(entry => entry.Key is "state" or "other-state"))
        {
            if (entry.Value is Tomlyn.Syntax.StringValueSyntax { Value: { } name } && !names.Contains(name, StringComparer.Ordinal))
            {
                errors.Add(new(entry.ValuePlace, "unknown-state", FoundText.Show(name), $"one of the states {FoundText.AnyOf(names)}", $"The nearest is \"{NearestName.Of(name, names)}\"."));
            }
        }
    }
}
