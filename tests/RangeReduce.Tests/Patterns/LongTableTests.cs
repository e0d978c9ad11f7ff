using RangeReduce.Patterns;

namespace RangeReduce.Tests.Patterns;

public sealed class LongTableTests
{
    private const string SampleForm = """
        # antenna: crossed dipoles over a plate
        # probe: dual linear
        Frequency [GHz],Phi [deg],Theta [deg],H [dB],H [deg],V [dB],V [deg]
        1.60,45,-2,-20,0,-40,90
        1.60,45,0,-19,10,-39,80
        1.60,45,2,-18,20,-38,70
        1.62,45,-2,-17,30,-37,60
        1.62,45,0,-16,40,-36,50
        1.62,45,2,-15,50,-35,40
        """;

    [Fact]
    public void A_dual_linear_table_of_levels_and_phases_becomes_one_complex_cut()
    {
        var cut = TableText.ReadCut(SampleForm);
        Assert.Equal(CutAxis.Theta, cut.Axis);
        Assert.Equal(45.0, cut.FixedDeg);
        Assert.Equal([1.60e9, 1.62e9], cut.FrequencyHz);
        Assert.Equal([-2.0, 0.0, 2.0], cut.AngleDeg);
        Assert.Equal("h v", cut.ChannelNames());
        TableText.Near(TableText.Polar(-19, 10), cut.At("h", 0, 1));
        TableText.Near(TableText.Polar(-35, 40), cut.At("v", 1, 2));
        Assert.Equal(LevelReference.Receiver, cut.Reference);
        Assert.Equal((4, 9), cut.Lines);
        Assert.Null(cut.Repeats);
    }

    [Fact]
    public void The_lines_over_the_headings_are_kept_as_metadata_and_the_columns_are_told_in_words()
    {
        var table = TableText.Read(SampleForm);
        Assert.Equal("dual linear", table.Metadata["probe"]);
        Assert.Empty(table.Remarks);
        Assert.Equal(
            "frequency/GHz/; phi/deg/; theta/deg/; level of channel h/dB/h; phase of channel h/deg/h; level of channel v/dB/v; phase of channel v/deg/v",
            string.Join("; ", table.Columns.Select(column => $"{column.Meaning}/{column.Unit}/{column.Channel}")));
    }

    [Fact]
    public void Several_phi_become_several_cuts_in_rising_order()
    {
        var table = TableText.Read("""
            f/MHz;phi;theta;E_theta re;E_theta im;E_phi re;E_phi im
            1620;90;-10;1;2;3;4
            1620;90;10;5;6;7;8
            1620;0;-10;9;10;11;12
            1620;0;10;13;14;15;16
            """);
        Assert.Equal([0.0, 90.0], table.Cuts.Select(cut => cut.FixedDeg));
        Assert.Equal([9.0, 13.0], table.Cuts[0].Channel("theta").Re);
        Assert.Equal([4.0, 8.0], table.Cuts[1].Channel("phi").Im!);
        Assert.True(table.Has("both-angles-vary"));
    }
}
