using System.Collections.Concurrent;

using SkiaSharp;

namespace RangeReduce.Reporting.Fonts;

/// <summary>Measures text set in the report's typefaces, in points. Widths scale with the size, since nothing is hinted.</summary>
internal static class TextMeter
{
    private const float ReferenceSize = 100f;
    private const int MostRemembered = 20_000;

    private static readonly ConcurrentDictionary<(string Text, TextFace Face), float> Remembered = new();

    /// <summary>Height from the baseline to the top of a line over the size.</summary>
    public const float Ascent = 0.93f;

    /// <summary>Depth below the baseline over the size.</summary>
    public const float Descent = 0.24f;

    /// <summary>Gives the advance width in points.</summary>
    public static float Width(string text, TextFace face, float size)
    {
        if (text.Length == 0)
        {
            return 0f;
        }

        // Labels, heads and words come again and again, and asking the native library for each costs more than the look-up.
        if (!Remembered.TryGetValue((text, face), out var width))
        {
            using var font = Font(face, ReferenceSize);
            width = font.MeasureText(text);
            if (Remembered.Count < MostRemembered)
            {
                Remembered.TryAdd((text, face), width);
            }
        }

        return width * size / ReferenceSize;
    }

    /// <summary>Makes a font for drawing; the caller disposes it.</summary>
    public static SKFont Font(TextFace face, float size) => new(Typeface(face), size)
    {
        Subpixel = true,
        Hinting = SKFontHinting.None,
        LinearMetrics = true,
        Edging = SKFontEdging.Antialias,
    };

    private static SKTypeface Typeface(TextFace face) => face switch
    {
        TextFace.Bold => ReportFonts.Bold,
        TextFace.Mono => ReportFonts.Mono,
        _ => ReportFonts.Regular,
    };
}
