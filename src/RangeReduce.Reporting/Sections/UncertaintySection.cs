using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 7: what the uncertainties are made of, and what was not stated.</summary>
internal static class UncertaintySection
{
    /// <summary>Makes the section.</summary>
    public static ReportSection Build(ReportContext context)
    {
        var blocks = new List<ReportBlock>();
        var terms = context.Run.UncertaintyTerms;
        if (terms.Count == 0)
        {
            blocks.Add(new ParagraphBlock("The manifest states no terms of an uncertainty budget. The figures stand without uncertainty, and no statement about their errors is made."));
        }
        else
        {
            blocks.Add(new TableBlock(
                "Terms that the manifest states.",
                [new("Term"), new("Value", ColumnAlignment.DecimalPoint), new("Unit")],
                [.. terms.Select(term => new TableRow([term.Name, NumberText.Trimmed(term.Value, 6), string.Equals(term.Unit, "deg", StringComparison.Ordinal) ? "°" : term.Unit]))]));
        }

        var shown = Shown(context);
        if (shown.Count > 0)
        {
            blocks.Add(Budget(shown));
        }

        if (Absent(context) is { } absent)
        {
            blocks.Add(new ParagraphBlock(absent));
        }

        blocks.Add(new ParagraphBlock("Uncertainties follow the Guide to the Expression of Uncertainty in Measurement (JCGM 100): the expanded uncertainty is the coverage factor times the combined standard uncertainty, and is printed to two significant digits with the value to match. A partial budget holds some of the terms that matter, and is therefore a lower bound."));
        return new("uncertainty", "Uncertainty", blocks);
    }

    // The measured figures of the first page: at the deepest resonance, and on the axis at the frequency at which the pattern is shown.
    private static List<Figure> Shown(ReportContext context) =>
        [.. context.Reduced.Table.Figures.Where(figure => figure.Source == DataSource.Measured && figure.OtherState is null && figure.State is not null && double.IsFinite(figure.Uncertainty.Expanded)
            && (figure.At == FigurePlace.Resonance || figure.Quantity == QuantityCatalogue.ResonanceFrequency ? (figure.Rank ?? 1) == 1
                : figure.At is FigurePlace.Axis or FigurePlace.Peak && context.FrequencyOf(figure.State).CutHz is { } cut && ReportContext.Same(figure.FrequencyHz, cut)))
            .GroupBy(figure => (figure.Quantity.Id, figure.State, figure.At, figure.Component)).Select(group => group.MinBy(figure => figure.PhiDeg ?? 0.0)!)
            .OrderBy(figure => context.Styles.IndexOf(figure.State)).Take(48)];

    private static TableBlock Budget(List<Figure> figures) => new(
        "Uncertainty of the figures of the first page, term by term.",
        [new("State"), new("Figure"), new("Value", ColumnAlignment.DecimalPoint), new("Unit"), new("k", ColumnAlignment.DecimalPoint), new("Budget"), new("Contributions, as standard uncertainties")],
        [.. figures.Select((figure, at) => new TableRow(
        [
            figure.State!,
            Glossary.Label(figure),
            FigureText.Number(figure),
            FigureText.Unit(figure),
            double.IsFinite(figure.Uncertainty.Coverage) ? NumberText.Trimmed(figure.Uncertainty.Coverage, 2) : NumberText.Missing,
            figure.Uncertainty.Budget switch { BudgetState.Full => "full", BudgetState.Partial => "partial", _ => "absent" },
            Shares(figure),
        ])
        {
            StartsGroup = at > 0 && !string.Equals(figures[at - 1].State, figure.State, StringComparison.Ordinal),
        })]);

    private static string Shares(Figure figure)
    {
        var factor = FigureText.PrintedAs(figure).PrintFactor;
        return string.Join("; ", figure.Uncertainty.Shares.Select(share =>
        {
            var size = Math.Abs(share.Contribution * factor);
            return $"{share.Term}{UnitText.NoBreakSpace}{(size > 0.0 && double.IsFinite(size) ? UncertaintyRounding.Print(size, size).Value : NumberText.Fixed(size, 0))}";
        }));
    }

    private static string? Absent(ReportContext context)
    {
        var measured = context.Reduced.Table.Figures.Where(figure => figure.Source == DataSource.Measured && double.IsFinite(figure.Value)).GroupBy(figure => figure.Quantity)
            .Where(group => group.All(figure => !double.IsFinite(figure.Uncertainty.Expanded))).Select(group => group.Key).ToList();
        return measured.Count == 0 ? null
            : $"No term was stated that bears on {Words.List([.. QuantityCatalogue.All.Where(measured.Contains).Select(quantity => quantity.Name)])}: these figures stand without uncertainty.";
    }
}
