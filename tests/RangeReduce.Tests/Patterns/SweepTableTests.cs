using RangeReduce.Networks;
using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

public sealed class SweepTableTests
{
    private static NetworkSweep Sweep(string text) => Assert.IsType<NetworkSweep>(TableText.Read(text, "s11.csv").Sweep);

    // 9.5424 dB, VSWR 2, |Gamma| 1/3: one row of the mismatch table, computed from the closed form RL = -20 lg((s - 1)/(s + 1)).
    [Theory]
    [InlineData("Return loss [dB]", "9.542425094393248")]
    [InlineData("S11 [dB]", "-9.542425094393248")]
    [InlineData("VSWR", "2")]
    [InlineData("|S11|", "0.3333333333333333")]
    [InlineData("RL (dB)", "9.542425094393248")]
    public void Return_loss_level_standing_wave_ratio_and_magnitude_are_one_reflection(string heading, string value)
    {
        var sweep = Sweep($"# reference impedance: 75 ohm\nFreq [MHz],{heading}\n1600,{value}\n1620,{value}\n");
        Assert.Equal(1.0 / 3.0, sweep.Re[1], 12);
        Assert.Equal(0.0, sweep.Im[1]);
        Assert.False(sweep.HasPhase);
        Assert.Equal([75.0], sweep.ReferenceOhm);
        Assert.Equal([1.60e9, 1.62e9], sweep.FrequencyHz);
    }

    [Fact]
    public void Phase_or_real_and_imaginary_parts_make_a_complex_reflection()
    {
        var polar = Sweep("f [GHz];S11 [dB];S11 [deg]\n1,62;-6;90\n1,60;-12;-90\n");
        Assert.Equal([1.60e9, 1.62e9], polar.FrequencyHz);
        TableText.Near(TableText.Polar(-12, -90), polar[0, 0, 0]);
        TableText.Near(new(0.3, -0.4), Sweep("f [GHz],S11 re,S11 im\n1.6,0.3,-0.4\n")[0, 0, 0]);
        var loss = Sweep("f [GHz],Return loss [dB],Phase [deg]\n1.6,6,45\n");
        TableText.Near(TableText.Polar(-6, 45), loss[0, 0, 0]);
        Assert.True(loss.HasPhase);
    }

    [Fact]
    public void Fifty_ohm_is_taken_with_a_note() => Assert.True(TableText.Read("f [GHz],VSWR\n1.6,1.5\n").Has("reference-impedance"));

    [Fact]
    public void A_wrong_sign_is_remarked_and_a_mixed_one_refused()
    {
        var table = TableText.Read("f [GHz],Return loss [dB]\n1.6,-10\n1.61,-20\n");
        Assert.Equal(Math.Pow(10.0, -0.5), table.Sweep!.Re[0], 12);
        Assert.True(table.Has("reflection-sign"));
        Assert.Equal("reflection-sign", TableText.Fault("f [GHz],Return loss [dB]\n1.6,-10\n1.61,20\n").Code);
    }

    [Fact]
    public void A_missing_point_is_left_out_and_a_repeated_one_counts_once()
    {
        var table = TableText.Read("f [GHz],VSWR\n1.6,1.5\n1.61,--\n1.62,2\n1.62,3\n");
        Assert.Equal([1.6e9, 1.62e9], table.Sweep!.FrequencyHz);
        Assert.True(table.Has("missing-samples"));
        Assert.True(table.Has("repeated-frequencies"));
    }

    [Fact]
    public void A_gain_over_frequency_is_a_gain_table()
    {
        var gain = Assert.IsType<GainTable>(TableText.Read("# standard gain horn\nFrequency [GHz],Gain [dBi],Uncertainty [dB]\n1.6,10.1,0.25\n1.5,9.9,0.3\n").Gain);
        Assert.Equal([1.5e9, 1.6e9], gain.FrequencyHz);
        Assert.Equal([9.9, 10.1], gain.GainDbi);
        Assert.Equal([0.3, 0.25], gain.UncertaintyDb!);
    }

    [Theory]
    [InlineData("Freq [MHz],Theta [deg],H [dB]\n1600,0,-1\n", true)]
    [InlineData("a,b,c\n1600,0,-1\n1601,0,-1\n", true)]
    [InlineData("# GHz S MA R 50\n1.6 0.1 20\n1.7 0.2 30\n", false)]
    [InlineData("! made by hand\n# MHz S RI R 50\n1600 0.1 0.2\n", false)]
    [InlineData("[Version] 2.0\n# GHz S MA R 50\n", false)]
    [InlineData("Dear reader,\nthis is text.\n", false)]
    [InlineData("", false)]
    [InlineData("[run]\nname = \"x\"\n", false)]
    public void What_looks_like_a_table_is_told_by_its_first_lines(string text, bool expected) => Assert.Equal(expected, TableReader.LooksLikeTable(System.Text.Encoding.UTF8.GetBytes(text)));
}
