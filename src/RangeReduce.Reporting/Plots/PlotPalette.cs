using OxyPlot;

namespace RangeReduce.Reporting.Plots;

/// <summary>The colours of plots. States take the colours of Okabe and Ito, which readers with any colour vision tell apart.</summary>
internal static class PlotPalette
{
    /// <summary>Text and axis titles.</summary>
    public static readonly OxyColor Ink = OxyColor.FromRgb(0x1F, 0x23, 0x28);

    /// <summary>Second curves and small labels.</summary>
    public static readonly OxyColor Quiet = OxyColor.FromRgb(0x5B, 0x62, 0x69);

    /// <summary>Frame and ticks.</summary>
    public static readonly OxyColor Frame = OxyColor.FromRgb(0x9A, 0xA1, 0xA8);

    /// <summary>Grid lines.</summary>
    public static readonly OxyColor Grid = OxyColor.FromRgb(0xE3, 0xE6, 0xE9);

    /// <summary>Ground.</summary>
    public static readonly OxyColor Paper = OxyColor.FromRgb(0xFF, 0xFF, 0xFF);

    /// <summary>Limits, such as the 3 dB line.</summary>
    public static readonly OxyColor Limit = OxyColor.FromRgb(0x8A, 0x15, 0x38);

    /// <summary>Colours of the states, in order (Okabe and Ito, Color Universal Design, 2008), the darker ones first.</summary>
    public static readonly IReadOnlyList<OxyColor> States =
    [
        OxyColor.FromRgb(0x00, 0x72, 0xB2),
        OxyColor.FromRgb(0xD5, 0x5E, 0x00),
        OxyColor.FromRgb(0x00, 0x9E, 0x73),
        OxyColor.FromRgb(0xCC, 0x79, 0xA7),
        OxyColor.FromRgb(0xE6, 0x9F, 0x00),
        OxyColor.FromRgb(0x56, 0xB4, 0xE9),
        OxyColor.FromRgb(0x40, 0x40, 0x40),
    ];

    /// <summary>Gives the role of a colour, for style sheets; null for a colour without role.</summary>
    public static string? RoleOf(OxyColor color)
    {
        for (var at = 0; at < States.Count; at++)
        {
            if (Same(color, States[at]))
            {
                return $"s{at}";
            }
        }

        return Same(color, Ink) ? "ink"
            : Same(color, Quiet) ? "quiet"
            : Same(color, Frame) ? "frame"
            : Same(color, Grid) ? "grid"
            : Same(color, Paper) ? "paper"
            : Same(color, Limit) ? "limit"
            : null;
    }

    private static bool Same(OxyColor one, OxyColor other) => one.R == other.R && one.G == other.G && one.B == other.B;
}
