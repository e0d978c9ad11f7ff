using CsCheck;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs.Assembly;

namespace RangeReduce.Tests.Runs;

public sealed class CutJoinerTests
{
    private static readonly double[] Angles = [-10, 0, 10];

    [Fact]
    public void Files_of_one_channel_each_become_one_cut()
    {
        var remarks = new List<Remark>();
        var (used, repeats) = CutJoiner.Join([Piece("i1", 0, [1e9, 2e9], theta: 1), Piece("i2", 0, [1e9, 2e9], phi: 2)], remarks);
        var cut = Assert.Single(used);
        Assert.Equal("i1 i2", string.Join(' ', cut.InputIds));
        Assert.True(cut.Cut.IsComplex);
        Assert.Empty(repeats);
        Assert.Empty(remarks);
    }

    [Fact]
    public void Channels_on_different_grids_stay_apart_and_each_says_what_it_lacks()
    {
        var remarks = new List<Remark>();
        var (used, _) = CutJoiner.Join([Piece("i1", 0, [1e9], theta: 1), Piece("i2", 0, [1.1e9], phi: 2)], remarks);
        Assert.Equal(2, used.Count);
        Assert.Equal("missing-channel missing-channel", string.Join(' ', remarks.Select(remark => remark.Code)));
        Assert.Contains("could not be joined", remarks[0].Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Files_of_one_frequency_each_become_one_cut_in_rising_order()
    {
        var (used, repeats) = CutJoiner.Join([Piece("i1", 45, [2e9], theta: 2, phi: 2), Piece("i2", 45, [1e9], theta: 1, phi: 1), Piece("i3", 45, [3e9], theta: 3, phi: 3)], []);
        var cut = Assert.Single(used).Cut;
        Assert.Empty(repeats);
        Assert.Equal([1e9, 2e9, 3e9], cut.FrequencyHz);
        Assert.Equal([1, 1, 1, 2, 2, 2, 3, 3, 3], cut.First!.Re);
        Assert.Equal([-1, -1, -1, -2, -2, -2, -3, -3, -3], cut.Second!.Im!);
    }

    [Fact]
    public void A_second_cut_of_the_same_thing_is_a_repeat_and_the_first_is_used()
    {
        var remarks = new List<Remark>();
        var (used, repeats) = CutJoiner.Join([Piece("i1", 0, [1e9], theta: 1, phi: 1), Piece("i2", 0, [1e9], theta: 5, phi: 5)], remarks);
        Assert.Equal("i1", Assert.Single(Assert.Single(used).InputIds));
        Assert.Equal("i2", Assert.Single(Assert.Single(repeats).InputIds));
        Assert.Equal((RemarkSeverity.Doubt, "repeated-cut"), (Assert.Single(remarks).Severity, remarks[0].Code));
    }

    [Fact]
    public void Cuts_of_another_angle_state_or_source_are_no_repeats()
    {
        var first = Piece("i1", 0, [1e9], theta: 1, phi: 1);
        var (used, repeats) = CutJoiner.Join([first, Piece("i2", 45, [1e9], theta: 1, phi: 1), first with { State = "left" }, first with { Source = DataSource.Simulated }], []);
        Assert.Equal(4, used.Count);
        Assert.Empty(repeats);
    }

    [Fact]
    public void However_a_cut_is_cut_up_into_files_it_comes_back_whole() => (
        from frequencies in Gen.Double[1e9, 2e9].Array[1, 8]
        from order in Gen.Int[0, 1_000_000].Array[16]
        from split in Gen.Bool.Array[8]
        select (FrequencyHz: frequencies.Distinct().ToArray(), order, split)).Sample(sample =>
    {
        // Every frequency in its own files, whole or one file a channel, in any order.
        var pieces = sample.FrequencyHz.SelectMany((hertz, at) => sample.split[0]
            ? new[] { Piece($"i{at}a", 0, [hertz], theta: hertz), Piece($"i{at}b", 0, [hertz], phi: hertz) }
            : [Piece($"i{at}", 0, [hertz], theta: hertz, phi: hertz)]);
        var shuffled = pieces.Select((piece, at) => (piece, key: sample.order[at])).OrderBy(pair => pair.key).Select(pair => pair.piece);
        var (used, repeats) = CutJoiner.Join(shuffled, []);
        var cut = Assert.Single(used).Cut;
        Assert.Empty(repeats);
        Assert.Equal(sample.FrequencyHz.Order(), cut.FrequencyHz);
        Assert.Equal(cut.FrequencyHz.SelectMany(hertz => Angles.Select(_ => hertz)), cut.First!.Re);
        Assert.Equal(cut.First.Re, cut.Second!.Re);
    }, seed: "000000000032");

    private static CutPiece Piece(string id, double phiDeg, double[] frequencyHz, double? theta = null, double? phi = null) =>
        new([id], id + ".csv", "right", DataSource.Measured, new()
        {
            Axis = CutAxis.Theta,
            FixedDeg = phiDeg,
            FrequencyHz = frequencyHz,
            AngleDeg = Angles,
            Basis = PolarizationBasis.ThetaPhi,
            First = Filled(theta, frequencyHz.Length),
            Second = Filled(phi, frequencyHz.Length),
        });

    private static PatternChannel? Filled(double? value, int frequencies) =>
        value is null ? null : new([.. Enumerable.Repeat(value.Value, frequencies * Angles.Length)], [.. Enumerable.Repeat(-value.Value, frequencies * Angles.Length)]);
}
