using System.Numerics;
using System.Text;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

/// <summary>Reads tables that are written in a test.</summary>
internal static class TableText
{
    public static MeasurementTable Read(string text, string name = "cut.csv", TableOptions? options = null) => TableReader.Read(Encoding.UTF8.GetBytes(text), name, options);

    public static RawCut ReadCut(string text, string name = "cut.csv", TableOptions? options = null) => Assert.Single(Read(text, name, options).Cuts);

    public static MeasurementDataException Fault(string text, string name = "cut.csv", TableOptions? options = null) => Assert.Throws<MeasurementDataException>(() => Read(text, name, options));

    public static PatternChannel Channel(this RawCut cut, string name) => Assert.Single(cut.Channels, channel => string.Equals(channel.Name, name, StringComparison.Ordinal)).Samples;

    public static string ChannelNames(this RawCut cut) => string.Join(' ', cut.Channels.Select(channel => channel.Name));

    public static Complex At(this RawCut cut, string channel, int frequency, int angle)
    {
        var samples = cut.Channel(channel);
        var at = (frequency * cut.AngleDeg.Length) + angle;
        return new(samples.Re[at], samples.Im?[at] ?? 0.0);
    }

    public static Complex Polar(double levelDb, double phaseDeg) => Complex.FromPolarCoordinates(Math.Pow(10.0, levelDb / 20.0), phaseDeg * Math.PI / 180.0);

    public static void Near(Complex expected, Complex actual, double within = 1e-12) =>
        Assert.True((expected - actual).Magnitude <= within, $"expected {expected}, got {actual}");

    public static bool Has(this MeasurementTable table, string code) => table.Remarks.Any(remark => string.Equals(remark.Code, code, StringComparison.Ordinal));
}
