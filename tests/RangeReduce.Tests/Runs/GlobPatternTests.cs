using CsCheck;
using RangeReduce.Diagnostics;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Tests.Runs;

public sealed class GlobPatternTests
{
    private static readonly SourcePlace Here = new("run.toml", 7, 11);

    [Theory]
    [InlineData("right/*.s1p", "right/s11.s1p", true)]
    [InlineData("right/*.s1p", "right/a/s11.s1p", false)]
    [InlineData("right/*.s1p", "Right/s11.s1p", false)]
    [InlineData("right/**/*.s1p", "right/s11.s1p", true)]
    [InlineData("right/**/*.s1p", "right/a/b/s11.s1p", true)]
    [InlineData("**/phi0?.csv", "x/phi00.csv", true)]
    [InlineData("**/phi0?.csv", "x/phi0.csv", false)]
    [InlineData("**", "any/where/at/all.txt", true)]
    [InlineData("right", "right/s11.s1p", false)]
    [InlineData("a.csv", "a.csv", true)]
    [InlineData("a.csv", "aXcsv", false)]
    public void Stars_and_question_marks_stay_in_a_name_and_two_stars_span_folders(string pattern, string path, bool expected) =>
        Assert.Equal(expected, GlobPattern.Parse(pattern, Here).Matches(path));

    [Theory]
    [InlineData("../x.csv")]
    [InlineData("a/../../x.csv")]
    [InlineData("/etc/passwd")]
    [InlineData("C:/x.csv")]
    [InlineData("a\\x.csv")]
    [InlineData("a//x.csv")]
    [InlineData("./x.csv")]
    [InlineData("a**/x.csv")]
    [InlineData("a\u001bx.csv")]
    [InlineData("")]
    public void A_pattern_that_leads_out_of_the_folder_or_cannot_match_is_refused_with_its_place(string pattern)
    {
        var error = Assert.Throws<MeasurementDataException>(() => GlobPattern.Parse(pattern, Here));
        Assert.Equal(Here, error.Place);
        Assert.DoesNotContain('\u001b', error.Message);
    }

    [Fact]
    public void A_path_without_wildcards_matches_itself_and_so_does_every_pattern_of_stars_in_its_place() =>
        Gen.String[Gen.Char["abc.-_0"], 1, 6].Where(name => name is not "." and not "..").List[1, 5].Sample(names =>
        {
            var path = string.Join('/', names);
            return GlobPattern.Parse(path, Here).Matches(path)
                && GlobPattern.Parse(string.Join('/', names.Select(_ => "*")), Here).Matches(path)
                && GlobPattern.Parse("**/*", Here).Matches(path);
        }, seed: "000000000033");

    [Fact]
    public void Many_stars_do_not_take_long() =>
        Assert.False(GlobPattern.Parse(string.Join('/', Enumerable.Repeat("**/*a*a*a*a", 20)) + "/b", Here).Matches(string.Join('/', Enumerable.Repeat("aaaaaaaaaaaaaaaaaaaaaaaa", 60)) + "/c"));
}
