using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Sections;

/// <summary>Prints the edges of a band.</summary>
internal static class BandText
{
    /// <summary>Prints an edge without unit, to the digits of a label.</summary>
    public static string Edge(double frequencyHz)
    {
        var label = FrequencyText.Label(frequencyHz);
        return label[..label.IndexOf(UnitText.NarrowSpace, StringComparison.Ordinal)];
    }

    /// <summary>Prints both edges, such as "1.571 … 1.655"; an open end has an arrow.</summary>
    public static string Edges(Figure band) => band is { LowHz: { } low, HighHz: { } high }
        ? $"{(band.Open is "low" or "both" ? "← " : string.Empty)}{Edge(low)} … {Edge(high)}{(band.Open is "high" or "both" ? " →" : string.Empty)}"
        : NumberText.Missing;
}
