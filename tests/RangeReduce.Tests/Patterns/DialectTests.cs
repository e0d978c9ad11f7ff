using System.Text;
using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

public sealed class DialectTests
{
    private static readonly string[][] Cells = [["1.6", "-2", "-20.5", "10"], ["1.6", "0", "-19.5", "20"], ["1.6", "2", "-18.5", "30"]];

    [Theory]
    [InlineData(",", '.')]
    [InlineData(", ", '.')]
    [InlineData(";", '.')]
    [InlineData(";", ',')]
    [InlineData("\t", '.')]
    [InlineData("\t", ',')]
    [InlineData("|", ',')]
    [InlineData("   ", '.')]
    [InlineData(" \t ", ',')]
    public void Any_separator_and_decimal_sign_reads_the_same(string separator, char sign)
    {
        var text = new StringBuilder(string.Join(separator, "f/GHz", "theta/deg", "H/dB", "H/deg")).Append('\n');
        foreach (var row in Cells)
        {
            text.Append(string.Join(separator, row).Replace('.', sign)).Append('\n');
        }

        var cut = TableText.ReadCut(text.ToString());
        Assert.Equal([1.6e9], cut.FrequencyHz);
        Assert.Equal([-2.0, 0.0, 2.0], cut.AngleDeg);
        TableText.Near(TableText.Polar(-19.5, 20), cut.At("h", 0, 1));
    }

    [Fact]
    public void Headings_with_blanks_inside_are_joined_to_as_many_as_there_are_columns()
    {
        var cut = TableText.ReadCut("Freq [MHz]  Theta [deg]  H mag (dB)\n1620 -10 -3\n1620 10 -4\n");
        Assert.Equal("h", cut.ChannelNames());
        Assert.Equal([1.62e9], cut.FrequencyHz);
        Assert.Equal("h", TableText.ReadCut("Freq [MHz] Theta [deg] H [dB]\n1620 -10 -3\n1620 10 -4\n").ChannelNames());
    }

    [Fact]
    public void Headings_may_stand_in_a_comment()
    {
        var cut = TableText.ReadCut("! freq_mhz theta_deg h_re h_im\n1620 -10 1 2\n1620 10 3 4\n");
        Assert.Equal([1.0, 3.0], cut.Channel("h").Re);
        Assert.Equal([2.0, 4.0], cut.Channel("h").Im!);
    }

    [Fact]
    public void Units_may_stand_in_a_line_of_their_own()
    {
        var cut = TableText.ReadCut("Frequency;Theta;H;;V;\nMHz;deg;dB;deg;dB;deg\n1620;-10;-1;2;-3;4\n1620;10;-5;6;-7;8\n");
        Assert.Equal("h v", cut.ChannelNames());
        TableText.Near(TableText.Polar(-7, 8), cut.At("v", 0, 1));
    }

    [Theory]
    [InlineData("utf-8", true)]
    [InlineData("utf-8", false)]
    [InlineData("utf-16", true)]
    [InlineData("utf-16", false)]
    [InlineData("utf-16BE", true)]
    [InlineData("latin1", false)]
    public void Any_encoding_of_the_degree_sign_is_an_angle(string name, bool mark)
    {
        var encoding = Encoding.GetEncoding(name);
        var bytes = encoding.GetBytes("Freq (MHz);Theta [\u00B0];H [dB];H [\u00B0]\r\n1620;-10;-1,5;2\r\n1620;10;-5;6\r\n");
        var cut = Assert.Single(TableReader.Read(mark ? [.. encoding.GetPreamble(), .. bytes] : bytes, "cut.csv").Cuts);
        Assert.Equal([-10.0, 10.0], cut.AngleDeg);
        TableText.Near(TableText.Polar(-1.5, 2), cut.At("h", 0, 0));
    }

    [Theory]
    [InlineData("\n")]
    [InlineData("\r\n")]
    [InlineData("\r")]
    public void Any_line_end_will_do(string end)
    {
        var fault = TableText.Fault(string.Join(end, "# note", "f [MHz],theta [deg],H [dB]", "1620,0,-3", "1620,10,x"));
        Assert.Equal("cut.csv:4:9", fault.Place.ToString());
    }

    [Fact]
    public void Quoted_headings_and_cells_are_read_as_if_they_were_not()
    {
        var cut = TableText.ReadCut("\"Freq [MHz]\",\"Theta [deg]\",\"H, co [dB]\"\n\"1620\",\"-10\",\"-3\"\n1620,10,-4\n");
        Assert.Equal([-10.0, 10.0], cut.AngleDeg);
        TableText.Near(TableText.Polar(-3, 0), cut.At(cut.ChannelNames(), 0, 0));
    }

    [Fact]
    public void Comments_empty_lines_and_repeated_headings_between_the_rows_are_passed_over()
    {
        var cut = TableText.ReadCut("f [MHz],theta [deg],H [dB]\n1620,0,-3\n\n# pause, \"lunch\n% x\n// y, z, w\n! v\nf [MHz],theta [deg],H [dB]\n1620,10,-4\n,,\n");
        Assert.Equal([0.0, 10.0], cut.AngleDeg);
        Assert.Equal((2, 9), cut.Lines);
    }

    [Fact]
    public void A_separator_at_the_end_of_each_row_is_no_column()
    {
        Assert.Equal([0.0, 10.0], TableText.ReadCut("f [MHz],theta [deg],H [dB]\n1620,0,-3,\n1620,10,-4,\n").AngleDeg);
        Assert.Equal([0.0, 10.0], TableText.ReadCut("f [MHz],theta [deg],H [dB],\n1620,0,-3,\n1620,10,-4,\n").AngleDeg);
    }

    [Fact]
    public void Fortran_exponents_and_typographic_minus_signs_are_read_with_a_note()
    {
        var table = TableText.Read("f [MHz],theta [deg],H re,H im\n1.62D+03,\u221210,1.0D-01,\u22122.0d-01\n1620,10,1,1\n");
        TableText.Near(new(0.1, -0.2), table.Cuts[0].At("h", 0, 0));
        Assert.Equal([-10.0, 10.0], table.Cuts[0].AngleDeg);
        Assert.True(table.Has("number-spelling"));
    }

    [Fact]
    public void A_spreadsheets_hint_of_its_separator_is_passed_over() =>
        Assert.Equal([0.0, 10.0], TableText.ReadCut("sep=;\nf [MHz];theta [deg];H [dB]\n1620;0;-3,5\n1620;10;-4\n").AngleDeg);
}
