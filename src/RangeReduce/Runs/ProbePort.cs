namespace RangeReduce.Runs;

/// <summary>The text of a probe port in the manifest: a channel name, with a leading minus where the sign is to be turned.</summary>
internal static class ProbePort
{
    /// <summary>Gives the name of the channel without sign.</summary>
    public static string NameOf(string port) => port.Trim().TrimStart('-', '+', '\u2212').Trim();

    /// <summary>Says whether the sign is to be turned.</summary>
    public static bool IsTurned(string port) => port.Trim() is ['-' or '\u2212', ..];
}
