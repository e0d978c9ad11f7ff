using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Runs;
using RangeReduce.Uncertainties;

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
                "Terms that the manifest states, and how the trials draw from them.",
                [new("Term"), new("Value", ColumnAlignment.DecimalPoint), new("Unit"), new("Distribution"), new("Divisor")],
                [.. terms.Select(TermRow)]));
        }

        blocks.AddRange(context.States.Select(state => BudgetTable.Of(context, state)).OfType<TableBlock>());
        if (Absent(context) is { } absent)
        {
            blocks.Add(new ParagraphBlock(absent));
        }

        blocks.Add(new ParagraphBlock("Uncertainties follow the Guide to the Expression of Uncertainty in Measurement (JCGM 100) and its Supplement 1 (JCGM 101): the data are disturbed by draws from all terms at once and reduced again, and the interval holds 95\u00A0% of the results. Each term alone gives its share. Expanded uncertainties are printed to two significant digits with the value to match. A partial budget holds some of the terms that matter, and is therefore a lower bound."));
        return new("uncertainty", "Uncertainty", blocks);
    }

    private static TableRow TermRow(UncertaintyTerm term)
    {
        var (distribution, divisor) = term.Name switch
        {
            ErrorTerms.GainStandardKey => ("normal, expanded with k = 2", "2"),
            ErrorTerms.RepeatabilityKey => ("normal, standard deviation", "1"),
            ErrorTerms.MismatchKey => ("U-shaped, limits", "√2"),
            ErrorTerms.ReflectivityKey or ErrorTerms.CrossPolarKey or ErrorTerms.DirectivityKey => ("phasor of unknown phase", "√2"),
            ErrorTerms.NoiseFloorKey => ("complex normal", "√2"),
            _ => ("rectangular, limits", "√3"),
        };
        return new([term.Name, NumberText.Trimmed(term.Value, 6), string.Equals(term.Unit, "deg", StringComparison.Ordinal) ? "°" : term.Unit, distribution, divisor]);
    }

    private static string? Absent(ReportContext context)
    {
        var measured = context.Reduced.Table.Figures.Where(figure => figure.Source == DataSource.Measured && figure.OtherState is null && figure.Quantity != QuantityCatalogue.Deviation && double.IsFinite(figure.Value)).GroupBy(figure => figure.Quantity)
            .Where(group => group.All(figure => !double.IsFinite(figure.Uncertainty.Expanded))).Select(group => group.Key).ToList();
        return measured.Count == 0 ? null
            : $"No term was stated that bears on {Words.List([.. QuantityCatalogue.All.Where(measured.Contains).Select(quantity => quantity.Name)])}: these figures stand without uncertainty.";
    }
}
