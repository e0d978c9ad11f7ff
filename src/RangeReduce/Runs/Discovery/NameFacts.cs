using System.Globalization;
using System.Text.RegularExpressions;

namespace RangeReduce.Runs.Discovery;

/// <summary>What the path of a file says about it.</summary>
internal sealed partial record NameFacts
{
    private static readonly Dictionary<string, string> ChannelWords = new(StringComparer.OrdinalIgnoreCase)
    {
        ["h"] = "h",
        ["hpol"] = "h",
        ["horizontal"] = "h",
        ["v"] = "v",
        ["vpol"] = "v",
        ["vertical"] = "v",
        ["theta"] = "theta",
        ["phi"] = "phi",
        ["rhcp"] = "right",
        ["lhcp"] = "left",
        ["right"] = "right",
        ["left"] = "left",
    };

    /// <summary>Gets whether a word of the path tells of a simulation.</summary>
    public bool IsSimulated { get; private init; }

    /// <summary>Gets whether a word of the path tells of the gain standard.</summary>
    public bool IsGainStandard { get; private init; }

    /// <summary>Gets the state by the innermost folder that names one; null where none does.</summary>
    public string? FolderState { get; private init; }

    /// <summary>Gets the words of the file name that may name a state, joined by hyphens; null where there are none.</summary>
    public string? NameState { get; private init; }

    /// <summary>Gets the channel that the last word of the file name gives, in lower case; null where it gives none.</summary>
    public string? Channel { get; private init; }

    /// <summary>Gets the fixed angle of the cut in degrees that the file name gives, such as 45 for phi45.</summary>
    public double? FixedDeg { get; private init; }

    /// <summary>Gets the frequency in hertz that the file name gives, such as 1.62e9 for 1620MHz.</summary>
    public double? FrequencyHz { get; private init; }

    /// <summary>Takes the facts out of a path.</summary>
    /// <param name="path">Path relative to the measurement folder, with forward slashes.</param>
    public static NameFacts Of(string path)
    {
        var parts = path.Split('/');
        var stem = Path.GetFileNameWithoutExtension(parts[^1]);
        var folders = parts[..^1];
        var words = folders.Append(stem).SelectMany(NameWords.Of).ToArray();
        var folderState = folders.Where(folder => Naming(folder).Length > 0).LastOrDefault();
        var naming = Naming(stem);
        return new()
        {
            IsSimulated = words.Any(NameWords.IsSimulated),
            IsGainStandard = words.Any(NameWords.IsGainStandard) || (folderState is null && naming.Length == 0 && words.Any(NameWords.IsReference)),
            FolderState = folderState is null ? null : string.Join('-', Naming(folderState)),
            NameState = naming.Length == 0 ? null : string.Join('-', naming),
            Channel = NameWords.Of(stem) is [.., var last] ? ChannelWords.GetValueOrDefault(last) : null,
            FixedDeg = NumberIn(FixedAngle().Match(stem)),
            FrequencyHz = NumberIn(Frequency().Match(stem)) * FactorOf(Frequency().Match(stem).Groups["unit"].Value),
        };
    }

    private static string[] Naming(string name) => [.. NameWords.Of(name).Where(word => !NameWords.IsSimulated(word) && !NameWords.IsGainStandard(word) && !NameWords.IsReference(word) && !NameWords.IsPlain(word))];

    private static double? NumberIn(Match match) => match.Success ? double.Parse(match.Groups["number"].ValueSpan, NumberStyles.Float, CultureInfo.InvariantCulture) : null;

    private static double FactorOf(string unit) => unit.ToUpperInvariant() switch
    {
        "KHZ" => 1e3,
        "MHZ" => 1e6,
        "GHZ" => 1e9,
        _ => 1.0,
    };

    // "phi-45" is left alone: a hyphen there may be a sign or a mere joint.
    [GeneratedRegex("(?<![a-z])(phi|az|azimuth)([_= ]?(?<number>[0-9]+(\\.[0-9]+)?)|[_=](?<number>-[0-9]+(\\.[0-9]+)?))(?![0-9.]*[a-z])", RegexOptions.CultureInvariant | RegexOptions.IgnoreCase | RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex FixedAngle();

    [GeneratedRegex("(?<![0-9.a-z])(?<number>[0-9]+(\\.[0-9]+)?)_?(?<unit>[kmg]?hz)(?![a-z])", RegexOptions.CultureInvariant | RegexOptions.IgnoreCase | RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Frequency();
}
