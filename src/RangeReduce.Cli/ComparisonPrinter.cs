using System.Globalization;
using RangeReduce.Comparison;
using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Cli;

/// <summary>Prints runs side by side as one table.</summary>
internal static class ComparisonPrinter
{
    /// <summary>Prints the table.</summary>
    public static void Print(TextWriter output, IReadOnlyList<ComparedRun> runs, IReadOnlyList<ComparedFigure> rows)
    {
        for (var i = 0; i < runs.Count; i++)
        {
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{i + 1}  {runs[i].Name}{(runs[i].Date is { } date ? $", {date}" : string.Empty)}"));
        }

        output.WriteLine();
        var table = new PlainTable(["figure", "state", "at", .. Enumerable.Range(1, runs.Count).SelectMany(Heads), "unit"]);
        foreach (var row in rows)
        {
            table.Add(Cells(row));
        }

        table.Write(output);
        output.WriteLine();
        output.WriteLine("* larger than its expanded uncertainty. Uncertainties of both runs are added in squares; a gain standard that they share cancels, so they are upper bounds.");
    }

    private static string[] Heads(int number) => number == 1 ? ["1"] : [number.ToString(CultureInfo.InvariantCulture), string.Create(CultureInfo.InvariantCulture, $"{number} - 1")];

    private static string[] Cells(ComparedFigure row)
    {
        var some = row.Figures.OfType<Figure>().First();
        var cells = new List<string> { Name(some), row.Key.State is { } state && row.Key.OtherState is { } other ? $"{state} over {other}" : row.Key.State ?? "-", Place(row.Key) };
        for (var i = 0; i < row.Figures.Count; i++)
        {
            cells.Add(row.Figures[i] is { } figure ? FigureText.Number(figure) : "-");
            if (i > 0)
            {
                cells.Add(Difference(row, some, i));
            }
        }

        cells.Add(FigureText.Unit(some));
        return [.. cells];
    }

    private static string Name(Figure figure) => figure.Component.Word() is { } component ? $"{figure.Quantity.Name}, {component}" : figure.Quantity.Name;

    private static string Place(FigureKey key)
    {
        var parts = new List<string>();
        if (key.At.Word() is { } at)
        {
            parts.Add(at);
        }

        if (key.FrequencyHz is { } hertz)
        {
            parts.Add(string.Create(CultureInfo.InvariantCulture, $"{hertz / 1e9:0.####} GHz"));
        }

        if ((key.PhiDeg ?? key.ThetaDeg) is { } angle)
        {
            parts.Add(string.Create(CultureInfo.InvariantCulture, $"{(key.PhiDeg is null ? "theta" : "phi")} {angle:0.##}"));
        }

        return parts.Count == 0 ? "-" : string.Join(' ', parts);
    }

    private static string Difference(ComparedFigure row, Figure some, int run)
    {
        if (!double.IsFinite(row.Differences[run]))
        {
            var (first, other) = (row.Figures[0]?.Hand, row.Figures[run]?.Hand);
            return first is null || other is null ? "-" : first == other ? "same" : "turned *";
        }

        var difference = new Figure
        {
            Quantity = QuantityCatalogue.Deviation,
            Of = some.Quantity.Id,
            Value = row.Differences[run],
            Uncertainty = double.IsFinite(row.Expanded[run]) ? new(row.Expanded[run], 2.0, BudgetState.Partial) : Uncertainty.None,
        };
        return FigureText.Number(difference) + (row.IsSignificant(run) == true ? " *" : string.Empty);
    }
}
