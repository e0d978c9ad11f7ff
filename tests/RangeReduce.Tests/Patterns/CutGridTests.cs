using RangeReduce.Diagnostics;
using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

public sealed class CutGridTests
{
    [Fact]
    public void Theta_over_a_whole_turn_comes_back_around_the_axis()
    {
        var table = TableText.Read("f [GHz],theta [deg],H [dB]\n1.62,0,-1\n1.62,90,-2\n1.62,180,-3\n1.62,270,-4\n1.62,360,-5\n");
        var cut = table.Cuts[0];
        Assert.Equal([-90.0, 0.0, 90.0, 180.0], cut.AngleDeg);
        TableText.Near(TableText.Polar(-4, 0), cut.At("h", 0, 0));
        TableText.Near(TableText.Polar(-1, 0), cut.At("h", 0, 1));
        Assert.True(table.Has("whole-turn"));
        var repeats = Assert.IsType<RangeReduce.Patterns.RepeatedReadings>(cut.Repeats);
        Assert.Equal([1], repeats.Cell);
        Assert.Equal(Math.Pow(10.0, -5.0 / 20.0), repeats.Channels[0].Re[0], 12);
    }

    [Fact]
    public void A_turn_from_minus_180_to_180_keeps_both_ends()
    {
        var cut = TableText.ReadCut("f [GHz],theta [deg],H [dB]\n1.62,-180,-1\n1.62,0,-2\n1.62,180,-3\n");
        Assert.Equal([-180.0, 0.0, 180.0], cut.AngleDeg);
        Assert.Null(cut.Repeats);
    }

    [Fact]
    public void Angles_and_frequencies_out_of_order_are_sorted_with_a_note()
    {
        var table = TableText.Read("f [GHz],theta [deg],H [dB]\n1.62,10,-1\n1.62,-10,-2\n1.62,0,-3\n1.60,10,-4\n1.60,-10,-5\n1.60,0,-6\n");
        var cut = table.Cuts[0];
        Assert.Equal([-10.0, 0.0, 10.0], cut.AngleDeg);
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        TableText.Near(TableText.Polar(-6, 0), cut.At("h", 0, 1));
        TableText.Near(TableText.Polar(-2, 0), cut.At("h", 1, 0));
        Assert.True(table.Has("angles-sorted"));
        Assert.True(table.Has("frequencies-sorted"));
    }

    [Fact]
    public void Frequencies_inside_angles_read_the_same_as_angles_inside_frequencies()
    {
        var cut = TableText.ReadCut("f [GHz],theta [deg],H re,H im\n1.60,10,1,2\n1.62,10,3,4\n1.60,20,5,6\n1.62,20,7,8\n1.60,30,9,10\n1.62,30,11,12\n");
        Assert.Equal([1.0, 5.0, 9.0, 3.0, 7.0, 11.0], cut.Channel("h").Re);
    }

    [Fact]
    public void The_first_reading_of_a_repeated_angle_counts_and_the_others_are_kept()
    {
        var table = TableText.Read("f [GHz],theta [deg],H re,H im\n1.62,0,1,2\n1.62,10,3,4\n1.62,0,5,6\n1.62,0,7,8\n");
        var cut = table.Cuts[0];
        Assert.Equal([1.0, 3.0], cut.Channel("h").Re);
        Assert.Equal([0, 0], cut.Repeats!.Cell);
        Assert.Equal([6.0, 8.0], cut.Repeats.Channels[0].Im!);
        Assert.True(table.Has("repeated-angles"));
    }

    [Fact]
    public void A_frequency_that_lacks_an_angle_leaves_a_missing_sample()
    {
        var table = TableText.Read("f [GHz],theta [deg],H re,H im\n1.60,0,1,2\n1.60,10,3,4\n1.62,10,5,6\n");
        Assert.Equal([1.0, 3.0, double.NaN, 5.0], table.Cuts[0].Channel("h").Re);
        Assert.True(double.IsNaN(table.Cuts[0].Channel("h").Im![2]));
        var remark = Assert.Single(table.Remarks);
        Assert.Equal("grid-holes", remark.Code);
        Assert.Contains("1 combination", remark.Text, StringComparison.Ordinal);
        Assert.Contains("1620 MHz, 0 degrees", remark.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("--")]
    [InlineData("NaN")]
    [InlineData("n/a")]
    [InlineData("-inf")]
    [InlineData("-9999")]
    [InlineData("-999")]
    [InlineData("-9999.99")]
    [InlineData("***")]
    public void A_missing_sample_is_never_read_as_a_level(string cell)
    {
        var table = TableText.Read($"f [GHz],theta [deg],H [dB],H [deg]\n1.62,0,-1,20\n1.62,10,{cell},30\n1.62,20,-2,40\n");
        var samples = table.Cuts[0].Channel("h");
        Assert.True(double.IsNaN(samples.Re[1]) && double.IsNaN(samples.Im![1]));
        Assert.False(double.IsNaN(samples.Re[2]));
        var remark = Assert.Single(table.Remarks);
        Assert.Equal("missing-samples", remark.Code);
        Assert.Equal(RemarkSeverity.Doubt, remark.Severity);
        Assert.Equal("cut.csv:3:9", remark.Place?.ToString());
        Assert.StartsWith("1 sample is missing", remark.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_phase_of_999_among_unwrapped_phases_is_a_phase()
    {
        var table = TableText.Read("f [GHz],theta [deg],H [dB],H [deg]\n1.62,0,-1,999\n1.62,10,-1,1010\n");
        TableText.Near(TableText.Polar(-1, 999), table.Cuts[0].At("h", 0, 0));
        Assert.Empty(table.Remarks);
    }

    [Fact]
    public void A_full_sphere_is_as_many_cuts_as_it_has_phi()
    {
        var rows = from phi in Enumerable.Range(0, 9) from theta in Enumerable.Range(0, 7) select $"1.62,{45 * phi},{30 * theta},{phi},{theta}";
        var table = TableText.Read("f [GHz],phi [deg],theta [deg],H re,H im\n" + string.Join('\n', rows));
        Assert.Equal(8, table.Cuts.Count);
        Assert.Equal(7, table.Cuts[0].Repeats!.Cell.Length);
        TableText.Near(new(7, 3), table.Cuts[7].At("h", 0, 3));
    }

    [Fact]
    public void Samples_that_form_no_grid_are_an_error_before_memory_is_taken()
    {
        var rows = Enumerable.Range(0, 6000).Select(at => $"{1000 + at},{at * 0.01},-{at % 60}");
        Assert.Equal("no-grid", TableText.Fault("f [MHz],theta [deg],H [dB]\n" + string.Join('\n', rows)).Code);
    }

    [Fact]
    public void Limits_are_kept()
    {
        Assert.Equal("too-many-samples", TableText.Fault("f [MHz],theta [deg],H [dB]\n1,1,1\n1,2,1\n1,3,1\n", options: new TableOptions { MaxSamples = 2 }).Code);
        Assert.Equal("too-many-columns", TableText.Fault("f [MHz],theta [deg],H [dB]\n1,1,1\n", options: new TableOptions { MaxColumns = 2 }).Code);
        Assert.Equal("line-too-long", TableText.Fault("f [MHz],theta [deg],H [dB]\n1,1,1\n" + new string('1', 400_000), options: new TableOptions { MaxLineBytes = 100_000 }).Code);
    }
}
