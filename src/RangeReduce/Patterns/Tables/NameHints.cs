using System.Globalization;
using System.Text.RegularExpressions;

namespace RangeReduce.Patterns.Tables;

/// <summary>Frequency, fixed angles and channel as the name of a file or a line of metadata gives them: <c>cut_1620MHz_phi045_rhcp.csv</c>.</summary>
internal static partial class NameHints
{
    /// <summary>Finds a frequency in hertz; NaN where there is none or more than one.</summary>
    public static double FrequencyHz(string text)
    {
        var found = FrequencyInName().Matches(text).Select(match => Number(match) * (HeadingUnit.TryParse(match.Groups["unit"].ValueSpan, out var unit) ? unit.Factor : double.NaN)).Distinct().ToArray();
        return found.Length == 1 ? found[0] : double.NaN;
    }

    /// <summary>Finds the angles that are named, in degrees.</summary>
    public static IEnumerable<(HeadingKind Kind, double Deg)> Angles(string text) =>
        AngleInName().Matches(text).Select(match => (HeadingWords.Named(match.Groups["name"].Value.ToLowerInvariant()), Number(match)));

    /// <summary>Finds the name of a channel among the parts of a file name; null where there is none or more than one.</summary>
    public static string? Channel(string fileName)
    {
        var found = Separators().Split(Path.GetFileNameWithoutExtension(fileName).ToLowerInvariant())
            .Where(part => part is "h" or "v" or "hpol" or "vpol" or "hor" or "ver" or "rhcp" or "lhcp" or "rcp" or "lcp" or "etheta" or "ephi" or "theta" or "phi")
            .Select(part => HeadingWords.ChannelName([part])).Distinct(StringComparer.Ordinal).ToArray();
        return found.Length == 1 ? found[0] : null;
    }

    private static double Number(Match match) =>
        double.TryParse(match.Groups["value"].Value.Replace('p', '.').Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture, out var value) ? value : double.NaN;

    [GeneratedRegex(@"(?<![\d.])(?<value>\d{1,9}(?:[.p,]\d{1,9})?)[ _]?(?<unit>[kMGT]?Hz)", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase, 1000)]
    private static partial Regex FrequencyInName();

    // A hyphen between name and number is left alone: "phi-45" may mean either sign.
    [GeneratedRegex(@"(?<![a-z])(?<name>phi|theta|az|el|azimuth|elevation|roll)(?:\s*[_= ]\s*(?<value>[+-]?\d{1,9}(?:[.p]\d{1,9})?)|(?<value>\d{1,9}(?:[.p]\d{1,9})?))", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase, 1000)]
    private static partial Regex AngleInName();

    [GeneratedRegex(@"[_\-. ]+", RegexOptions.None, 1000)]
    private static partial Regex Separators();
}
