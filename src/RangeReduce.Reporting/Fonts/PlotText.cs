using OxyPlot;

namespace RangeReduce.Reporting.Fonts;

/// <summary>Measures and places the text of plots, the same for every kind of output.</summary>
internal static class PlotText
{
    private const double LineHeight = 1.2;

    /// <summary>Gives the face for an OxyPlot font weight.</summary>
    public static TextFace FaceOf(double fontWeight) => fontWeight >= 600 ? TextFace.Bold : TextFace.Regular;

    /// <summary>Gives width and height of a text that may have several lines.</summary>
    public static OxySize Measure(string? text, double fontSize, double fontWeight)
    {
        if (string.IsNullOrEmpty(text))
        {
            return OxySize.Empty;
        }

        var lines = text.Split('\n');
        return new OxySize(lines.Max(line => TextMeter.Width(line, FaceOf(fontWeight), (float)fontSize)), lines.Length * fontSize * LineHeight);
    }

    /// <summary>Gives each line with the offset of its baseline's left end from the anchor.</summary>
    public static IEnumerable<(string Line, double Dx, double Dy)> Lines(string text, double fontSize, double fontWeight, HorizontalAlignment horizontal, VerticalAlignment vertical)
    {
        var lines = text.Split('\n');
        var height = lines.Length * fontSize * LineHeight;
        var top = vertical switch
        {
            VerticalAlignment.Top => 0.0,
            VerticalAlignment.Middle => -0.5 * height,
            _ => -height,
        };

        for (var at = 0; at < lines.Length; at++)
        {
            var width = TextMeter.Width(lines[at], FaceOf(fontWeight), (float)fontSize);
            var dx = horizontal switch
            {
                HorizontalAlignment.Left => 0.0,
                HorizontalAlignment.Center => -0.5 * width,
                _ => -width,
            };
            yield return (lines[at], dx, top + (at * fontSize * LineHeight) + (fontSize * TextMeter.Ascent));
        }
    }
}
