using RangeReduce.Patterns;
using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

public sealed class CutFormTests
{
    [Fact]
    public void A_wide_table_has_angles_down_and_frequencies_across()
    {
        var table = TableText.Read("# channel: RHCP\n# phi: 45 deg\nTheta [deg];1.60 GHz [dB];1.62 GHz [dB]\n-10;-1;-2\n0;-3;-4\n10;-5;-6\n");
        var cut = Assert.Single(table.Cuts);
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        Assert.Equal([-10.0, 0.0, 10.0], cut.AngleDeg);
        Assert.Equal(45.0, cut.FixedDeg);
        Assert.Equal("right", cut.ChannelNames());
        TableText.Near(TableText.Polar(-4, 0), cut.At("right", 1, 1));
        Assert.Equal("level of channel right at 1620 MHz", table.Columns[2].Meaning);
    }

    [Fact]
    public void A_wide_table_takes_units_and_channel_from_the_preamble_and_the_file_name()
    {
        var cut = TableText.ReadCut("unit: dB\nfrequency unit: MHz\nAz (deg),1600,1620\n-10,-1,-2\n10,-5,-6\n", "horn_phi090_V.csv");
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        Assert.Equal("v", cut.ChannelNames());
        Assert.Equal(90.0, cut.FixedDeg);
        TableText.Near(TableText.Polar(-6, 0), cut.At("v", 1, 1));
    }

    [Fact]
    public void A_wide_table_may_pair_level_and_phase_of_each_frequency_and_count_downwards()
    {
        var cut = TableText.ReadCut("Theta [deg],H 1620 MHz [dB],H 1620 MHz [deg],H 1600 MHz [dB],H 1600 MHz [deg]\n10,-1,10,-2,20\n-10,-3,30,-4,40\n");
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        TableText.Near(TableText.Polar(-4, 40), cut.At("h", 0, 0));
        TableText.Near(TableText.Polar(-1, 10), cut.At("h", 1, 1));
    }

    [Fact]
    public void The_corner_of_a_wide_table_may_name_both_axes()
    {
        var cut = TableText.ReadCut("# unit: dB\nTheta [deg] \\ Frequency [MHz];1600;1620\n-10;-1;-2\n10;-5;-6\n", "rhcp.csv");
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        TableText.Near(TableText.Polar(-5, 0), cut.At("right", 0, 1));
    }

    [Fact]
    public void Frequencies_down_and_angles_across_is_a_wide_table_too()
    {
        var cut = TableText.ReadCut("# unit: dB\nFrequency [MHz],-10,0,10\n1600,-1,-2,-3\n1620,-4,-5,-6\n", "h.csv");
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        Assert.Equal([-10.0, 0.0, 10.0], cut.AngleDeg);
        TableText.Near(TableText.Polar(-6, 0), cut.At("h", 1, 2));
    }

    [Fact]
    public void Cuts_may_stand_side_by_side()
    {
        var table = TableText.Read("Freq [MHz],Theta [deg],phi=0 [dB],phi=90 [dB]\n1600,-10,-1,-2\n1600,10,-3,-4\n", "lhcp.csv");
        Assert.Equal([0.0, 90.0], table.Cuts.Select(cut => cut.FixedDeg));
        TableText.Near(TableText.Polar(-4, 0), table.Cuts[1].At("left", 0, 1));
    }

    [Theory]
    [InlineData("# frequency: 1.62 GHz\n", "cut.csv")]
    [InlineData("Frequency [MHz]: 1620\n", "cut.csv")]
    [InlineData("Frequency,1620 MHz\n", "cut.csv")]
    [InlineData("", "cut_1620MHz_phi045.csv")]
    [InlineData("", "1.62GHz.csv")]
    [InlineData("", "run 1p62 GHz.csv")]
    public void The_frequency_comes_from_the_preamble_or_the_file_name(string preamble, string name) =>
        Assert.Equal([1.62e9], TableText.ReadCut($"{preamble}theta [deg],H [dB]\n0,-3\n10,-4\n", name).FrequencyHz);

    [Theory]
    [InlineData("# phi: 45\n", "cut.csv", 45.0)]
    [InlineData("# Phi [rad]: 0.5\n", "cut.csv", 28.64788975654116)]
    [InlineData("# cut: phi = 45 deg\n", "cut.csv", 45.0)]
    [InlineData("", "cut_phi045.csv", 45.0)]
    [InlineData("", "cut_phi_45.csv", 45.0)]
    [InlineData("", "cut phi=-45deg.csv", -45.0)]
    [InlineData("", "cut_phi-45.csv", double.NaN)]
    [InlineData("", "cut.csv", double.NaN)]
    public void The_plane_of_the_cut_comes_from_the_preamble_or_the_file_name(string preamble, string name, double phi) =>
        Assert.Equal(phi, TableText.ReadCut($"{preamble}f [GHz],theta [deg],H [dB]\n1.62,0,-3\n1.62,10,-4\n", name).FixedDeg, 12);

    [Fact]
    public void A_file_name_that_contradicts_the_preamble_is_remarked()
    {
        var table = TableText.Read("# phi: 45\nf [GHz],theta [deg],H [dB]\n1.62,0,-3\n1.62,10,-4\n", "cut_phi90.csv");
        Assert.Equal(45.0, table.Cuts[0].FixedDeg);
        Assert.True(table.Has("name-contradicts"));
    }

    [Fact]
    public void Options_fill_in_what_the_file_does_not_say()
    {
        var cut = TableText.ReadCut("theta [deg],dB\n0,-3\n10,-4\n", "a.txt", new() { FrequencyHz = 1.62e9, FixedDeg = 90.0, Channel = "LHCP" });
        Assert.Equal([1.62e9], cut.FrequencyHz);
        Assert.Equal(90.0, cut.FixedDeg);
        Assert.Equal("left", cut.ChannelNames());
    }

    [Fact]
    public void Blocks_under_comments_are_cuts_of_their_own()
    {
        var table = TableText.Read("# phi: 0\nf [GHz],theta [deg],H [dB]\n1.62,0,-1\n1.62,10,-2\n# phi: 90\nf [GHz],theta [deg],H [dB]\n1.62,0,-3\n1.62,10,-4\n");
        Assert.Equal([0.0, 90.0], table.Cuts.Select(cut => cut.FixedDeg));
        TableText.Near(TableText.Polar(-3, 0), table.Cuts[1].At("h", 0, 0));
    }

    [Fact]
    public void Phi_moves_where_theta_is_constant()
    {
        var cut = TableText.ReadCut("f [GHz],theta [deg],phi [deg],H [dB]\n1.62,30,0,-1\n1.62,30,90,-2\n1.62,30,180,-3\n");
        Assert.Equal(CutAxis.Phi, cut.Axis);
        Assert.Equal(30.0, cut.FixedDeg);
        Assert.Equal([0.0, 90.0, 180.0], cut.AngleDeg);
    }

    [Fact]
    public void A_few_cones_of_many_phi_stay_cones()
    {
        var rows = from theta in new[] { 30, 60 } from phi in Enumerable.Range(0, 12) select $"1.62,{theta},{30 * phi},-{phi}";
        var table = TableText.Read("f [GHz],theta [deg],phi [deg],H [dB]\n" + string.Join('\n', rows));
        Assert.Equal([30.0, 60.0], table.Cuts.Select(cut => cut.FixedDeg));
        Assert.All(table.Cuts, cut => Assert.Equal(CutAxis.Phi, cut.Axis));
    }

    [Theory]
    [InlineData("az [deg],el [deg]", "-10,0", "10,0", 0.0)]
    [InlineData("el [deg],az [deg]", "-10,0", "10,0", 90.0)]
    public void Cuts_through_the_axis_in_azimuth_or_elevation_are_principal_planes(string headings, string first, string second, double phi)
    {
        var table = TableText.Read($"f [GHz],{headings},H [dB]\n1.62,{first},-1\n1.62,{second},-2\n");
        Assert.Equal(phi, table.Cuts[0].FixedDeg);
        Assert.Equal(CutAxis.Theta, table.Cuts[0].Axis);
        Assert.Equal([-10.0, 10.0], table.Cuts[0].AngleDeg);
        Assert.True(table.Has("principal-plane"));
    }

    [Fact]
    public void Azimuth_cuts_off_the_axis_are_cones_about_the_azimuth_axis()
    {
        var table = TableText.Read("f [GHz],az [deg],el [deg],H [dB]\n1.62,-10,30,-1\n1.62,10,30,-2\n");
        Assert.Equal(CutAxis.Phi, table.Cuts[0].Axis);
        Assert.Equal(60.0, table.Cuts[0].FixedDeg);
        Assert.True(table.Has("vertical-pole"));
    }

    [Fact]
    public void Without_any_angle_levels_are_a_cut_at_the_single_angle_zero()
    {
        var table = TableText.Read("Freq [MHz],H [dB],V [dB]\n1600,-30,-60\n1620,-31,-61\n");
        Assert.Equal([0.0], table.Cuts[0].AngleDeg);
        Assert.Equal(2, table.Cuts[0].Channel("v").Re.Length);
        Assert.True(table.Has("single-angle"));
    }

    [Fact]
    public void Isotropic_decibels_make_an_isotropic_reference() =>
        Assert.Equal(LevelReference.Isotropic, TableText.ReadCut("f [GHz],theta [deg],E_theta [dBi],E_phi [dBi]\n1.62,0,3,-20\n1.62,10,2,-21\n").Reference);

    [Fact]
    public void Linear_amplitudes_powers_and_radians_are_brought_to_amplitudes()
    {
        var cut = TableText.ReadCut("f [GHz],theta [rad],H mag,H phase [rad],V [mW],\n1.62,0,0.5,1.5707963267948966,4,\n1.62,0.1,0.25,0,9,\n");
        TableText.Near(new(0.0, 0.5), cut.At("h", 0, 0));
        Assert.Equal(Math.Sqrt(4e-3), cut.At("v", 0, 0).Real, 15);
        Assert.Equal(18.0 / Math.PI, cut.AngleDeg[1], 12);
        Assert.Null(cut.Channel("v").Im);
    }

    [Fact]
    public void Theta_may_name_an_angle_and_a_channel_in_one_table()
    {
        var cut = TableText.ReadCut("f [GHz],Theta [deg],Theta [dB],Theta [deg],Phi [dB],Phi phase [deg]\n1.62,0,-1,2,-3,4\n1.62,10,-5,6,-7,8\n");
        Assert.Equal("theta phi", cut.ChannelNames());
        TableText.Near(TableText.Polar(-5, 6), cut.At("theta", 0, 1));
    }

    [Fact]
    public void A_spinning_linear_sweep_is_named_as_such()
    {
        var table = TableText.Read("# probe: spinning linear\nf [GHz],theta [deg],level [dB]\n1.62,0,-1\n1.62,1,-3\n");
        Assert.Equal("spinning", table.Cuts[0].ChannelNames());
        Assert.Equal("spinning", TableText.ReadCut("f [GHz],theta [deg],Spin [deg],level [dB]\n1.62,0,0,-1\n1.62,1,30,-3\n").ChannelNames());
    }

    [Fact]
    public void Meanings_can_be_laid_down_by_heading_or_number()
    {
        var options = new TableOptions { Columns = new Dictionary<string, string>(StringComparer.Ordinal) { ["A"] = "frequency [MHz]", ["2"] = "theta [deg]", ["c"] = "h re", ["d"] = "h im", ["e"] = "ignore" } };
        var cut = TableText.ReadCut("a,b,c,d,e\n1620,0,1,2,x\n1620,10,3,4,y\n", options: options);
        TableText.Near(new(3, 4), cut.At("h", 0, 1));
        var bare = new TableOptions { Columns = new Dictionary<string, string>(StringComparer.Ordinal) { ["1"] = "frequency [MHz]", ["2"] = "theta [deg]", ["3"] = "h [dB]" } };
        Assert.Equal([0.0, 10.0], TableText.ReadCut("1620,0,-1\n1620,10,-3\n", options: bare).AngleDeg);
    }
}
