using System.Text.RegularExpressions;

namespace RangeReduce.Runs.Discovery;

/// <summary>Words in the names of files and folders that say something about the content.</summary>
internal static partial class NameWords
{
    private static readonly HashSet<string> Simulated = new(StringComparer.OrdinalIgnoreCase)
    {
        "sim", "sims", "simulated", "simulation", "model", "modelled", "modeled", "nec", "nec2", "fem", "mom", "fdtd", "fit", "calc", "calculated", "computed", "predicted",
    };

    private static readonly HashSet<string> GainStandard = new(StringComparer.OrdinalIgnoreCase)
    {
        "horn", "standard", "std", "sgh", "gainstandard",
    };

    // A reference may also be an antenna under test, such as a helix of known hand: it tells only where nothing names a state.
    private static readonly HashSet<string> Reference = new(StringComparer.OrdinalIgnoreCase)
    {
        "ref", "reference",
    };

    private static readonly HashSet<string> Plain = new(StringComparer.OrdinalIgnoreCase)
    {
        "sweep", "sweeps", "reflection", "refl", "match", "returnloss", "return", "loss", "vswr", "impedance", "sparam", "sparameters", "touchstone",
        "cut", "cuts", "pattern", "patterns", "plane", "eplane", "hplane", "az", "azimuth", "el", "elevation", "deg", "angle", "freq", "frequency",
        "h", "v", "hpol", "vpol", "horizontal", "vertical", "theta", "phi", "eth", "eph", "etheta", "ephi", "co", "cross", "copol", "xpol", "pol", "dual", "linear", "circular", "channel", "port",
        "measured", "meas", "measurement", "measurements", "data", "raw", "file", "files", "gain", "level", "levels", "table", "list", "results", "export", "final", "repeat", "rep", "take", "run", "part", "of",
    };

    /// <summary>Gives the words of a name: runs of letters and digits.</summary>
    public static string[] Of(string name) => [.. Word().Matches(name).Select(match => match.Value)];

    /// <summary>Says whether a word tells of a simulation.</summary>
    public static bool IsSimulated(string word) => Simulated.Contains(word);

    /// <summary>Says whether a word tells of the gain standard.</summary>
    public static bool IsGainStandard(string word) => GainStandard.Contains(word);

    /// <summary>Says whether a word tells of the gain standard where no other word names a state.</summary>
    public static bool IsReference(string word) => Reference.Contains(word);

    /// <summary>Says whether a word tells of the kind of file, the channel, the angle or the number of a repeat, and so not of a state.</summary>
    public static bool IsPlain(string word) => Plain.Contains(word) || Measure().IsMatch(word);

    [GeneratedRegex("[\\p{L}\\p{Nd}]+", RegexOptions.CultureInvariant, 1000)]
    private static partial Regex Word();

    // Numbers, numbers with a unit, and words that count something: phi045, s11, s1p, run2, 1620MHz.
    [GeneratedRegex("^([0-9]+(k|m|g)?(hz|deg|p)?|s[0-9]{2}|s[0-9]+p|(phi|theta|az|el|cut|sweep|run|rep|repeat|take|part|port|ch|no|nr|v)[0-9]+)$", RegexOptions.CultureInvariant | RegexOptions.IgnoreCase | RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Measure();
}
