using OxyPlot;

namespace RangeReduce.Reporting.Plots;

/// <summary>The colours of one picture. Those of the plot palette are kept to the bit; shades at soft edges are rounded to five bits a channel, which no eye sees.</summary>
internal sealed class PicturePalette
{
    private const int Most = 256;

    private readonly List<uint> _colors = [];
    private readonly Dictionary<uint, byte> _exact = [];
    private readonly short[] _rounded = new short[1 << 15];

    /// <summary>Starts with the colours that plots are made of.</summary>
    public PicturePalette()
    {
        Array.Fill(_rounded, (short)-1);
        foreach (var color in new[] { PlotPalette.Paper, PlotPalette.Ink, PlotPalette.Quiet, PlotPalette.Frame, PlotPalette.Grid, PlotPalette.Limit }.Concat(PlotPalette.States))
        {
            _exact[Pack(color)] = (byte)_colors.Count;
            _colors.Add(Pack(color));
        }
    }

    /// <summary>Gives the index of a colour and takes it in where there is room; else gives the nearest.</summary>
    /// <param name="pixel">Red in the lowest byte, then green, then blue; the highest byte is ignored.</param>
    public byte IndexOf(uint pixel)
    {
        var color = pixel & 0xFFFFFF;
        if (_exact.TryGetValue(color, out var exact))
        {
            return exact;
        }

        var (red, green, blue) = (color & 0xFF, (color >> 8) & 0xFF, color >> 16);
        var key = ((red >> 3) << 10) | ((green >> 3) << 5) | (blue >> 3);
        if (_rounded[key] < 0)
        {
            _rounded[key] = _colors.Count < Most ? (short)_colors.Count : Nearest(red, green, blue);
            if (_colors.Count < Most)
            {
                _colors.Add(color);
            }
        }

        return (byte)_rounded[key];
    }

    /// <summary>Gives the palette as red, green and blue bytes.</summary>
    public byte[] ToBytes()
    {
        var bytes = new byte[3 * _colors.Count];
        for (var at = 0; at < _colors.Count; at++)
        {
            (bytes[3 * at], bytes[(3 * at) + 1], bytes[(3 * at) + 2]) = ((byte)_colors[at], (byte)(_colors[at] >> 8), (byte)(_colors[at] >> 16));
        }

        return bytes;
    }

    private short Nearest(uint red, uint green, uint blue)
    {
        var (best, least) = (0, double.PositiveInfinity);
        for (var at = 0; at < _colors.Count; at++)
        {
            var away = Square(red, _colors[at]) + Square(green, _colors[at] >> 8) + Square(blue, _colors[at] >> 16);
            (best, least) = away < least ? (at, away) : (best, least);
        }

        return (short)best;
    }

    private static double Square(uint one, uint other) => Math.Pow((double)one - (other & 0xFF), 2.0);

    private static uint Pack(OxyColor color) => color.R | ((uint)color.G << 8) | ((uint)color.B << 16);
}
