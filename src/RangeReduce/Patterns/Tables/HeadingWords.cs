namespace RangeReduce.Patterns.Tables;

/// <summary>The words that headings are made of.</summary>
internal static class HeadingWords
{
    private static readonly Dictionary<string, HeadingKind> Names = Map<HeadingKind>(
        (HeadingKind.Frequency, "f freq frequency frequencies frq frequenz frequence frecuencia"),
        (HeadingKind.Theta, "theta th"),
        (HeadingKind.Phi, "phi"),
        (HeadingKind.Azimuth, "az azi azim azimuth"),
        (HeadingKind.Elevation, "el ele elev elevation"),
        (HeadingKind.Roll, "roll"),
        (HeadingKind.Angle, "angle ang position pos rotation rotator turntable positioner"),
        (HeadingKind.Spin, "spin spinning"));

    private static readonly Dictionary<string, ChannelPart> Parts = Map<ChannelPart>(
        (ChannelPart.Amplitude, "mag magnitude amp ampl amplitude abs lin linear"),
        (ChannelPart.Phase, "phase phs arg ang angle"),
        (ChannelPart.Real, "re real"),
        (ChannelPart.Imaginary, "im imag imaginary"));

    private static readonly Dictionary<string, string> Channels = Map<string>(
        ("theta", "theta etheta eth thetapol"),
        ("phi", "phi ephi eph phipol"),
        ("right", "right rhcp rcp rhc rh er eright righthand righthandcircular righthandcircularpolarization ercp erhcp"),
        ("left", "left lhcp lcp lhc lh eleft lefthand lefthandcircular lefthandcircularpolarization elcp elhcp"),
        ("h", "h hor horiz horizontal hpol eh ehor"),
        ("v", "v ver vert vertical vpol ev ever"));

    private static readonly Dictionary<string, ChannelPart> Reflections = Map<ChannelPart>(
        (ChannelPart.ReturnLoss, "returnloss rl"),
        (ChannelPart.StandingWaveRatio, "vswr swr standingwaveratio"),
        (ChannelPart.None, "gamma reflection reflectioncoefficient reflectioncoeff reflectionfactor"));

    private static readonly HashSet<string> Noise = Set(
        "e field component comp pol polarization polarisation probe port channel ch signal response gain realized realised rx receive receiver received "
        + "far farfield value data measured of part level power in the axis cut coordinate actual encoder log");

    private static readonly HashSet<string> SpareNames = Set(
        "time date timestamp clock elapsed temp temperature humidity pressure index idx no nr number sample point row record count comment comments remark remarks note notes "
        + "operator status flag battery axialratio ar tilt tiltangle xpd crosspolarratio crosspolarizationratio");

    /// <summary>Finds what a single word names on its own: the frequency or an angle.</summary>
    public static HeadingKind Named(string word) => Names.GetValueOrDefault(word);

    /// <summary>Finds the part of a channel that a word stands for.</summary>
    public static ChannelPart PartOf(string word) => Parts.GetValueOrDefault(word);

    /// <summary>Finds what kind of reflection the joined words name; null where they name none.</summary>
    public static ChannelPart? ReflectionOf(string joined) => Reflections.TryGetValue(joined, out var part) ? part : null;

    /// <summary>Gives whether the joined words name something that no figure needs.</summary>
    public static bool IsSpare(string joined) => SpareNames.Contains(joined);

    /// <summary>Gives whether this is the canonical name of a channel.</summary>
    public static bool IsChannel(string name) => Channels.TryGetValue(name, out var canonical) && string.Equals(name, canonical, StringComparison.Ordinal);

    /// <summary>Gives whether a word says nothing about which channel is meant.</summary>
    public static bool IsNoise(string word) => Noise.Contains(word);

    /// <summary>Gives whether a word is a scattering parameter, such as <c>s21</c>.</summary>
    public static bool IsScattering(string word) => word is ['s', >= '1' and <= '9', >= '1' and <= '9'];

    /// <summary>Gives the canonical name of the channel that these words name; as written, joined by underscores, where the meaning is not plain.</summary>
    public static string ChannelName(IReadOnlyList<string> words)
    {
        var all = Channels.GetValueOrDefault(string.Concat(words));
        if (all is not null)
        {
            return all;
        }

        var telling = words.Where(word => !IsNoise(word)).ToArray();
        if (telling.Length > 1)
        {
            telling = telling.Where(word => !IsScattering(word)).DefaultIfEmpty(telling[0]).ToArray();
        }

        // A number alone names nothing: "probe 1" keeps its noun.
        if (telling.Length == 0 || telling.All(word => word.All(char.IsAsciiDigit)))
        {
            telling = [.. words];
        }

        return Channels.GetValueOrDefault(string.Concat(telling)) ?? string.Join('_', telling);
    }

    private static Dictionary<string, T> Map<T>(params (T Meaning, string Words)[] entries)
    {
        var map = new Dictionary<string, T>(StringComparer.Ordinal);
        foreach (var (meaning, words) in entries)
        {
            foreach (var word in words.Split(' '))
            {
                map.Add(word, meaning);
            }
        }

        return map;
    }

    private static HashSet<string> Set(string words) => new(words.Split(' '), StringComparer.Ordinal);
}
