using System.Numerics;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Runs.Assembly;
using RangeReduce.Runs.Manifest;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Tests.Runs;

/// <summary>Which settings turn the sense of polarization: the table of the causes, worked out from E_R = (E_theta + j E_phi)/sqrt 2 by the conventions of IEEE Std 145.</summary>
public sealed class PieceMakerTests
{
    // A pure right-hand wave by IEEE Std 145 and exp(+jwt): E_phi = -j E_theta.
    private static readonly Complex Theta = new(0.6, 0.3);
    private static readonly Complex Phi = -Complex.ImaginaryOne * Theta;

    [Theory]
    [InlineData(null, null, TimeFactor.PlusJ, Hand.Right)]
    [InlineData("H", "V", TimeFactor.PlusJ, Hand.Right)]
    [InlineData("H", "V", TimeFactor.MinusI, Hand.Left)]
    [InlineData("V", "H", TimeFactor.PlusJ, Hand.Left)]
    [InlineData("-H", "V", TimeFactor.PlusJ, Hand.Left)]
    [InlineData("H", "-V", TimeFactor.PlusJ, Hand.Left)]
    [InlineData("-H", "-V", TimeFactor.PlusJ, Hand.Right)]
    [InlineData("V", "-H", TimeFactor.PlusJ, Hand.Right)]
    [InlineData("V", "H", TimeFactor.MinusI, Hand.Right)]
    [InlineData("h", "\u2212v", TimeFactor.MinusI, Hand.Right)]
    public void An_odd_number_of_turned_settings_turns_the_hand(string? theta, string? phi, TimeFactor time, Hand expected)
    {
        var cut = Made(Raw(("h", Theta), ("v", Phi)), theta is null ? null : new(theta, phi), time);
        var (first, second) = (new Complex(cut.First!.Re[0], cut.First.Im![0]), new Complex(cut.Second!.Re[0], cut.Second.Im![0]));
        var (right, left) = (Complex.Abs(first + (Complex.ImaginaryOne * second)), Complex.Abs(first - (Complex.ImaginaryOne * second)));
        Assert.Equal(expected, right > left ? Hand.Right : Hand.Left);
        Assert.Equal(0.0, Math.Min(right, left), 1e-15);
    }

    [Fact]
    public void Headings_that_name_the_component_hold_whatever_the_probe_ports_are()
    {
        var cut = Made(Raw(("theta", Theta), ("phi", Phi)), new("V", "H"), TimeFactor.PlusJ);
        Assert.Equal(Theta.Real, cut.First!.Re[0]);
    }

    [Fact]
    public void A_level_without_phase_keeps_its_sign_and_that_is_said()
    {
        var remarks = new List<Remark>();
        var raw = Raw(("h", Theta), ("v", Phi)) with { Channels = [("h", new([0.5], null)), ("v", new([0.25], null))] };
        var cut = Made(raw, new("-H", "V"), TimeFactor.MinusI, remarks);
        Assert.Equal(0.5, cut.First!.Re[0]);
        Assert.Equal("sign-without-phase", Assert.Single(remarks).Code);
    }

    [Fact]
    public void A_channel_that_is_no_known_component_is_left_out_with_a_fault()
    {
        var remarks = new List<Remark>();
        var cut = Made(Raw(("h", Theta), ("aux", Phi)), null, TimeFactor.PlusJ, remarks);
        Assert.Null(cut.Second);
        Assert.Equal((RemarkSeverity.Fault, "unknown-channel"), (Assert.Single(remarks).Severity, remarks[0].Code));
    }

    [Fact]
    public void A_port_with_a_name_of_its_own_is_taken_where_the_manifest_names_it()
    {
        var cut = Made(Raw(("b2/a1", Theta), ("b3/a1", Phi)), new("B2/A1", "-b3/a1"), TimeFactor.PlusJ);
        Assert.Equal((Theta.Real, -Phi.Real), (cut.First!.Re[0], cut.Second!.Re[0]));
    }

    private static PatternCut Made(RawCut raw, ManifestProbe? probe, TimeFactor time, List<Remark>? remarks = null)
    {
        var file = new PlannedFile(new("i1", "right/cut.csv", string.Empty, 1, InputKind.Cut, "right", DataSource.Measured, "test"), "cut.csv");
        return Assert.Single(new PieceMaker(new(probe), time, remarks ?? []).PiecesOf(file, raw)).Cut;
    }

    private static RawCut Raw(params (string Name, Complex Value)[] channels) => new()
    {
        Axis = CutAxis.Theta,
        FixedDeg = 0,
        FrequencyHz = [1.6e9],
        AngleDeg = [0],
        Channels = [.. channels.Select(channel => (channel.Name, new PatternChannel([channel.Value.Real], [channel.Value.Imaginary])))],
    };
}
