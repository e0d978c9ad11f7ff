using RangeReduce.Reporting.Formatting;
using RangeReduce.Runs;

namespace RangeReduce.Reporting.Sections;

/// <summary>Says by which conventions handedness was judged.</summary>
internal static class Conventions
{
    /// <summary>Gives the conventions in one sentence, with where each was taken from.</summary>
    public static string Sentence(MeasurementRun run)
    {
        var conventions = run.Conventions;
        return $"time factor {Time(conventions.Time)} ({conventions.TimeFrom}); theta component from channel {Channel(conventions.ThetaPort)}, phi component from channel {Channel(conventions.PhiPort)} ({conventions.PortsFrom}); "
            + $"hand by IEEE Std 145, looking along propagation; axis at {NumberText.Trimmed(run.AxisDeg, 2)}° along the cuts.";
    }

    /// <summary>Gives a time factor as a formula.</summary>
    public static string Time(TimeFactor time) => time == TimeFactor.PlusJ ? "exp(+jωt)" : "exp(−iωt)";

    /// <summary>Gives a channel; a turned sign is said in words.</summary>
    public static string Channel(string port) => port.StartsWith('-') ? $"{port[1..]} with its sign turned" : port;
}
