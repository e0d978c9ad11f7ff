using System.Globalization;
using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes figures.csv: the table of figures, one row each, for a spreadsheet.</summary>
public static class FiguresCsvWriter
{
    private static readonly (string Heading, Func<Figure, string?> Cell)[] Columns =
    [
        ("id", figure => figure.Id),
        ("quantity", figure => figure.Quantity.Id),
        ("of", figure => figure.Of),
        ("value", figure => figure.Hand?.Word() ?? Number(figure.Value)),
        ("unit", figure => figure.Unit),
        ("expanded uncertainty", figure => Number(figure.Uncertainty.Expanded)),
        ("coverage factor", figure => Number(figure.Uncertainty.Coverage)),
        ("interval low", figure => Number(figure.Uncertainty.Low)),
        ("interval high", figure => Number(figure.Uncertainty.High)),
        ("budget", figure => figure.Uncertainty.Budget.ToString().ToLowerInvariant()),
        ("state", figure => figure.State),
        ("other state", figure => figure.OtherState),
        ("source", figure => figure.Source?.Word()),
        ("frequency (Hz)", figure => Number(figure.FrequencyHz)),
        ("low (Hz)", figure => Number(figure.LowHz)),
        ("high (Hz)", figure => Number(figure.HighHz)),
        ("phi (deg)", figure => Number(figure.PhiDeg)),
        ("theta (deg)", figure => Number(figure.ThetaDeg)),
        ("direction (deg)", figure => Number(figure.DirectionDeg)),
        ("at", figure => figure.At.Word()),
        ("component", figure => figure.Component.Word()),
        ("threshold", figure => Number(figure.Threshold)),
        ("rank", figure => figure.Rank?.ToString(CultureInfo.InvariantCulture)),
        ("open", figure => figure.Open),
        ("method", figure => figure.Method),
        ("grade", figure => figure.Grade),
        ("realized", figure => figure.Realized is { } realized ? (realized ? "yes" : "no") : null),
        ("back lobe", figure => figure.BackLobe is { } back ? (back ? "yes" : "no") : null),
        ("why", figure => figure.Why),
        ("inputs", figure => string.Join(' ', figure.Origin.Inputs)),
    ];

    /// <summary>Writes the figures in the order of the table.</summary>
    public static void Write(FigureTable table, Stream target)
    {
        ArgumentNullException.ThrowIfNull(table);
        using var writer = CsvText.Open(target);
        foreach (var (heading, _) in Columns)
        {
            writer.WriteField(heading);
        }

        writer.EndRecord();
        foreach (var figure in table.Figures)
        {
            foreach (var (_, cell) in Columns)
            {
                writer.WriteField(cell(figure));
            }

            writer.EndRecord();
        }
    }

    private static string? Number(double? value) => value is { } number && double.IsFinite(number) ? number.ToString("R", CultureInfo.InvariantCulture) : null;
}
