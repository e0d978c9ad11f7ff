using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>The figures of each cut of a state.</summary>
internal static class CutTable
{
    /// <summary>Makes the table; quantities without any figure have no column.</summary>
    public static TableBlock Make(ReportContext context, IReadOnlyList<CutKey> cuts, Quantity level)
    {
        var cells = new FigureCell();
        var columns = Columns(context, cuts, level).ToList();
        var rows = new List<TableRow>();
        foreach (var cut in cuts)
        {
            foreach (var source in new[] { DataSource.Measured, DataSource.Simulated })
            {
                var figures = columns.ConvertAll(column => Find(context, cut, source, column));
                if (figures.Exists(figure => figure is not null))
                {
                    rows.Add(new([cut.Text, Words.Of(source), .. figures.Select(cells.OfKnownSource)]) { StartsGroup = source == DataSource.Measured && rows.Count > 0 });
                }
            }
        }

        return new(
            $"Figures of each cut at {FrequencyText.WithUnit(cuts[0].FrequencyHz)}.",
            [new("Cut"), new("Source"), .. columns.Select(column => new TableColumn(Glossary.Named(column.Head, column.Quantity, column.Unit), ColumnAlignment.DecimalPoint))],
            rows)
        {
            Notes = cells.Notes,
        };
    }

    private static IEnumerable<Column> Columns(ReportContext context, IReadOnlyList<CutKey> cuts, Quantity level)
    {
        var state = cuts[0].State;
        var pair = context.CoCross(state);
        var wanted = new List<Column>
        {
            new(level, $"{Words.Capital(level.Name)} at the maximum", FigurePlace.Peak, Peak(context, cuts, level, pair?.Co)),
            new(QuantityCatalogue.PeakDirection, "Direction of the maximum", null, null),
            new(QuantityCatalogue.HalfPowerBeamwidth, "Half-power beamwidth", null, null),
            new(QuantityCatalogue.SidelobeLevel, "Sidelobe level", null, null),
            new(QuantityCatalogue.FrontToBackRatio, "Front-to-back ratio", null, null),
            new(QuantityCatalogue.AxialRatio, "Axial ratio on axis", FigurePlace.Axis, null),
            new(QuantityCatalogue.CrossPolarRatio, "Cross-polar ratio on axis", FigurePlace.Axis, null),
            new(QuantityCatalogue.AxialRatioBeamwidth, "Axial-ratio beamwidth", null, null),
        };
        return wanted
            .Where(column => cuts.Any(cut => Find(context, cut, DataSource.Measured, column) is not null || Find(context, cut, DataSource.Simulated, column) is not null))
            .Select(column => column with { Unit = UnitText.Of(column.Quantity, column.Component ?? FieldComponent.None) is { Length: > 0 } unit ? $" ({unit})" : string.Empty });
    }

    // The co-polar maximum where the table has it, else that of the total.
    private static FieldComponent Peak(ReportContext context, IReadOnlyList<CutKey> cuts, Quantity level, FieldComponent? co) =>
        co is { } component && context.Figures(level, cuts[0].State).Any(figure => figure.At == FigurePlace.Peak && figure.Component == component) ? component : FieldComponent.Total;

    private static Figure? Find(ReportContext context, CutKey cut, DataSource source, Column column) => context.Figures(column.Quantity, cut.State)
        .FirstOrDefault(figure => figure.Source == source && cut.Holds(figure) && (column.At is null || figure.At == column.At) && (column.Component is null || figure.Component == column.Component));

    private sealed record Column(Quantity Quantity, string Head, FigurePlace? At, FieldComponent? Component)
    {
        public string Unit { get; init; } = string.Empty;
    }
}
