using RangeReduce.Reporting.Results;

namespace RangeReduce.Reporting.Tests.Results;

public sealed class OutputFolderTests
{
    private const string OurResults = "{\n  \"format\": \"rangereduce-results\"\n}\n";

    [Fact]
    public void A_folder_appears_whole_under_its_name_and_nothing_else_beside_it()
    {
        using var scratch = new ScratchFolder();
        OutputFolder.Build(scratch.Of("report"), overwrite: false, folder =>
        {
            Assert.False(Directory.Exists(scratch.Of("report")));
            File.WriteAllText(Path.Combine(folder, "results.json"), OurResults);
        });
        Assert.Equal("report", Assert.Single(scratch.Names));
        Assert.Equal(OurResults, File.ReadAllText(Path.Combine(scratch.Of("report"), "results.json")));
    }

    [Fact]
    public void A_build_that_fails_leaves_nothing()
    {
        using var scratch = new ScratchFolder();
        Assert.Throws<InvalidOperationException>(() => OutputFolder.Build(scratch.Of("report"), overwrite: false, Fail));
        Assert.Empty(scratch.Names);
    }

    [Fact]
    public void A_build_that_fails_leaves_the_report_that_was_there()
    {
        using var scratch = new ScratchFolder();
        OutputFolder.Build(scratch.Of("report"), overwrite: false, folder => File.WriteAllText(Path.Combine(folder, "results.json"), OurResults));
        Assert.Throws<InvalidOperationException>(() => OutputFolder.Build(scratch.Of("report"), overwrite: true, Fail));
        Assert.Equal("report", Assert.Single(scratch.Names));
        Assert.Equal("results.json", Path.GetFileName(Assert.Single(Directory.GetFileSystemEntries(scratch.Of("report")))));
    }

    [Fact]
    public void An_existing_report_is_replaced_only_when_asked_and_then_wholly()
    {
        using var scratch = new ScratchFolder();
        OutputFolder.Build(scratch.Of("report"), overwrite: false, folder =>
        {
            File.WriteAllText(Path.Combine(folder, "results.json"), OurResults);
            File.WriteAllText(Path.Combine(folder, "old.txt"), "old");
        });
        var refused = Assert.Throws<IOException>(() => OutputFolder.Build(scratch.Of("report"), overwrite: false, _ => Assert.Fail("Nothing may be built.")));
        Assert.Contains("--force", refused.Message, StringComparison.Ordinal);
        OutputFolder.Build(scratch.Of("report"), overwrite: true, folder => File.WriteAllText(Path.Combine(folder, "results.json"), OurResults));
        Assert.Equal("report", Assert.Single(scratch.Names));
        Assert.False(File.Exists(Path.Combine(scratch.Of("report"), "old.txt")));
    }

    [Theory]
    [InlineData("right.s1p", "! data of a week in the chamber")]
    [InlineData("results.json", "{ \"format\": \"of another program\" }")]
    public void A_folder_of_something_else_is_never_replaced(string name, string content)
    {
        using var scratch = new ScratchFolder();
        Directory.CreateDirectory(scratch.Of("data"));
        File.WriteAllText(Path.Combine(scratch.Of("data"), name), content);
        Assert.Throws<IOException>(() => OutputFolder.Build(scratch.Of("data"), overwrite: true, _ => Assert.Fail("Nothing may be built.")));
        Assert.Equal("data", Assert.Single(scratch.Names));
        Assert.Equal(content, File.ReadAllText(Path.Combine(scratch.Of("data"), name)));
    }

    [Fact]
    public void An_empty_folder_is_taken_and_a_file_is_not()
    {
        using var scratch = new ScratchFolder();
        Directory.CreateDirectory(scratch.Of("empty"));
        OutputFolder.Build(scratch.Of("empty"), overwrite: false, folder => File.WriteAllText(Path.Combine(folder, "results.json"), OurResults));
        Assert.True(File.Exists(Path.Combine(scratch.Of("empty"), "results.json")));
        File.WriteAllText(scratch.Of("file"), "a file");
        Assert.Throws<IOException>(() => OutputFolder.Build(scratch.Of("file"), overwrite: true, _ => Assert.Fail("Nothing may be built.")));
        Assert.Equal("a file", File.ReadAllText(scratch.Of("file")));
    }

    private static void Fail(string folder)
    {
        File.WriteAllText(Path.Combine(folder, "half.csv"), "half");
        throw new InvalidOperationException("The plots could not be drawn.");
    }
}
