using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

public sealed class HeadingTests
{
    [Theory]
    [InlineData("Freq [MHz]", "MHz")]
    [InlineData("Frequency (GHz)", "GHz")]
    [InlineData("f/GHz", "GHz")]
    [InlineData("freqMHz", "MHz")]
    [InlineData("freq_hz", "Hz")]
    [InlineData("Frequency in kHz", "kHz")]
    [InlineData("\"F [GHz]\"", "GHz")]
    public void A_frequency_heading_is_understood_with_its_unit(string text, string unit)
    {
        var heading = HeadingParser.Parse(text);
        Assert.Equal(HeadingKind.Frequency, heading.Kind);
        Assert.Equal(unit, heading.Unit.Text);
        Assert.False(heading.IsAcross);
    }

    [Theory]
    [InlineData("Az (deg)", nameof(HeadingKind.Azimuth))]
    [InlineData("Azimuth angle [\u00B0]", nameof(HeadingKind.Azimuth))]
    [InlineData("Theta [deg]", nameof(HeadingKind.Theta))]
    [InlineData("Theta", nameof(HeadingKind.Theta))]
    [InlineData("\u03B8 / \u00B0", nameof(HeadingKind.Theta))]
    [InlineData("thetaDeg", nameof(HeadingKind.Theta))]
    [InlineData("Phi [\u00BA]", nameof(HeadingKind.Phi))]
    [InlineData("Phi [\u00C2\u00B0]", nameof(HeadingKind.Phi))]
    [InlineData("\u03C6 (rad)", nameof(HeadingKind.Phi))]
    [InlineData("El. [deg]", nameof(HeadingKind.Elevation))]
    [InlineData("Roll axis (deg)", nameof(HeadingKind.Roll))]
    [InlineData("Position [deg]", nameof(HeadingKind.Angle))]
    [InlineData("Probe angle [deg]", nameof(HeadingKind.Spin))]
    public void An_angle_heading_is_understood(string text, string kind) => Assert.Equal(kind, HeadingParser.Parse(text).Kind.ToString());

    [Theory]
    [InlineData("S21 H mag (dB)", "h", nameof(ChannelPart.Level), "dB")]
    [InlineData("H [dB]", "h", nameof(ChannelPart.Level), "dB")]
    [InlineData("H [deg]", "h", nameof(ChannelPart.Phase), "deg")]
    [InlineData("E_theta re", "theta", nameof(ChannelPart.Real), "")]
    [InlineData("E_theta im", "theta", nameof(ChannelPart.Imaginary), "")]
    [InlineData("Re(E_phi)", "phi", nameof(ChannelPart.Real), "")]
    [InlineData("RHCP dB", "right", nameof(ChannelPart.Level), "dB")]
    [InlineData("lhcp_db", "left", nameof(ChannelPart.Level), "dB")]
    [InlineData("E_theta [dBi]", "theta", nameof(ChannelPart.Level), "dBi")]
    [InlineData("Gain RHCP [dBic]", "right", nameof(ChannelPart.Level), "dBi")]
    [InlineData("H mag", "h", nameof(ChannelPart.Amplitude), "")]
    [InlineData("|V|", "v", nameof(ChannelPart.Amplitude), "")]
    [InlineData("V phase (rad)", "v", nameof(ChannelPart.Phase), "rad")]
    [InlineData("dB(S21)", "s21", nameof(ChannelPart.Level), "dB")]
    [InlineData("arg(S21) [\u00B0]", "s21", nameof(ChannelPart.Phase), "deg")]
    [InlineData("Theta [dB]", "theta", nameof(ChannelPart.Level), "dB")]
    [InlineData("Theta phase [deg]", "theta", nameof(ChannelPart.Phase), "deg")]
    [InlineData("E_theta [deg]", "theta", nameof(ChannelPart.Phase), "deg")]
    [InlineData("Right-hand circular level [dBm]", "right", nameof(ChannelPart.Level), "dBm")]
    [InlineData("Horizontal power (mW)", "h", nameof(ChannelPart.Power), "mW")]
    [InlineData("Probe 1 [dB]", "probe_1", nameof(ChannelPart.Level), "dB")]
    [InlineData("Co-pol [dB]", "co", nameof(ChannelPart.Level), "dB")]
    [InlineData("Phase [deg]", "", nameof(ChannelPart.Phase), "deg")]
    public void A_channel_heading_gives_name_part_and_unit(string text, string channel, string part, string unit)
    {
        var heading = HeadingParser.Parse(text);
        Assert.Equal(HeadingKind.Channel, heading.Kind);
        Assert.Equal(channel, heading.Channel);
        Assert.Equal(part, heading.Part.ToString());
        Assert.Equal(unit, heading.Unit.Text);
    }

    [Theory]
    [InlineData("Return loss [dB]", nameof(ChannelPart.ReturnLoss))]
    [InlineData("S11 (dB)", nameof(ChannelPart.Level))]
    [InlineData("VSWR", nameof(ChannelPart.StandingWaveRatio))]
    [InlineData("S11 re", nameof(ChannelPart.Real))]
    [InlineData("|S11|", nameof(ChannelPart.Amplitude))]
    [InlineData("S11 phase [deg]", nameof(ChannelPart.Phase))]
    public void A_reflection_heading_is_understood(string text, string part)
    {
        var heading = HeadingParser.Parse(text);
        Assert.Equal(HeadingKind.Reflection, heading.Kind);
        Assert.Equal(part, heading.Part.ToString());
    }

    [Theory]
    [InlineData("1.62 GHz", 1.62, "GHz", "")]
    [InlineData("1620 MHz [dB]", 1620, "MHz", "dB")]
    [InlineData("H 1,62 GHz (dB)", 1.62, "GHz", "dB")]
    [InlineData("f=1620MHz", 1620, "MHz", "")]
    public void A_frequency_in_a_heading_belongs_to_the_wide_form(string text, double value, string unit, string level)
    {
        var heading = HeadingParser.Parse(text);
        Assert.Equal(value, heading.Across);
        Assert.Equal(HeadingKind.Frequency, heading.AcrossKind);
        Assert.Equal(unit, heading.AcrossUnit.Text);
        Assert.Equal(level, heading.Unit.Text);
    }

    [Theory]
    [InlineData("Time")]
    [InlineData("Temperature [C]")]
    [InlineData("Comment")]
    [InlineData("Axial ratio [dB]")]
    [InlineData("No.")]
    public void What_no_figure_needs_is_known_as_such(string text) => Assert.Equal(HeadingKind.Spare, HeadingParser.Parse(text).Kind);

    [Theory]
    [InlineData("Foo")]
    [InlineData("")]
    [InlineData("(((")]
    [InlineData("H")]
    public void What_is_not_understood_stays_unknown(string text) => Assert.Equal(HeadingKind.Unknown, HeadingParser.Parse(text).Kind);
}
