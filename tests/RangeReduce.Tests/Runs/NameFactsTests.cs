using RangeReduce.Runs.Discovery;

namespace RangeReduce.Tests.Runs;

public sealed class NameFactsTests
{
    [Theory]
    [InlineData("right/s11.s1p", "right", null)]
    [InlineData("2026-03-14/right/cut_phi045_h.csv", "right", null)]
    [InlineData("right/phi0/cut.csv", "right", null)]
    [InlineData("data/right_s11.s1p", null, "right")]
    [InlineData("model/right_phi45.csv", null, "right")]
    [InlineData("short arm/sweep.s1p", "short-arm", null)]
    [InlineData("s11.s1p", null, null)]
    [InlineData("cut_phi0_1620MHz.csv", null, null)]
    [InlineData("right/repeat2/s11.s1p", "right", null)]
    public void The_innermost_folder_with_a_naming_word_is_the_state_and_else_the_file_name(string path, string? folder, string? name)
    {
        var facts = NameFacts.Of(path);
        Assert.Equal((folder, name), (facts.FolderState, facts.NameState));
    }

    [Theory]
    [InlineData("model/right.s1p", true, false)]
    [InlineData("right/sim_phi0.csv", true, false)]
    [InlineData("right/NEC/phi0.csv", true, false)]
    [InlineData("right/phi0.csv", false, false)]
    [InlineData("rightsim/phi0.csv", false, false)]
    [InlineData("horn/levels.csv", false, true)]
    [InlineData("gain-standard/table.csv", false, true)]
    [InlineData("cal/SGH_levels.csv", false, true)]
    [InlineData("reference/levels.csv", false, true)]
    [InlineData("reference-helix/cut.csv", false, false)]
    public void Whole_words_tell_a_simulation_and_the_gain_standard(string path, bool simulated, bool standard)
    {
        var facts = NameFacts.Of(path);
        Assert.Equal((simulated, standard), (facts.IsSimulated, facts.IsGainStandard));
    }
}
