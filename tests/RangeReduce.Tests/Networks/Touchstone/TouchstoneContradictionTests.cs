using System.Text;
using RangeReduce.Diagnostics;
using RangeReduce.Networks.Touchstone;

namespace RangeReduce.Tests.Networks.Touchstone;

/// <summary>What a file says twice or in the wrong place is an error with its place, never a silent choice (our choice where the specification is silent).</summary>
public sealed class TouchstoneContradictionTests
{
    private const string Header = "[Version] 2.0\n# GHz S RI R 50\n[Number of Ports] 1\n[Number of Frequencies] 1\n";

    [Theory]
    [InlineData("# GHz S S\n1 0.1 0.2\n", "repeated-option", 1, 9)]
    [InlineData("# GHz z S MA\n1 0.1 0.2\n", "repeated-option", 1, 9)]
    [InlineData("# GHz MHz\n1 0.1 0.2\n", "repeated-option", 1, 7)]
    [InlineData("# MA RI\n1 0.1 0.2\n", "repeated-option", 1, 6)]
    [InlineData("# R R 50\n1 0.1 0.2\n", "repeated-option", 1, 5)]
    [InlineData("# R 50 R75\n1 0.1 0.2\n", "repeated-option", 1, 8)]
    [InlineData("# R S 50\n1 0.1 0.2\n", "bad-reference", 1, 5)]
    [InlineData("# GHz S RI\n1 +-1 0\n", "bad-number", 2, 3)]
    [InlineData("# GHz S DB\n  1 7220 180\n", "bad-number", 2, 3)]
    [InlineData("# GHz\n1 0.1 0.2\n  1 0.3 0.2\n", "frequency-not-increasing", 3, 3)]
    public void A_file_of_version_1_that_contradicts_itself_is_refused(string text, string code, int line, int column) => Refused(text, code, line, column);

    [Theory]
    [InlineData(Header + "[Number of Ports] 2\n[Network Data]\n1 0.1 0.2\n[End]\n", "repeated-keyword", 5)]
    [InlineData(Header + "[Network Data]\n1 0.1 0.2\n[Reference] 75\n[End]\n", "keyword-among-data", 7)]
    [InlineData(Header + "[Network Data]\n1 0.1 0.2\n[Number of Ports] 2\n[End]\n", "keyword-among-data", 7)]
    [InlineData(Header + "[Network Data]\n1 0.1 0.2\n[Network Data]\n[End]\n", "keyword-among-data", 7)]
    [InlineData(Header + "[Reference]\n[Network Data]\n1 0.1 0.2\n[End]\n", "reference-count", 5)]
    [InlineData(Header + "[Network Data] 2\n1 0.1 0.2\n[End]\n", "bad-keyword-value", 5)]
    [InlineData(Header + "[End]\n", "missing-network-data", 5)]
    public void A_file_of_version_2_that_contradicts_itself_is_refused(string text, string code, int line) => Refused(text, code, line, 1);

    [Fact]
    public void A_noise_frequency_below_zero_is_refused() =>
        Refused("# GHz S RI R 50\n1 0.1 0 2 0 0.01 0 0.2 0\n-0.5 1.2 0.3 -90 0.5\n", "bad-frequency", 3, 1, "a.s2p");

    [Fact]
    public void A_point_that_stands_twice_with_the_same_values_is_kept_once_with_a_remark()
    {
        var file = TouchstoneReader.Parse("# GHz S RI R 50\n1 0.1 0\n1 0.1 0\n2 0.2 0\n"u8, "a.s1p");
        Assert.Equal([1e9, 2e9], file.Sweep.FrequencyHz);
        Assert.Equal([0.1, 0.2], file.Sweep.Re);
        Assert.Equal(3, Assert.Single(file.Remarks, remark => remark.Code is "repeated-point").Place?.Line);
    }

    [Fact]
    public void A_repeated_point_counts_among_the_stated_frequencies_of_version_2()
    {
        var text = "[Version] 2.0\n# GHz S RI R 50\n[Number of Ports] 1\n[Number of Frequencies] 2\n[Other] 1\n5 5 5\n[Other] 2\n[Begin Information]\n[open\n[End Information]\n[Network Data]\n1 0.1 0\n1 0.1 0\n[End]\n"u8;
        var file = TouchstoneReader.Parse(text, "a.ts");
        Assert.Equal(["unknown-keyword", "repeated-point"], file.Remarks.Select(remark => remark.Code), StringComparer.Ordinal);
        Assert.Equal(1, file.Sweep.Count);
    }

    [Fact]
    public void Comments_past_the_thousandth_are_left_out_with_a_remark()
    {
        var text = string.Concat(Enumerable.Repeat("! note\n", 1001)) + "# GHz S RI R 50\n1 0.1 0\n";
        var file = TouchstoneReader.Parse(Encoding.ASCII.GetBytes(text), "a.s1p");
        Assert.Equal(1000, file.Comments.Count);
        Assert.Contains(file.Remarks, remark => remark.Code is "comments-left-out");
    }

    private static void Refused(string text, string code, int line, int column, string name = "a.s1p")
    {
        var error = Assert.Throws<MeasurementDataException>(() => TouchstoneReader.Parse(Encoding.ASCII.GetBytes(text), name));
        Assert.Equal(code, error.Code);
        Assert.Equal((line, column), (error.Place.Line, error.Place.Column));
    }
}
