using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 6: measured against simulated.</summary>
internal static class SimulationSection
{
    private const int MostRows = 60;

    /// <summary>Makes the section; null where nothing was compared.</summary>
    public static ReportSection? Build(ReportContext context, FileNames names)
    {
        var table = context.Reduced.Table;
        var deviations = table.Of(QuantityCatalogue.Deviation).Where(figure => figure.OtherState is null).ToList();
        var agreements = table.Of(QuantityCatalogue.CurveAgreement).Where(figure => figure.OtherState is null).ToList();
        var scales = table.Of(QuantityCatalogue.FrequencyScale).Where(figure => figure.OtherState is null).ToList();
        if (deviations.Count + agreements.Count + scales.Count == 0)
        {
            return null;
        }

        var blocks = new List<ReportBlock>();
        if (deviations.Count > 0)
        {
            AddDeviations(blocks, context, deviations);
        }

        blocks.AddRange(context.States.Select(state => OverlayPlots.Row(context, state, names.Of(state))).OfType<PlotRowBlock>());
        if (scales.Count > 0)
        {
            blocks.Add(ScaleTable(scales));
        }

        if (agreements.Count > 0)
        {
            blocks.Add(AgreementTable(agreements));
        }

        return new("simulated", "Measured against simulated", blocks);
    }

    // Figures of the resonance, and those of the pattern at the frequency at which it is shown; the table of figures holds the rest.
    private static void AddDeviations(List<ReportBlock> blocks, ReportContext context, List<Figure> deviations)
    {
        var chosen = deviations.Where(figure => IsShown(context, figure))
            .GroupBy(figure => (figure.Of, figure.State, figure.At, figure.Component)).Select(group => group.MinBy(figure => figure.PhiDeg ?? figure.ThetaDeg ?? double.NegativeInfinity)!)
            .OrderBy(figure => context.Styles.IndexOf(figure.State)).ToList();
        var quiet = chosen.Count(IsQuiet);
        var known = chosen.Count(figure => double.IsFinite(figure.Uncertainty.Expanded));
        var summary = known == 0
            ? "No uncertainty is stated for the deviations, so none can be called significant."
            : $"Of {NumberText.Fixed(known, 0)} deviations with a stated uncertainty {NumberText.Fixed(quiet, 0)} lie within it; those are printed quiet.";
        var rest = deviations.Count > chosen.Count ? $" The table shows {NumberText.Fixed(chosen.Count, 0)} of {NumberText.Fixed(deviations.Count, 0)} deviations: those at the deepest resonance, on the axis and along the first cut at the frequency at which the pattern is shown; figures.csv has all." : string.Empty;
        blocks.Add(new ParagraphBlock(summary + rest) { KeepWithNext = true });
        var cells = new FigureCell();
        var rows = new List<TableRow>();
        foreach (var figure in chosen)
        {
            var cell = cells.OfKnownSource(figure);
            rows.Add(new(
            [
                figure.State!,
                Glossary.Label(figure),
                Place(figure),
                Counterpart(context, figure, DataSource.Measured),
                Counterpart(context, figure, DataSource.Simulated),
                IsQuiet(figure) ? RichText.Quiet(cell.Plain) : cell,
                FigureText.Unit(figure),
            ])
            {
                StartsGroup = rows.Count > 0 && !string.Equals(rows[^1].Cells[0].Plain, figure.State, StringComparison.Ordinal),
            });
        }

        blocks.Add(new TableBlock(
            "Deviations, measured minus simulated.",
            [new("State"), new("Quantity"), new("Where"), new("Measured", ColumnAlignment.DecimalPoint), new("Simulated", ColumnAlignment.DecimalPoint), new(Glossary.Name(QuantityCatalogue.Deviation), ColumnAlignment.DecimalPoint), new("Unit")],
            rows)
        {
            Notes = cells.Notes,
            Sortable = true,
        });
    }

    private static bool IsShown(ReportContext context, Figure figure)
    {
        if (figure.State is not { } state || (figure.Rank ?? 1) > 1 || figure.Component is FieldComponent.Theta or FieldComponent.Phi || figure.Method is not null)
        {
            return false;
        }

        if (figure.At == FigurePlace.Resonance || figure.FrequencyHz is null)
        {
            return true;
        }

        // What is taken at the maximum of a cut repeats what is taken on the axis, but for the level itself.
        var repeats = figure.At == FigurePlace.Peak && figure.Of is not ("gain" or "level" or "peak-direction");
        return !repeats && CutKey.Of(context, state) is [var cut, ..] && ReportContext.Same(figure.FrequencyHz, cut.FrequencyHz)
            && (figure.PhiDeg is null || Nullable.Equals(figure.PhiDeg, cut.PhiDeg)) && (figure.ThetaDeg is null || Nullable.Equals(figure.ThetaDeg, cut.ThetaDeg));
    }

    private static bool IsQuiet(Figure figure) => double.IsFinite(figure.Uncertainty.Expanded) && Math.Abs(figure.Value) < figure.Uncertainty.Expanded;

    private static string Place(Figure figure)
    {
        var parts = new List<string>();
        if (figure.FrequencyHz is { } frequency && figure.At != FigurePlace.Resonance)
        {
            parts.Add(FrequencyText.WithUnit(frequency));
        }

        if (Words.Cut(figure.PhiDeg, figure.ThetaDeg) is { Length: > 0 } cut)
        {
            parts.Add(cut);
        }

        return string.Join(", ", parts);
    }

    private static string Counterpart(ReportContext context, Figure deviation, DataSource source)
    {
        if (deviation.Of is not { } of || !QuantityCatalogue.TryGet(of, out var quantity))
        {
            return string.Empty;
        }

        var twin = context.Figures(quantity, deviation.State).FirstOrDefault(figure => figure.Source == source && figure.At == deviation.At && figure.Component == deviation.Component
            && Nullable.Equals(figure.Rank, deviation.Rank) && Nullable.Equals(figure.PhiDeg, deviation.PhiDeg) && Nullable.Equals(figure.ThetaDeg, deviation.ThetaDeg)
            && (deviation.At == FigurePlace.Resonance || deviation.FrequencyHz is null || figure.FrequencyHz is null || ReportContext.Same(figure.FrequencyHz, deviation.FrequencyHz.Value))
            && (deviation.Threshold is null || Nullable.Equals(figure.Threshold, deviation.Threshold)));
        return twin is null ? NumberText.Missing : twin.Hand is { } hand ? FigureText.HandWord(hand) : FigureText.Plain(twin.Value, quantity);
    }

    private static TableBlock ScaleTable(List<Figure> scales)
    {
        var cells = new FigureCell();
        return new(
            "Factor on the frequency axis that lays the simulated curve on the measured one; below 1 the measured antenna is tuned lower.",
            [new("State"), new("Of"), new(Glossary.Name(QuantityCatalogue.FrequencyScale), ColumnAlignment.DecimalPoint)],
            [.. scales.Select(figure => new TableRow([figure.State ?? string.Empty, OfName(figure), cells.OfKnownSource(figure)]))])
        {
            Notes = cells.Notes,
        };
    }

    private static TableBlock AgreementTable(List<Figure> agreements)
    {
        var cells = new FigureCell();
        return new(
            "Agreement of the curves (Feature Selective Validation, IEEE Std 1597.1); 0 is identity.",
            [new("State"), new("Curve"), new("Where"), new(Glossary.Named("Global difference", QuantityCatalogue.CurveAgreement), ColumnAlignment.DecimalPoint), new("Grade")],
            [.. agreements.Take(MostRows).Select(figure => new TableRow([figure.State ?? string.Empty, OfName(figure), Place(figure), cells.OfKnownSource(figure), figure.Grade ?? string.Empty]))])
        {
            Notes = cells.Notes,
            Sortable = true,
        };
    }

    private static RichText OfName(Figure figure)
    {
        if (figure.Of is not { } of || !QuantityCatalogue.TryGet(of, out var quantity))
        {
            return figure.Of ?? string.Empty;
        }

        var component = Words.Of(figure.Component);
        return Glossary.Name(quantity, component.Length == 0 ? string.Empty : ", " + component);
    }
}
