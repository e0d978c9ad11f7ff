using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>The table with one column a state and one row a figure.</summary>
internal static class StateTable
{
    private const int MostColumns = 5;

    /// <summary>Makes the table; many states are split over several.</summary>
    public static IEnumerable<ReportBlock> Blocks(ReportContext context)
    {
        var chunks = context.States.Chunk(MostColumns).ToList();
        for (var at = 0; at < chunks.Count; at++)
        {
            var part = chunks.Count == 1 ? string.Empty : $", part {NumberText.Fixed(at + 1, 0)} of {NumberText.Fixed(chunks.Count, 0)}";
            yield return Table(context, chunks[at], $"The states side by side{part}. Values with ± carry their expanded uncertainty.");
        }
    }

    private static TableBlock Table(ReportContext context, string[] states, string caption)
    {
        var cells = new FigureCell();
        var rows = new List<TableRow>();
        AddMatchRows(context, states, cells, rows);
        var pattern = rows.Count;
        AddPatternRows(context, states, cells, rows);
        if (rows.Count > pattern)
        {
            rows[pattern] = rows[pattern] with { StartsGroup = true };
        }

        return new(caption, [new("Figure"), new("Unit"), .. states.Select(state => new TableColumn(state, ColumnAlignment.DecimalPoint) { State = state })], rows) { Notes = cells.Notes };
    }

    private static void AddMatchRows(ReportContext context, string[] states, FigureCell cells, List<TableRow> rows)
    {
        Figure? First(Quantity quantity, string state) => context.Find(quantity, state, figure => (figure.Rank ?? 1) == 1);
        Figure? AtResonance(Quantity quantity, string state) => context.Find(quantity, state, figure => figure.At == FigurePlace.Resonance && (figure.Rank ?? 1) == 1);
        Add(rows, cells, states, QuantityCatalogue.ResonanceFrequency, ", best match", state => First(QuantityCatalogue.ResonanceFrequency, state));
        Add(rows, cells, states, QuantityCatalogue.ReturnLoss, " at it", state => AtResonance(QuantityCatalogue.ReturnLoss, state));
        Add(rows, cells, states, QuantityCatalogue.Vswr, " at it", state => AtResonance(QuantityCatalogue.Vswr, state));
        Add(rows, cells, states, QuantityCatalogue.InputResistance, " at it", state => AtResonance(QuantityCatalogue.InputResistance, state));
        Add(rows, cells, states, QuantityCatalogue.InputReactance, " at it", state => AtResonance(QuantityCatalogue.InputReactance, state));
        var bands = states.Select(state => First(QuantityCatalogue.MatchBand, state)).ToList();
        if (bands.Exists(band => band?.LowHz is not null))
        {
            var threshold = bands.OfType<Figure>().First().Threshold is { } limit ? $", return loss ≥ {UnitText.Join(NumberText.Trimmed(limit, 1), "dB")}" : string.Empty;
            rows.Add(new([Glossary.Name(QuantityCatalogue.MatchBand, threshold), "GHz", .. bands.Select(band => RichText.FromString(band is null ? NumberText.Missing : BandText.Edges(band)))]));
            Add(rows, cells, states, QuantityCatalogue.MatchBand, ", width", state => First(QuantityCatalogue.MatchBand, state));
            Add(rows, cells, states, QuantityCatalogue.MatchBandFraction, string.Empty, state => First(QuantityCatalogue.MatchBandFraction, state));
        }

        Add(rows, cells, states, QuantityCatalogue.QualityFactor, string.Empty, state => First(QuantityCatalogue.QualityFactor, state));
    }

    private static void AddPatternRows(ReportContext context, string[] states, FigureCell cells, List<TableRow> rows)
    {
        if (!states.Any(state => context.FrequencyOf(state).CutHz is not null))
        {
            return;
        }

        rows.Add(new(["Frequency of the pattern figures below", "GHz", .. states.Select(state => RichText.FromString(context.FrequencyOf(state).CutHz is { } cut ? FrequencyText.Digits(cut * 1e-9) : NumberText.Missing))]));
        Figure? Axis(Quantity quantity, string state, FieldComponent? component = null) =>
            context.FindAtCut(quantity, state, figure => figure.At == FigurePlace.Axis && (component is null || figure.Component == component));
        Figure? Cut(Quantity quantity, string state) => context.FindAtCut(quantity, state, figure => figure.At != FigurePlace.Axis);
        Add(rows, cells, states, QuantityCatalogue.Hand, " on the axis", state => Axis(QuantityCatalogue.Hand, state));
        Add(rows, cells, states, QuantityCatalogue.AxialRatio, " on the axis", state => Axis(QuantityCatalogue.AxialRatio, state));
        Add(rows, cells, states, QuantityCatalogue.TiltAngle, " on the axis", state => Axis(QuantityCatalogue.TiltAngle, state));
        foreach (var quantity in new[] { QuantityCatalogue.Gain, QuantityCatalogue.Level })
        {
            foreach (var component in new[] { FieldComponent.Right, FieldComponent.Left, FieldComponent.Total })
            {
                Add(rows, cells, states, quantity, $", {Words.Of(component)}, on the axis", state => Axis(quantity, state, component));
            }

            Add(rows, cells, states, quantity, ", at the maximum", state => Peak(context, quantity, state));
        }

        Add(rows, cells, states, QuantityCatalogue.CrossPolarRatio, " on the axis", state => Axis(QuantityCatalogue.CrossPolarRatio, state));
        foreach (var quantity in new[] { QuantityCatalogue.PeakDirection, QuantityCatalogue.HalfPowerBeamwidth, QuantityCatalogue.SidelobeLevel, QuantityCatalogue.FrontToBackRatio, QuantityCatalogue.AxialRatioBeamwidth, QuantityCatalogue.Directivity, QuantityCatalogue.RadiationEfficiency })
        {
            Add(rows, cells, states, quantity, InCut(states, state => Cut(quantity, state)), state => Cut(quantity, state));
        }

        Add(rows, cells, states, QuantityCatalogue.AxialRatioBand, string.Empty, state => context.Find(QuantityCatalogue.AxialRatioBand, state, figure => (figure.Rank ?? 1) == 1));
    }

    // Says which cut a row is about, where all its figures are about the same one.
    private static string InCut(string[] states, Func<string, Figure?> find)
    {
        var angles = states.Select(find).OfType<Figure>().Select(figure => figure.PhiDeg).Distinct().ToArray();
        return angles is [{ } phi] ? $", cut φ = {NumberText.Trimmed(phi, 1)}°" : string.Empty;
    }

    // The highest of the components that a reader asks for first: the total, else the co-polar one.
    private static Figure? Peak(ReportContext context, Quantity quantity, string state) =>
        context.FindAtCut(quantity, state, figure => figure.At == FigurePlace.Peak && figure.Component == FieldComponent.Total)
        ?? (context.CoCross(state) is { } pair ? context.FindAtCut(quantity, state, figure => figure.At == FigurePlace.Peak && figure.Component == pair.Co) : null);

    private static void Add(List<TableRow> rows, FigureCell cells, string[] states, Quantity quantity, string rest, Func<string, Figure?> find)
    {
        var figures = Array.ConvertAll(states, state => find(state));
        if (!Array.Exists(figures, figure => figure is not null))
        {
            return;
        }

        var unit = figures.OfType<Figure>().Select(FigureText.Unit).First();
        rows.Add(new([Glossary.Name(quantity, rest), unit, .. figures.Select(cells.Of)]));
    }
}
