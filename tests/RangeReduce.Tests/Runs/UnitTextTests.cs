using CsCheck;
using RangeReduce.Diagnostics;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Tests.Runs;

/// <summary>Prefixes and symbols by the SI brochure, 9th edition; the inch is 25.4 mm exactly (ISO 80000-3).</summary>
public sealed class UnitTextTests
{
    private static readonly SourcePlace Here = new("run.toml", 3, 9);

    [Theory]
    [InlineData("1.58 GHz", UnitDimension.Frequency, 1.58e9)]
    [InlineData("1580MHz", UnitDimension.Frequency, 1.58e9)]
    [InlineData("1.58e9 Hz", UnitDimension.Frequency, 1.58e9)]
    [InlineData(" 4.2 m ", UnitDimension.Length, 4.2)]
    [InlineData("310 mm", UnitDimension.Length, 0.31)]
    [InlineData("12 in", UnitDimension.Length, 0.3048)]
    [InlineData("-40 dB", UnitDimension.Ratio, -40.0)]
    [InlineData("+7.5 dBi", UnitDimension.Gain, 7.5)]
    [InlineData("30°", UnitDimension.Angle, 30.0)]
    [InlineData("3.14159265358979 rad", UnitDimension.Angle, 180.0)]
    [InlineData("75 %", UnitDimension.Percent, 75.0)]
    [InlineData("50 Ω", UnitDimension.Resistance, 50.0)]
    [InlineData("2.5 ns", UnitDimension.Time, 2.5e-9)]
    [InlineData("1.5", UnitDimension.Number, 1.5)]
    public void A_number_with_its_unit_is_brought_to_the_base_unit(string text, UnitDimension dimension, double expected)
    {
        var value = UnitText.Parse(text, Here, dimension);
        Assert.Equal(dimension, value.Dimension);
        Assert.Equal(expected, value.Value, Math.Abs(expected) * 1e-12);
    }

    [Theory]
    [InlineData("4.2", UnitDimension.Length, "Write the unit")]
    [InlineData("4.2 GHz", UnitDimension.Length, "another kind")]
    [InlineData("4.2 metre", UnitDimension.Length, "not known")]
    [InlineData("1.6 ghz", UnitDimension.Frequency, "GHz")]
    [InlineData("4,2 m", UnitDimension.Length, "point")]
    [InlineData("long", UnitDimension.Length, "number")]
    [InlineData("1e999 m", UnitDimension.Length, "number")]
    [InlineData("", UnitDimension.Length, "number")]
    [InlineData("3 dB", UnitDimension.Number, "another kind")]
    [InlineData("3 dB", UnitDimension.Gain, "another kind")]
    public void A_missing_or_wrong_unit_is_a_located_error_that_says_which_units_do(string text, UnitDimension dimension, string advice)
    {
        var error = Assert.Throws<MeasurementDataException>(() => UnitText.Parse(text, Here, dimension));
        Assert.Equal(Here, error.Place);
        Assert.Contains(advice, error.Advice, StringComparison.Ordinal);
        Assert.Equal(UnitText.Expected(dimension), error.Expected);
    }

    [Theory]
    [InlineData("1.58 GHz .. 1.64 GHz")]
    [InlineData("1580 MHz..1.64 GHz")]
    [InlineData("1.58 .. 1.64 GHz")]
    public void A_range_takes_the_unit_of_its_upper_end_where_the_lower_has_none(string text)
    {
        var (low, high) = UnitText.ParseRange(text, Here, UnitDimension.Frequency);
        Assert.Equal(1.58e9, low, 1.0);
        Assert.Equal(1.64e9, high, 1.0);
    }

    [Theory]
    [InlineData("1.58 GHz")]
    [InlineData("1.64 GHz .. 1.58 GHz")]
    [InlineData("1.58 GHz .. 1.58 GHz")]
    [InlineData("1 m .. 2 m")]
    [InlineData(".. 2 GHz")]
    public void A_range_that_is_none_is_refused(string text) =>
        Assert.Throws<MeasurementDataException>(() => UnitText.ParseRange(text, Here, UnitDimension.Frequency));

    [Fact]
    public void What_is_written_reads_back_to_the_last_bit() => (
        from value in Gen.Double.Where(double.IsFinite)
        from dimension in Gen.Enum<UnitDimension>()
        select (value, dimension)).Sample(pair => UnitText.Parse(UnitText.Write(pair.value, pair.dimension), Here, pair.dimension) == new UnitValue(pair.value, pair.dimension), seed: "000000000034");

    [Fact]
    public void No_text_escapes_as_another_kind_of_error() => Gen.String.Sample(text =>
    {
        try
        {
            UnitText.ParseRange(text, Here, UnitDimension.Frequency, UnitDimension.Number);
        }
        catch (MeasurementDataException)
        {
            return;
        }
    }, seed: "000000000035");
}
