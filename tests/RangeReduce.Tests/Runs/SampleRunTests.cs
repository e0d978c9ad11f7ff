using RangeReduce.Runs;

namespace RangeReduce.Tests.Runs;

/// <summary>The sample runs are laid out as a laboratory would: their names alone have to tell as much as their manifest.</summary>
public sealed class SampleRunTests
{
    [Theory]
    [InlineData("spring-build")]
    [InlineData("autumn-retest")]
    public void Names_and_content_tell_of_a_sample_run_what_its_manifest_tells(string name)
    {
        var sample = Path.Combine(Root(), "sampledata", name);
        using var bare = new ScratchFolder();
        foreach (var path in Directory.EnumerateFiles(sample, "*", SearchOption.AllDirectories).Where(path => Path.GetFileName(path) is not "run.toml"))
        {
            bare.Write(Path.GetRelativePath(sample, path), File.ReadAllBytes(path));
        }

        var (stated, found) = (MeasurementRunReader.Read(sample), MeasurementRunReader.Read(bare.Path));
        Assert.Equal(Plan(stated), Plan(found));
        Assert.Equal(stated.States.Select(state => (state.Name, state.IntendedHand)).Order(), found.States.Select(state => (state.Name, state.IntendedHand)).Order());
        Assert.Equal(stated.Cuts.Count, found.Cuts.Count);
        Assert.Equal(stated.GainStandard!.Readings.Count, found.GainStandard!.Readings.Count);
        Assert.DoesNotContain(found.Remarks, remark => remark.Severity != Diagnostics.RemarkSeverity.Note);
    }

    private static string Plan(MeasurementRun run) =>
        string.Join('\n', run.Inputs.Where(input => input.Kind != InputKind.Manifest).Select(input => $"{input.Path} {input.Kind} {input.State} {input.Source}"));

    private static string Root()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder.FullName, "RangeReduce.sln")))
        {
            folder = folder.Parent!;
        }

        return folder.FullName;
    }
}
