using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Pdf;

namespace RangeReduce.Reporting.Tests;

public sealed class TextWrapperTests
{
    private const float Size = 8f;

    [Theory]
    [InlineData(60f)]
    [InlineData(133f)]
    [InlineData(400f)]
    public void Wrapped_text_keeps_every_letter_and_no_line_is_wider_than_the_column(float width)
    {
        var text = RichText.FromString("Levels of all cuts were turned into gain by comparison with the standard horn (").Then(RichText.Strong("gain-standard")).Then("); ").Then(RichText.Code("right/cut_phi000_with_a_long_name.csv"));
        var lines = TextWrapper.Wrap(text, Size, width);
        Assert.Equal(text.Plain, string.Concat(lines.SelectMany(line => line.Words).Select(word => word.Text)));
        Assert.All(lines, line => Assert.True(line.Words[^1].X + TextMeter.Width(line.Words[^1].Text.TrimEnd(), TextWrapper.FaceOf(line.Words[^1].Span), TextWrapper.SizeOf(line.Words[^1].Span, Size)) <= width + 0.1f));
    }

    [Fact]
    public void Value_and_its_uncertainty_are_never_parted()
    {
        var lines = TextWrapper.Wrap("axial ratio 1.94\u00A0±\u00A00.38\u202FdB", Size, 70f);
        Assert.Contains(lines, line => line.Words[0].Text.StartsWith("1.94\u00A0±\u00A00.38\u202FdB", StringComparison.Ordinal));
    }
}
