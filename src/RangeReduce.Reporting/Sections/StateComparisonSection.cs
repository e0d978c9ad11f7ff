using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 5: the states against each other.</summary>
internal static class StateComparisonSection
{
    private static readonly FieldComponent[] Hands = [FieldComponent.Right, FieldComponent.Left];

    /// <summary>Makes the section; null where there are fewer than two states or nothing to compare.</summary>
    public static ReportSection? Build(ReportContext context)
    {
        var contrasts = Contrasts(context);
        var others = context.Reduced.Table.Figures.Where(figure => figure.OtherState is not null && figure.Quantity != QuantityCatalogue.SwitchingContrast && figure.Quantity != QuantityCatalogue.SwitchingReduction).ToList();
        if (context.States.Count < 2 || (contrasts.Count == 0 && others.Count == 0))
        {
            return null;
        }

        var blocks = new List<ReportBlock>();
        if (contrasts.Count > 0)
        {
            blocks.Add(new ParagraphBlock(string.Join(' ', Hands.Select(hand => Sentence(context, hand, contrasts)).Where(text => text.Length > 0))) { KeepWithNext = true });
            blocks.Add(Matrix(context));
            blocks.Add(ContrastTable(context, contrasts));
            var plots = Hands.Select(hand => Plot(context, hand, contrasts)).OfType<PlotFigure>().ToList();
            if (plots.Count > 0)
            {
                blocks.Add(new PlotRowBlock(plots));
            }
        }

        // One frequency a state, as everywhere in print; figures.csv has all.
        others = [.. others.Where(figure => figure.Source is null or DataSource.Measured
            && (figure.FrequencyHz is null || (figure.State is { } state && context.FrequencyOf(state).CutHz is { } cut && ReportContext.Same(figure.FrequencyHz, cut))))];
        if (others.Count > 0)
        {
            blocks.Add(OtherTable(others));
        }

        return new("states", "State against state", blocks);
    }

    // Each pair and hand at the frequency at which the stronger state's pattern is shown, else at the only frequency that there is.
    private static List<Figure> Contrasts(ReportContext context) =>
        [.. context.Reduced.Table.Of(QuantityCatalogue.SwitchingContrast)
            .Where(figure => figure.State is not null && figure.OtherState is not null)
            .GroupBy(figure => (figure.Component, figure.State, figure.OtherState, figure.Source))
            .Select(group => group.FirstOrDefault(figure => context.FrequencyOf(group.Key.State!).CutHz is { } cut && ReportContext.Same(figure.FrequencyHz, cut)) ?? group.First())
            .OrderBy(figure => figure.Component).ThenBy(figure => figure.Source)];

    private static string Sentence(ReportContext context, FieldComponent hand, List<Figure> contrasts)
    {
        var most = Telling(context, hand, contrasts);
        var at = most?.FrequencyHz is { } frequency ? $" at {FrequencyText.WithUnit(frequency)}" : string.Empty;
        return most is null ? string.Empty : $"On the axis, state {most.State} has {FigureText.WithUnit(most)} more {Words.Of(hand)} level than state {most.OtherState}{at}.";
    }

    // The contrast that a reader asks for first: between two states that are meant to have opposite hands, measured, and of those the largest.
    private static Figure? Telling(ReportContext context, FieldComponent hand, List<Figure> contrasts) => contrasts
        .Where(figure => figure.Component == hand && double.IsFinite(figure.Value))
        .OrderBy(figure => context.IntendedHand(figure.State!) is { } one && context.IntendedHand(figure.OtherState!) is { } other && one != other ? 0 : 1)
        .ThenBy(figure => figure.Source).ThenByDescending(figure => figure.Value).FirstOrDefault();

    private static TableBlock Matrix(ReportContext context)
    {
        var cells = new FigureCell();
        var rows = context.States.Select(state =>
        {
            var quantity = context.LevelQuantity(state);
            Figure? Level(FieldComponent hand) => context.FindAtCut(quantity, state, figure => figure.At == FigurePlace.Axis && figure.Component == hand);
            return new TableRow([state, context.FrequencyOf(state).CutHz is { } cut ? FrequencyText.WithUnit(cut) : NumberText.Missing, .. Hands.Select(hand => cells.Of(Level(hand))), UnitText.Of(quantity, FieldComponent.Right)]);
        }).ToList();
        return new(
            "Who has how much of each hand on the axis.",
            [new("State"), new("Frequency"), new("Right-hand", ColumnAlignment.DecimalPoint), new("Left-hand", ColumnAlignment.DecimalPoint), new("Unit")],
            rows)
        {
            Notes = cells.Notes,
        };
    }

    private static TableBlock ContrastTable(ReportContext context, List<Figure> contrasts)
    {
        var cells = new FigureCell();
        var rows = contrasts.Select(contrast => new TableRow(
        [
            Words.Of(contrast.Component),
            contrast.State!,
            contrast.OtherState!,
            contrast.Source is { } source ? Words.Of(source) : string.Empty,
            contrast.FrequencyHz is { } frequency ? FrequencyText.WithUnit(frequency) : string.Empty,
            cells.OfKnownSource(contrast),
            Reduction(cells, context.Figures(QuantityCatalogue.SwitchingReduction, contrast.State).FirstOrDefault(figure => IsTwin(figure, contrast))),
        ])).ToList();
        return new(
            "Switching: how much less of a hand the second state has than the first.",
            [new("Hand"), new("State"), new("Against"), new("Source"), new("Frequency"), new(Glossary.Named("Contrast", QuantityCatalogue.SwitchingContrast, " (dB)"), ColumnAlignment.DecimalPoint), new(Glossary.Named("Reduction", QuantityCatalogue.SwitchingReduction, " (%)"), ColumnAlignment.DecimalPoint)],
            rows)
        {
            Notes = cells.Notes,
            Sortable = true,
        };
    }

    // A share that only rounding makes whole is not printed as 100.
    private static RichText Reduction(FigureCell cells, Figure? figure) =>
        figure is { Value: > 99.95 and < 100.0 } && !double.IsFinite(figure.Uncertainty.Expanded) ? ">\u00A099.9" : cells.OfKnownSource(figure);

    private static bool IsTwin(Figure one, Figure other) => one.Component == other.Component && one.Source == other.Source && string.Equals(one.OtherState, other.OtherState, StringComparison.Ordinal)
        && Nullable.Equals(one.FrequencyHz, other.FrequencyHz) && Nullable.Equals(one.PhiDeg, other.PhiDeg);

    private static PlotFigure? Plot(ReportContext context, FieldComponent hand, List<Figure> contrasts)
    {
        var most = Telling(context, hand, contrasts);
        if (most is null || context.FrequencyOf(most.State!).CutHz is not { } frequency || CutKey.Of(context, most.State!) is not [var cut, ..])
        {
            return null;
        }

        var quantity = context.LevelQuantity(most.State!);
        var source = most.Source ?? DataSource.Measured;
        var curves = new[] { most.State!, most.OtherState! }
            .Select(state => CurveSource.AlongCut(context, quantity, cut with { State = state }, source, hand)).OfType<Trace>()
            .Select(trace => CurveSource.ForState(context, trace, trace.X) with { Dashed = false }).ToList();
        if (curves.Count < 2)
        {
            return null;
        }

        var unit = UnitText.Of(quantity, hand);
        var (_, highest) = PlotCurve.Range(curves);
        var span = Math.Max(40.0, 10.0 * Math.Ceiling((highest - curves.Min(curve => PlotCurve.Range([curve]).Most) + 15.0) / 10.0));
        var (least, last) = (curves.Min(curve => curve.X[0]), curves.Max(curve => curve.X[^1]));
        var name = $"{Words.Of(hand)} {quantity.Name}";
        return new PlotFigure
        {
            FileName = $"states-{Words.Of(hand)}",
            Kind = "two states in one frame",
            Caption = $"{Words.Capital(name)} of both states, {Words.Of(source)}, cut {cut.Text} at {FrequencyText.WithUnit(frequency)}.",
            AlternativeText = $"{Words.Capital(name)} along the cut {cut.Text} of states {most.State} and {most.OtherState}: on the axis they differ by {FigureText.WithUnit(most)}.",
            WidthShare = 0.5,
            Aspect = 0.76,
            Readout = new(cut.PhiDeg is null ? "φ" : "θ", "°", 1, unit, 1),
            Make = () => CurvePlot.Make(curves, LegendEntry.ForStates(curves, context.Styles), cut.AngleTitle, CurvePlot.Angles(least, last, wide: false), PlotFrame.Title(name, unit), CurvePlot.Levels(highest, span)),
        };
    }

    private static TableBlock OtherTable(List<Figure> figures)
    {
        var cells = new FigureCell();
        return new(
            "Other measured relations between states, at the frequency at which the pattern of the first is shown.",
            [new("State"), new("Against"), new("Quantity"), new("Value", ColumnAlignment.DecimalPoint), new("Unit")],
            [.. figures.Select(figure => new TableRow([figure.State ?? string.Empty, figure.OtherState!, Glossary.Label(figure), cells.OfKnownSource(figure), FigureText.Unit(figure)]))])
        {
            Notes = cells.Notes,
            Sortable = true,
        };
    }
}
