using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Formatting;

/// <summary>Sets units behind numbers.</summary>
public static class UnitText
{
    /// <summary>A narrow space at which no line breaks; it stands between number and unit.</summary>
    public const char NarrowSpace = '\u202F';

    /// <summary>A space at which no line breaks; it stands about a sign.</summary>
    public const char NoBreakSpace = '\u00A0';

    /// <summary>Gives the printed unit of a quantity; empty for a pure number.</summary>
    /// <param name="quantity">The quantity.</param>
    /// <param name="component">The field component; a circular one turns dBi into dBic.</param>
    public static string Of(Quantity quantity, FieldComponent component = FieldComponent.None)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        return quantity.PrintUnit switch
        {
            "1" => string.Empty,
            "dBi" when component is FieldComponent.Right or FieldComponent.Left => "dBic",
            "ohm" => "Ω",
            "deg" => "°",
            var unit => unit,
        };
    }

    /// <summary>Puts a unit behind a number: a degree sign without space (ISO 80000-1), any other after a narrow one.</summary>
    public static string Join(string number, string unit) => unit switch
    {
        null or "" => number,
        "°" => number + unit,
        _ => number + NarrowSpace + unit,
    };
}
