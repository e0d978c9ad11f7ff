using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>The uncertainty budget of a state: a row a term, a column a figure, each cell what the term alone brings.</summary>
internal static class BudgetTable
{
    /// <summary>Makes the table; null where no figure of the state has a budget.</summary>
    public static TableBlock? Of(ReportContext context, string state)
    {
        var figures = Figures(context, state).ToArray();
        if (figures.Length == 0)
        {
            return null;
        }

        var terms = figures.SelectMany(figure => figure.Uncertainty.Shares).Select(share => share.Term).Distinct(StringComparer.Ordinal)
            .OrderBy(term => context.Run.UncertaintyTerms.Select((known, at) => (known.Name, at)).FirstOrDefault(known => string.Equals(known.Name, term, StringComparison.Ordinal)).at)
            .ToArray();
        var rows = terms.Select(term => new TableRow([term, .. figures.Select(figure => RichText.FromString(Share(figure, term)))])).ToList();
        rows.Add(new(["Combined standard uncertainty", .. figures.Select(figure => RichText.FromString(Size(figure, figure.Uncertainty.Standard ?? double.NaN)))]) { StartsGroup = true });
        rows.Add(new(["Expanded uncertainty, 95 %", .. figures.Select(figure => RichText.FromString(Expanded(figure)))]));
        rows.Add(new(["Budget", .. figures.Select(figure => RichText.FromString(figure.Uncertainty.Budget switch { BudgetState.Full => "full", BudgetState.Partial => "partial", _ => "absent" }))]));
        return new(
            $"State {state}: what each term alone brings to the figures of the first page, as standard uncertainty.",
            [new("Term"), .. figures.Select(figure => new TableColumn($"{Glossary.Label(figure)} ({FigureText.Unit(figure)})", ColumnAlignment.DecimalPoint))],
            rows);
    }

    private static IEnumerable<Figure> Figures(ReportContext context, string state)
    {
        var co = context.CoCross(state)?.Co ?? FieldComponent.Total;
        var level = context.LevelQuantity(state);
        Figure?[] found =
        [
            context.Find(QuantityCatalogue.ReturnLoss, state, figure => figure.At == FigurePlace.Resonance && (figure.Rank ?? 1) == 1),
            context.FindAtCut(level, state, figure => figure.At == FigurePlace.Axis && figure.Component == co),
            context.FindAtCut(QuantityCatalogue.AxialRatio, state, figure => figure.At == FigurePlace.Axis),
            context.FindAtCut(QuantityCatalogue.CrossPolarRatio, state, figure => figure.At == FigurePlace.Axis),
            context.FindAtCut(QuantityCatalogue.HalfPowerBeamwidth, state, figure => figure.Component == FieldComponent.None),
            context.FindAtCut(QuantityCatalogue.FrontToBackRatio, state, _ => true),
        ];
        return found.OfType<Figure>().Where(figure => figure.Source == DataSource.Measured && figure.Uncertainty.Shares.Count > 0);
    }

    private static string Share(Figure figure, string term) =>
        figure.Uncertainty.Shares.FirstOrDefault(share => string.Equals(share.Term, term, StringComparison.Ordinal)) is { } share ? Size(figure, share.Contribution) : NumberText.Missing;

    private static string Expanded(Figure figure) => double.IsFinite(figure.Uncertainty.Expanded) ? Size(figure, figure.Uncertainty.Expanded) : "one-sided";

    private static string Size(Figure figure, double value)
    {
        var size = Math.Abs(value * FigureText.PrintedAs(figure).PrintFactor);
        return size > 0.0 && double.IsFinite(size) ? UncertaintyRounding.Print(size, size).Value : NumberText.Missing;
    }
}
