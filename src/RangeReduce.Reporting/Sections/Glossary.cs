using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>Names of quantities that lead to their entry in the glossary.</summary>
internal static class Glossary
{
    /// <summary>Gives the anchor of a quantity's entry.</summary>
    public static string Anchor(Quantity quantity) => "glossary-" + quantity.Id;

    /// <summary>Gives a name with a capital letter that leads to the glossary, and what follows it.</summary>
    public static RichText Name(Quantity quantity, string rest = "") => Named(Words.Capital(quantity.Name), quantity, rest);

    /// <summary>Gives a text that leads to the glossary, and what follows it.</summary>
    public static RichText Named(string text, Quantity quantity, string rest = "")
    {
        var link = RichText.Link(text, Anchor(quantity));
        return rest.Length == 0 ? link : link.Then(rest);
    }

    /// <summary>Gives a heading: name and unit in brackets.</summary>
    public static RichText Head(Quantity quantity, string unit) => Name(quantity, unit.Length == 0 ? string.Empty : $" ({unit})");

    /// <summary>Gives the name of a figure with its component and place.</summary>
    public static RichText Label(Figure figure)
    {
        var quantity = FigureText.PrintedAs(figure);
        var parts = new[] { Words.Of(figure.Component), Words.Of(figure.At) }.Where(part => part.Length > 0).ToList();
        return Name(quantity, parts.Count == 0 ? string.Empty : ", " + string.Join(", ", parts));
    }

    /// <summary>Makes the table of the quantities that a run has figures or traces of.</summary>
    public static TableBlock Table(FigureTable table)
    {
        var used = table.Figures.Select(figure => figure.Quantity.Id).Concat(table.Traces.Select(trace => trace.Quantity.Id)).ToHashSet(StringComparer.Ordinal);
        return new(
            RichText.Empty,
            [new("Quantity"), new("Symbol"), new("Unit"), new("Definition"), new("Source")],
            [.. QuantityCatalogue.All.Where(quantity => used.Contains(quantity.Id)).Select(Row)]);
    }

    private static TableRow Row(Quantity quantity) => new(
    [
        RichText.Strong(Words.Capital(quantity.Name)),
        quantity.Symbol.Length > 0 ? quantity.Symbol.Replace("_", string.Empty, StringComparison.Ordinal) : "–",
        UnitText.Of(quantity) is { Length: > 0 } unit ? unit : "–",
        quantity.Definition,
        RichText.Quiet(quantity.Source),
    ])
    {
        Id = Anchor(quantity),
    };
}
