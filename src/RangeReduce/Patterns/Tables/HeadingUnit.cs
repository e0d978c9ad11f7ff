namespace RangeReduce.Patterns.Tables;

/// <summary>A unit as headings and preambles write it.</summary>
/// <param name="Kind">What it measures.</param>
/// <param name="Factor">Factor to the base unit of its kind.</param>
/// <param name="Text">The unit in its usual spelling.</param>
internal readonly record struct HeadingUnit(UnitKind Kind, double Factor, string Text)
{
    private static readonly Dictionary<string, HeadingUnit> Known = Make();

    /// <summary>Gets the unit of a plain ratio or of nothing.</summary>
    public static HeadingUnit None => new(UnitKind.None, 1.0, string.Empty);

    /// <summary>Gives whether levels in this unit are decibels.</summary>
    public bool IsDecibel => Kind is UnitKind.Decibel or UnitKind.DecibelIsotropic;

    /// <summary>Finds a unit; case and inner blanks do not matter, and words after the unit (<c>dB, relative</c>) are passed over.</summary>
    public static bool TryParse(ReadOnlySpan<char> text, out HeadingUnit unit)
    {
        var key = Normal(text);
        if (Known.TryGetValue(key, out unit))
        {
            return true;
        }

        var end = key.AsSpan().IndexOfAny(" ,;:");
        if (end > 0 && Known.TryGetValue(key[..end], out unit) && unit.Kind is not (UnitKind.Amplitude or UnitKind.Power))
        {
            return true;
        }

        unit = None;
        return false;
    }

    /// <summary>Finds a unit that cannot be mistaken for a name, so that it may stand in a heading without brackets: <c>RHCP dB</c>, but not <c>S21 V</c>.</summary>
    public static bool TryParseBare(ReadOnlySpan<char> text, out HeadingUnit unit) =>
        TryParse(text, out unit) && (unit.Kind is UnitKind.Frequency or UnitKind.Angle || unit.IsDecibel);

    private static string Normal(ReadOnlySpan<char> text) =>
        new string(text.Trim()).ToLowerInvariant().Replace('\u00B5', 'u').Replace('\u03BC', 'u').Replace("\u00B0", "deg", StringComparison.Ordinal);

    private static Dictionary<string, HeadingUnit> Make()
    {
        var known = new Dictionary<string, HeadingUnit>(StringComparer.Ordinal);
        Add(UnitKind.Frequency, 1.0, "Hz", "hz", "hertz");
        Add(UnitKind.Frequency, 1e3, "kHz", "khz", "kilohertz");
        Add(UnitKind.Frequency, 1e6, "MHz", "mhz", "megahertz");
        Add(UnitKind.Frequency, 1e9, "GHz", "ghz", "gigahertz");
        Add(UnitKind.Frequency, 1e12, "THz", "thz");
        Add(UnitKind.Angle, 1.0, "deg", "deg", "degs", "degree", "degrees", "deg.");
        Add(UnitKind.Angle, 180.0 / Math.PI, "rad", "rad", "rads", "radian", "radians");
        Add(UnitKind.Decibel, 1.0, "dB", "db", "db20", "decibel", "db rel", "dbrel", "dbr", "dbfs");
        Add(UnitKind.Decibel, 1.0, "dBm", "dbm");
        Add(UnitKind.Decibel, 1.0, "dBV", "dbv", "dbmv", "dbuv", "dbw", "dbuv/m");
        Add(UnitKind.DecibelIsotropic, 1.0, "dBi", "dbi", "dbic", "dbil", "dbli", "dbci");
        Add(UnitKind.Amplitude, 1.0, "linear", "lin", "linear", "1", "-", "a.u.", "au", "ratio");
        Add(UnitKind.Amplitude, 1.0, "V", "v", "volt", "volts", "v/m");
        Add(UnitKind.Amplitude, 1e-3, "mV", "mv", "mv/m");
        Add(UnitKind.Amplitude, 1e-6, "uV", "uv", "uv/m");
        Add(UnitKind.Power, 1.0, "W", "w", "watt");
        Add(UnitKind.Power, 1e-3, "mW", "mw");
        Add(UnitKind.Power, 1e-6, "uW", "uw");
        Add(UnitKind.Power, 1e-9, "nW", "nw");
        Add(UnitKind.Ohm, 1.0, "ohm", "ohm", "ohms", "\u03C9", "\u2126");
        return known;

        void Add(UnitKind kind, double factor, string text, params string[] spellings)
        {
            foreach (var spelling in spellings)
            {
                known[spelling] = new(kind, factor, text);
            }
        }
    }
}
