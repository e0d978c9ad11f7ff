using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Runs.Description;

namespace RangeReduce.Tests.Runs;

public sealed class RunCheckTests : IDisposable
{
    private readonly ScratchFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Each_file_is_described_with_its_points_ranges_and_channels()
    {
        _folder.WholeRun();
        var description = RunCheck.Describe(_folder.Path);
        Assert.False(description.HasManifest);
        var sweep = description.Files.Single(file => file.Input.Path is "right/s11.s1p").Sweep!;
        Assert.Equal((3, 1.60e9, 1.64e9, 1, 50.0, true), (sweep.Points, sweep.LowHz, sweep.HighHz, sweep.Ports, sweep.ReferenceOhm[0], sweep.HasPhase));
        var cuts = description.Files.Single(file => file.Input.Path is "left/cuts.csv");
        Assert.Equal("0, 45, 90", string.Join(", ", cuts.Cuts.Select(cut => ScratchFolder.Text($"{cut.FixedDeg}"))));
        Assert.Equal((5, -60.0, 60.0, 3), (cuts.Cuts[0].AngleCount, cuts.Cuts[0].LowDeg, cuts.Cuts[0].HighDeg, cuts.Cuts[0].FrequencyCount));
        Assert.Equal([new("h", FieldComponent.Theta, false, true), new ChannelDescription("v", FieldComponent.Phi, false, true)], cuts.Cuts[0].Channels);
        Assert.Equal(7, cuts.Columns.Count);
        Assert.Equal(3, description.Files.Single(file => file.Input.Path is "horn/gain.csv").GainTable!.Points);
        Assert.Equal(FileUse.NotRead, description.Files.Single(file => file.Input.Path is "README.txt").Use);
        Assert.Equal(new StateDescription(new("right", Hand.Right), 1, 2, 1, 2), description.States.Single(state => state.State.Name is "right"));
    }

    [Fact]
    public void What_is_missing_is_said_with_what_it_costs()
    {
        _folder.Cut("right/cut.csv", ["H", "V"], [0]);
        var missing = RunCheck.Describe(_folder.Path).Missing;
        Assert.Contains(missing, sentence => sentence.Contains("no gain", StringComparison.Ordinal));
        Assert.Contains(missing, sentence => sentence.Contains("no measured sweep", StringComparison.Ordinal));
        Assert.Contains(missing, sentence => sentence.Contains("simulated", StringComparison.Ordinal));
    }

    [Fact]
    public void Copies_repeats_and_faulty_files_are_told_apart()
    {
        _folder.Sweep("right/a.s1p", 1);
        _folder.Sweep("right/b.s1p", 1);
        _folder.Sweep("right/c.s1p", 2);
        _folder.Write("right/d.s1p", "# GHZ S MA R 50\n1.0 x 0\n");
        _folder.Write("right/e.csv", string.Empty);
        Assert.Equal("Used Copy Repeat Faulty Faulty", string.Join(' ', RunCheck.Describe(_folder.Path).Files.Select(file => file.Use)));
    }

    [Fact]
    public void Every_convention_says_where_it_came_from()
    {
        _folder.Cut("right/cut.csv", ["theta", "phi"], [0]);
        _folder.Write("run.toml", "[conventions]\ntime = \"exp(+jwt)\"");
        var conventions = RunCheck.Describe(_folder.Path).Conventions.ToDictionary(each => each.Name, each => (each.Value, each.From), StringComparer.Ordinal);
        Assert.Equal(("exp(+jwt)", "run.toml"), conventions["time factor"]);
        Assert.Equal(("theta", "headings"), conventions["theta component"]);
        Assert.Equal(("0 deg", "assumed"), conventions["axis of the antenna along the cuts"]);
    }
}
