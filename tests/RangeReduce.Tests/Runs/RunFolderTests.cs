using RangeReduce.Diagnostics;
using RangeReduce.Runs.Discovery;

namespace RangeReduce.Tests.Runs;

public sealed class RunFolderTests : IDisposable
{
    private readonly ScratchFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Files_come_in_the_order_of_their_paths_with_forward_slashes()
    {
        _folder.Write("b/z.csv", "1");
        _folder.Write("b/a/y.csv", "12");
        _folder.Write("B.txt", "123");
        Assert.Equal("B.txt 3, b/a/y.csv 2, b/z.csv 1", string.Join(", ", RunFolder.Walk(_folder.Path).Files.Select(file => $"{file.Path} {file.Bytes}")));
    }

    [Fact]
    public void A_folder_that_is_missing_or_is_a_file_is_said_so()
    {
        _folder.Write("x.s1p", "#");
        Assert.Equal("no-folder", Assert.Throws<MeasurementDataException>(() => RunFolder.Walk(_folder.At("nowhere"))).Code);
        Assert.Equal("not-a-folder", Assert.Throws<MeasurementDataException>(() => RunFolder.Walk(_folder.At("x.s1p"))).Code);
    }

    [Fact]
    public void A_link_that_leads_back_up_is_not_followed_for_ever()
    {
        _folder.Write("right/a.s1p", "#");
        Directory.CreateSymbolicLink(_folder.At("right/again"), _folder.Path);
        File.CreateSymbolicLink(_folder.At("self"), _folder.At("self"));
        var listing = RunFolder.Walk(_folder.Path);
        Assert.Equal("right/a.s1p", Assert.Single(listing.Files).Path);
        Assert.Equal("right/again, self", string.Join(", ", listing.Remarks.Select(remark => remark.Place?.File)));
        Assert.All(listing.Remarks, remark => Assert.Equal("link-not-followed", remark.Code));
        Assert.Contains("never end", listing.Remarks[0].Text, StringComparison.Ordinal);
        Assert.Contains("circle", listing.Remarks[1].Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_link_out_of_the_folder_is_not_followed_and_one_to_a_file_inside_is()
    {
        using var outside = new ScratchFolder();
        outside.Write("secret.csv", "outside");
        _folder.Write("right/a.csv", "inside");
        Directory.CreateSymbolicLink(_folder.At("way-out"), outside.Path);
        File.CreateSymbolicLink(_folder.At("b.csv"), outside.At("secret.csv"));
        File.CreateSymbolicLink(_folder.At("c.csv"), "right/a.csv");

        // A path that looks inside but goes through the link that leads out.
        File.CreateSymbolicLink(_folder.At("d.csv"), _folder.At("way-out/secret.csv"));
        var listing = RunFolder.Walk(_folder.Path);
        Assert.Equal("c.csv 6, right/a.csv 6", string.Join(", ", listing.Files.Select(file => $"{file.Path} {file.Bytes}")));
        Assert.Equal("b.csv, d.csv, way-out", string.Join(", ", listing.Remarks.Select(remark => remark.Place?.File)));
    }

    [Fact]
    public void Hidden_files_are_listed_but_not_looked_into_and_hidden_folders_are_passed_over()
    {
        _folder.Write(".notes.csv", "1");
        _folder.Write(".git/config", "1");
        var listing = RunFolder.Walk(_folder.Path);
        Assert.Equal("hidden", Assert.Single(listing.Files).PassedOver);
        Assert.Equal("hidden-folder", Assert.Single(listing.Remarks).Code);
    }

    [Fact]
    public void A_report_of_an_earlier_reduction_is_never_read_back_as_measurements()
    {
        _folder.Write("right/a.s1p", "#");
        _folder.Write("reports/results.json", """{ "format": "rangereduce-results", "version": 1 }""");
        _folder.Write("reports/figures.csv", "id");
        _folder.Write("other/results.json", """{ "format": "something else" }""");
        var listing = RunFolder.Walk(_folder.Path);
        Assert.Equal("other/results.json, right/a.s1p", string.Join(", ", listing.Files.Select(file => file.Path)));
        Assert.Equal("own-output", Assert.Single(listing.Remarks).Code);
    }

    [Fact]
    public void A_report_written_into_the_run_itself_is_told_from_the_measurements_beside_it()
    {
        _folder.Write("results.json", """{ "format": "rangereduce-results" }""");
        _folder.Write("figures.csv", "id");
        _folder.Write("traces/t1.csv", "x,y");
        _folder.Write("right.csv", "x,y");
        Assert.Equal("right.csv", Assert.Single(RunFolder.Walk(_folder.Path).Files, file => file.PassedOver is null).Path);
    }

    [Fact]
    public void A_folder_that_is_too_deep_is_named()
    {
        _folder.Write(string.Join('/', Enumerable.Repeat("d", RunFolder.Deepest + 2)) + "/a.csv", "1");
        var listing = RunFolder.Walk(_folder.Path);
        Assert.Empty(listing.Files);
        Assert.Equal("too-deep", Assert.Single(listing.Remarks).Code);
    }

    [Fact]
    public void A_name_with_control_characters_cannot_reach_the_terminal()
    {
        if (OperatingSystem.IsWindows())
        {
            return; // Such names cannot be made there.
        }

        _folder.Write("a\u001b[31m.csv", "1");
        var file = Assert.Single(RunFolder.Walk(_folder.Path).Files);
        Assert.DoesNotContain('\u001b', file.Path);
        Assert.NotNull(file.PassedOver);
    }
}
