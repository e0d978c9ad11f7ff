using CsCheck;

using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Tests;

public sealed class NumberPrintingTests
{
    // JCGM 100:2008, 7.2.6: 10,057 62 ohm with 27 milliohm is rounded to 10,058 ohm; 7.2.4: 100,021 47 g ± 0,79 mg.
    [Theory]
    [InlineData(10.05762, 0.027, "10.058", "0.027")]
    [InlineData(100.02147, 0.00079, "100.02147", "0.00079")]
    [InlineData(7.8449, 0.512, "7.84", "0.51")]
    [InlineData(1.937, 0.0996, "1.94", "0.10")]
    [InlineData(21.34, 9.96, "21", "10")]
    [InlineData(1234.4, 123.0, "1230", "120")]
    [InlineData(-0.4567, 0.1, "\u22120.46", "0.10")]
    public void Value_is_printed_to_two_significant_digits_of_its_uncertainty(double value, double expanded, string printed, string uncertainty) =>
        Assert.Equal((printed, uncertainty), UncertaintyRounding.Print(value, expanded));

    [Fact]
    public void Rounding_never_moves_a_value_by_more_than_a_twentieth_of_its_uncertainty() =>
        Gen.Select(Gen.Double[-1e4, 1e4], Gen.Double[1e-3, 1e3]).Sample((value, expanded) =>
        {
            var printed = double.Parse(UncertaintyRounding.Print(value, expanded).Value.Replace(NumberText.Minus, '-'), System.Globalization.CultureInfo.InvariantCulture);
            Assert.True(Math.Abs(printed - value) <= (0.0501 * expanded) + 1e-12);
        });

    [Theory]
    [InlineData(-0.001, 1, "0.0")]
    [InlineData(-12.35, 1, "\u221212.4")]
    [InlineData(double.NaN, 1, "\u2013")]
    [InlineData(double.NegativeInfinity, 1, "\u2212\u221E")]
    public void Number_has_a_true_minus_and_zero_has_none(double value, int decimals, string printed) => Assert.Equal(printed, NumberText.Fixed(value, decimals));

    [Fact]
    public void Hertz_are_printed_in_the_unit_of_the_catalogue()
    {
        var figure = new Figure { Quantity = QuantityCatalogue.ResonanceFrequency, Value = 1.61234e9, Uncertainty = SyntheticRun.Known(0.38e6) };
        Assert.Equal("1.61234\u00A0±\u00A00.00038\u202FGHz", FigureText.WithUnit(figure));
    }

    [Fact]
    public void Gain_of_a_circular_component_is_in_dBic_and_its_deviation_in_dB()
    {
        var gain = new Figure { Quantity = QuantityCatalogue.Gain, Component = FieldComponent.Right, Value = 7.8 };
        Assert.Equal("7.80\u202FdBic", FigureText.WithUnit(gain));
        Assert.Equal("\u22120.30\u202FdB", FigureText.WithUnit(gain with { Quantity = QuantityCatalogue.Deviation, Of = "gain", Value = -0.3 }));
    }

    [Fact]
    public void Degree_sign_follows_the_number_without_space() =>
        Assert.Equal("71.3°", FigureText.WithUnit(new Figure { Quantity = QuantityCatalogue.HalfPowerBeamwidth, Value = 71.3 }));

    [Fact]
    public void Interval_that_is_not_symmetric_is_printed_with_both_sides()
    {
        var figure = new Figure { Quantity = QuantityCatalogue.AxialRatio, Value = 1.904, Uncertainty = SyntheticRun.Known(0.4) with { Low = 1.55, High = 2.41 } };
        Assert.Equal("1.90\u00A0+0.51/\u22120.35", FigureText.Number(figure));
    }

    [Fact]
    public void Printing_does_not_follow_the_culture_of_the_machine()
    {
        var before = System.Globalization.CultureInfo.CurrentCulture;
        try
        {
            System.Globalization.CultureInfo.CurrentCulture = new System.Globalization.CultureInfo("de-DE");
            Assert.Equal("1.62\u202FGHz", FrequencyText.WithUnit(1.62e9));
        }
        finally
        {
            System.Globalization.CultureInfo.CurrentCulture = before;
        }
    }
}
