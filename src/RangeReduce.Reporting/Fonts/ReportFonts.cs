using SkiaSharp;

namespace RangeReduce.Reporting.Fonts;

/// <summary>The typefaces inside this assembly; nothing here asks the machine for a font.</summary>
internal static class ReportFonts
{
    /// <summary>The regular face.</summary>
    public static readonly SKTypeface Regular = Load("Fonts/DejaVuSans.ttf");

    /// <summary>The bold face.</summary>
    public static readonly SKTypeface Bold = Load("Fonts/DejaVuSans-Bold.ttf");

    /// <summary>The face of equal widths, for checksums and paths.</summary>
    public static readonly SKTypeface Mono = Load("Fonts/DejaVuSansMono.ttf");

    private static SKTypeface Load(string name)
    {
        using var data = SKData.CreateCopy(ReportingAssembly.ReadFile(name));
        return SKTypeface.FromData(data) ?? throw new InvalidOperationException($"{name} is no typeface.");
    }
}
