using System.Buffers.Binary;

using RangeReduce.Reporting.Plots;

using SkiaSharp;

namespace RangeReduce.Reporting.Tests;

public sealed class PlotTests
{
    private static readonly ReportModel Model = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options);

    public static TheoryData<string, string> Kinds()
    {
        var data = new TheoryData<string, string>();
        foreach (var plot in Model.Plots.DistinctBy(plot => plot.Kind, StringComparer.Ordinal))
        {
            data.Add(plot.Kind, plot.FileName);
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Plot_of_each_kind_has_text_frame_and_curves(string kind, string fileName)
    {
        var png = PlotImageWriter.Draw(Model.Plots.First(plot => string.Equals(plot.FileName, fileName, StringComparison.Ordinal)));
        using var picture = SKBitmap.Decode(png);
        var colors = picture.Pixels.GroupBy(pixel => (uint)pixel).ToDictionary(group => group.Key, group => group.Count());
        Assert.Equal(1890, picture.Width);
        Assert.True(colors[(uint)SKColors.White] > picture.Width * picture.Height / 2, $"{kind} is mostly ground");
        Assert.True(colors.GetValueOrDefault(0xFF1F2328u) > 500, $"{kind} has text");
        Assert.True(PlotPalette.States.Sum(color => colors.GetValueOrDefault((uint)new SKColor(color.R, color.G, color.B))) > 1500, $"{kind} has curves in the colours of the states");
    }

    [Fact]
    public void Kinds_of_plots_are_all_there() => Assert.Superset(
        new HashSet<string>(StringComparer.Ordinal) { "return loss", "VSWR", "complex reflection plane", "polar cut", "rectangular cut", "axial ratio along the cut", "tilt angle along the cut", "gain over frequency", "two states in one frame", "measured over simulated" },
        Model.Plots.Select(plot => plot.Kind).ToHashSet(StringComparer.Ordinal));

    [Fact]
    public void Pictures_state_300_dots_an_inch_and_are_the_same_each_time()
    {
        var figure = Model.Plots.First();
        var png = PlotImageWriter.Draw(figure);
        Assert.Equal(png, PlotImageWriter.Draw(figure));
        var at = png.AsSpan().IndexOf("pHYs"u8);
        Assert.Equal(11811, BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(at + 4)));
    }

    [Fact]
    public void File_names_are_unique_and_plain() => Assert.All(
        Model.Plots.GroupBy(plot => plot.FileName, StringComparer.Ordinal),
        group => Assert.True(group.Count() == 1 && group.Key.All(letter => char.IsAsciiLetterLower(letter) || char.IsAsciiDigit(letter) || letter == '-'), group.Key));

    [Fact]
    public void Folder_holds_one_picture_a_plot()
    {
        var folder = Directory.CreateTempSubdirectory("plots");
        try
        {
            var one = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options);
            var names = PlotImageWriter.WritePng(one with { Sections = [.. one.Sections.Where(section => section.Id is "match")] }, folder.FullName);
            Assert.Equal(["match-return-loss.png", "match-vswr.png", "match-reflection-plane.png"], names, StringComparer.Ordinal);
            Assert.All(names, name => Assert.True(File.Exists(Path.Combine(folder.FullName, name))));
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    [Theory]
    [InlineData(0.0, 26.7, 5, 0.0, 30.0, 5.0)]
    [InlineData(-11.4, 7.7, 5, -15.0, 10.0, 5.0)]
    [InlineData(0.0, 4.0, 5, 0.0, 4.0, 1.0)]
    public void Axis_ends_at_round_numbers(double least, double most, int ticks, double low, double high, double step) =>
        Assert.Equal(new AxisScale(low, high, step), AxisScale.Outward(least, most, ticks));
}
