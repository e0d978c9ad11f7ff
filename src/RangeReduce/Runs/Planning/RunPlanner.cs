using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Runs.Discovery;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Planning;

/// <summary>Decides what each file of a measurement folder is read as: the manifest first, the names where it is silent, the content for sweep or table.</summary>
internal static class RunPlanner
{
    /// <summary>Makes the plan.</summary>
    /// <exception cref="MeasurementDataException">The folder is missing or empty, or the manifest is wrong.</exception>
    public static RunPlan Plan(string folder, IInputReaders readers, CancellationToken cancellationToken)
    {
        var listing = RunFolder.Walk(folder, cancellationToken);
        if (listing.Files.Count == 0)
        {
            throw new MeasurementDataException(new(folder), "empty-folder", "no file", "sweeps, cuts, or both", "Name the folder that holds the measurement files.");
        }

        var manifestFile = listing.Files.FirstOrDefault(file => file.Path is ManifestReader.FileName);
        var manifest = manifestFile is null ? null : ManifestReader.Read(manifestFile.FullPath, manifestFile.Path);
        var looks = Inspector.LookAt(listing.Files, readers, cancellationToken);
        var remarks = listing.Remarks.Concat(looks.Select(look => look.Fault).OfType<MeasurementDataException>().Select(fault => fault.ToRemark())).ToList();
        if (manifest is null && listing.Files.FirstOrDefault(file => !file.Path.Contains('/', StringComparison.Ordinal) && file.Path.EndsWith(".toml", StringComparison.OrdinalIgnoreCase)) is { } misnamed)
        {
            remarks.Add(new(RemarkSeverity.Doubt, "manifest-name", "The file looks like a manifest but is not called run.toml, so it was not read.", new(misnamed.Path)));
        }

        var assignments = AssignAll(listing, looks, manifest, remarks);
        var files = listing.Files.Select((file, at) => Planned(file, looks[at], assignments[at], at)).ToArray();
        return new() { Folder = folder, Manifest = manifest, Files = files, Faults = [.. looks.Select(look => look.Fault).OfType<MeasurementDataException>()], States = StatesOf(manifest, files, remarks), Remarks = remarks };
    }

    private static Assignment[] AssignAll(RunFolderListing listing, Inspection[] looks, RunManifest? manifest, List<Remark> remarks)
    {
        var byPattern = manifest is null ? null : new ManifestAssigner(manifest, listing.Files, remarks);
        var assigned = listing.Files.Select((file, at) =>
            file.PassedOver is { } why ? Assignment.Other(why) :
            file.Path is ManifestReader.FileName ? new Assignment(InputKind.Manifest, null, null, "file name") :
            byPattern?.Assign(file.Path, looks[at].Guess)).ToArray();
        byPattern?.Finish(listing.Files.Select(file => file.Path));

        // A manifest that lists states is complete: what it does not name is not guessed at.
        var lists = manifest is { States.Count: > 0 };
        var open = Enumerable.Range(0, assigned.Length).Where(at => assigned[at] is null && looks[at].Guess != InputKind.Other).ToArray();
        var byName = new NameAssigner(open.Select(at => listing.Files[at].Path), remarks);
        foreach (var at in open)
        {
            assigned[at] = lists ? Assignment.Other("not listed in run.toml") : byName.Assign(listing.Files[at].Path, looks[at].Guess);
            if (lists)
            {
                remarks.Add(new(RemarkSeverity.Note, "unlisted-file", "The file looks like measurement data, but run.toml does not list it, so it was not read.", new(listing.Files[at].Path)));
            }
        }

        return [.. assigned.Select((assignment, at) => looks[at].Fault is not null ? Assignment.Other("unusable") : assignment ?? Assignment.Other("file content"))];
    }

    private static PlannedFile Planned(FoundFile file, Inspection look, Assignment assigned, int at)
    {
        var id = string.Create(CultureInfo.InvariantCulture, $"i{at + 1}");
        var input = new InputFile(id, file.Path, look.Sha256, file.Bytes, assigned.Kind, assigned.State, assigned.Source, assigned.Reason);
        return new(input, file.FullPath) { IsOfGainStandard = assigned.IsOfGainStandard, IsKindOpen = assigned.IsKindOpen };
    }

    private static ConfigurationState[] StatesOf(RunManifest? manifest, PlannedFile[] files, List<Remark> remarks)
    {
        if (manifest is { States.Count: > 0 })
        {
            return [.. manifest.States.Select(state => new ConfigurationState(state.Name, state.IntendedHand, state.KnownHand))];
        }

        var states = files.Select(file => file.Input.State).OfType<string>().Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal)
            .Select(name => new ConfigurationState(name, NameAssigner.HandOf(name))).ToArray();
        foreach (var state in states.Where(state => state.IntendedHand is not null))
        {
            remarks.Add(new(RemarkSeverity.Note, "hand-from-name", $"State {state.Name} is taken to be meant {HandText.Write(state.IntendedHand!.Value)}-hand, by its name.", State: state.Name));
        }

        return states;
    }
}
