using System.Globalization;
using System.Text.RegularExpressions;
using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Manifest;

/// <summary>Reads texts such as <c>4.2 m</c> and <c>1.58 GHz .. 1.64 GHz</c>.</summary>
/// <remarks>Symbols are those of the SI brochure (9th edition) and of the trade; upper and lower case differ, since mm is not Mm.</remarks>
public static partial class UnitText
{
    /// <summary>Text between the two ends of a range.</summary>
    public const string RangeMark = "..";

    // The first symbol of each kind is its base unit.
    private static readonly (string Symbol, UnitDimension Dimension, double Factor)[] Units =
    [
        (string.Empty, UnitDimension.Number, 1.0),
        ("Hz", UnitDimension.Frequency, 1.0), ("kHz", UnitDimension.Frequency, 1e3), ("MHz", UnitDimension.Frequency, 1e6),
        ("GHz", UnitDimension.Frequency, 1e9), ("THz", UnitDimension.Frequency, 1e12),
        ("m", UnitDimension.Length, 1.0), ("cm", UnitDimension.Length, 1e-2), ("mm", UnitDimension.Length, 1e-3),
        ("um", UnitDimension.Length, 1e-6), ("µm", UnitDimension.Length, 1e-6), ("μm", UnitDimension.Length, 1e-6),
        ("km", UnitDimension.Length, 1e3), ("in", UnitDimension.Length, 0.0254), ("ft", UnitDimension.Length, 0.3048),
        ("deg", UnitDimension.Angle, 1.0), ("°", UnitDimension.Angle, 1.0), ("rad", UnitDimension.Angle, 180.0 / Math.PI), ("mrad", UnitDimension.Angle, 0.18 / Math.PI),
        ("s", UnitDimension.Time, 1.0), ("ms", UnitDimension.Time, 1e-3), ("us", UnitDimension.Time, 1e-6), ("µs", UnitDimension.Time, 1e-6),
        ("μs", UnitDimension.Time, 1e-6), ("ns", UnitDimension.Time, 1e-9), ("ps", UnitDimension.Time, 1e-12),
        ("ohm", UnitDimension.Resistance, 1.0), ("Ω", UnitDimension.Resistance, 1.0), ("Ω", UnitDimension.Resistance, 1.0), ("kohm", UnitDimension.Resistance, 1e3),
        ("K", UnitDimension.Temperature, 1.0),
        ("dB", UnitDimension.Ratio, 1.0), ("dBi", UnitDimension.Gain, 1.0), ("dBm", UnitDimension.Power, 1.0), ("%", UnitDimension.Percent, 1.0),
    ];

    /// <summary>Gives the symbol of the base unit of a kind of quantity; empty for a number.</summary>
    public static string BaseUnitOf(UnitDimension dimension) => Units.First(unit => unit.Dimension == dimension).Symbol;

    /// <summary>Gives the kind of quantity of a base unit; a number for <c>1</c>, the empty text and symbols that are not in the table.</summary>
    public static UnitDimension DimensionOf(string unit) => Array.Find(Units, known => string.Equals(known.Symbol, unit, StringComparison.Ordinal)).Dimension;

    /// <summary>Reads one number with its unit.</summary>
    /// <param name="text">The text, such as <c>-40 dB</c>.</param>
    /// <param name="place">Where it stands, for the error.</param>
    /// <param name="allowed">Kinds of quantity that make sense there; at least one.</param>
    /// <exception cref="MeasurementDataException">It is no number, or its unit is missing, unknown or of another kind.</exception>
    public static UnitValue Parse(string text, SourcePlace place, params UnitDimension[] allowed)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(allowed);
        var parts = NumberThenUnit().Match(text);
        if (!parts.Success || !double.TryParse(parts.Groups["number"].ValueSpan, NumberStyles.Float, CultureInfo.InvariantCulture, out var number) || !double.IsFinite(number))
        {
            var comma = DecimalComma().IsMatch(text);
            throw Wrong(text, place, allowed, comma ? "Write the decimal mark as a point." : $"Write a number and its unit, such as {ExampleOf(allowed[0])}.");
        }

        var symbol = parts.Groups["unit"].Value;
        var unit = Array.Find(Units, known => string.Equals(known.Symbol, symbol, StringComparison.Ordinal));
        if (unit.Symbol is null)
        {
            var all = SymbolsOf(allowed);
            throw Wrong(text, place, allowed, all.Length == 0 ? "Leave the unit away." : $"The unit \"{symbol}\" is not known here; the nearest that is: {NearestName.Of(symbol, all)}.");
        }

        if (!allowed.Contains(unit.Dimension))
        {
            throw Wrong(text, place, allowed, symbol.Length == 0 ? "Write the unit after the number." : $"{symbol} is a unit of another kind of quantity.");
        }

        return new(number * unit.Factor, unit.Dimension);
    }

    /// <summary>Reads a range of two numbers with two dots between them; where only the second has a unit, it holds for both.</summary>
    /// <param name="text">The text, such as <c>1.58 GHz .. 1.64 GHz</c>.</param>
    /// <param name="place">Where it stands, for the error.</param>
    /// <param name="allowed">Kinds of quantity that make sense there; at least one.</param>
    /// <exception cref="MeasurementDataException">It is no range, one end is wrong, or the ends are not rising.</exception>
    public static (double Low, double High) ParseRange(string text, SourcePlace place, params UnitDimension[] allowed)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(allowed);
        var mark = text.IndexOf(RangeMark, StringComparison.Ordinal);
        if (mark < 0)
        {
            throw new MeasurementDataException(place, "bad-range", FoundText.Show(text), "two numbers with \"..\" between them", $"Write it as {ExampleOf(allowed[0])} .. {ExampleOf(allowed[0])}.");
        }

        var (first, second) = (text[..mark].Trim(), text[(mark + RangeMark.Length)..].Trim());
        var high = Parse(second, place, allowed);
        var alone = NumberThenUnit().Match(first) is { Success: true } parts && parts.Groups["unit"].Length == 0;
        var low = Parse(alone ? first + NumberThenUnit().Match(second).Groups["unit"].Value : first, place, allowed);
        if (!(low.Value < high.Value) || low.Dimension != high.Dimension)
        {
            throw new MeasurementDataException(place, "bad-range", FoundText.Show(text), "a range that rises", "Write the lower end first.");
        }

        return (low.Value, high.Value);
    }

    /// <summary>Gives the units of the kinds in words, for messages.</summary>
    public static string Expected(params UnitDimension[] allowed)
    {
        ArgumentNullException.ThrowIfNull(allowed);
        var symbols = SymbolsOf(allowed);
        var number = allowed.Contains(UnitDimension.Number);
        return symbols.Length == 0 ? "a number without unit" : $"a number with a unit out of {string.Join(", ", symbols)}{(number ? ", or without unit" : string.Empty)}";
    }

    /// <summary>Gives a number in the base unit as text that <see cref="Parse"/> reads back exactly.</summary>
    public static string Write(double value, UnitDimension dimension) =>
        string.Create(CultureInfo.InvariantCulture, $"{value:R} {BaseUnitOf(dimension)}").TrimEnd();

    private static string[] SymbolsOf(UnitDimension[] allowed) =>
        [.. Units.Where(unit => unit.Symbol.Length > 0 && unit.Symbol.All(char.IsAscii) && allowed.Contains(unit.Dimension)).Select(unit => unit.Symbol)];

    private static string ExampleOf(UnitDimension dimension) => dimension switch
    {
        UnitDimension.Frequency => "1.6 GHz",
        UnitDimension.Length => "4.2 m",
        _ => Write(3.0, dimension),
    };

    private static MeasurementDataException Wrong(string text, SourcePlace place, UnitDimension[] allowed, string advice) =>
        new(place, "bad-unit", FoundText.Show(text), Expected(allowed), advice);

    // The exponent is taken only with digits after it, so that "3 E" does not hide a unit.
    [GeneratedRegex(@"^\s*(?<number>[+-]?([0-9]+(\.[0-9]*)?|\.[0-9]+)([eE][+-]?[0-9]+)?)\s*(?<unit>[^\s0-9.,+-]*)\s*$", RegexOptions.CultureInvariant | RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex NumberThenUnit();

    [GeneratedRegex("[0-9],[0-9]", RegexOptions.CultureInvariant, 1000)]
    private static partial Regex DecimalComma();
}
