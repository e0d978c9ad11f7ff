using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Sections;

/// <summary>Says in one sentence what a configuration state does.</summary>
internal static class StateSentence
{
    /// <summary>An axial ratio up to this is called circular (common practice).</summary>
    public const double CircularDb = 3.0;

    /// <summary>An axial ratio above this is called close to linear: the minor axis is a tenth of the major one.</summary>
    public const double LinearDb = 20.0;

    /// <summary>Writes the sentence about a state.</summary>
    public static string Of(ReportContext context, string state)
    {
        var text = Polarization(context, state);
        return $"State {state} {text}; {Match(context, state)}.";
    }

    private static string Polarization(ReportContext context, string state)
    {
        var frequency = context.FrequencyOf(state);
        if (frequency.CutHz is not { } cut)
        {
            return "has no pattern cuts";
        }

        var at = FrequencyText.WithUnit(cut);
        var hand = context.FindAtCut(QuantityCatalogue.Hand, state, figure => figure.At == FigurePlace.Axis)?.Hand;
        var ratio = context.FindAtCut(QuantityCatalogue.AxialRatio, state, figure => figure.At == FigurePlace.Axis);
        var parts = new List<string>();
        if (ratio is not null && double.IsFinite(ratio.Value))
        {
            parts.Add($"axial ratio {FigureText.WithUnit(ratio)}");
        }

        if (Level(context, state, hand) is { } level)
        {
            parts.Add(level);
        }

        var what = hand switch
        {
            null => $"shows no definite hand on the axis at {at}",
            Hand.Linear => $"is linear on the axis at {at}",
            { } sense when ratio?.Value > LinearDb => $"is close to linear on the axis at {at}, {FigureText.HandWord(sense)}-hand{Intent(context, state, sense)}",
            { } sense => $"is {FigureText.HandWord(sense)}-hand {(ratio?.Value <= CircularDb ? "circular" : "elliptical")} on the axis at {at}{Intent(context, state, sense)}",
        };
        return parts.Count == 0 ? what : $"{what}: {string.Join(", ", parts)}";
    }

    private static string Intent(ReportContext context, string state, Hand found)
    {
        return context.IntendedHand(state) is { } wanted && wanted != found ? $", though {FigureText.HandWord(wanted)} was intended" : string.Empty;
    }

    private static string? Level(ReportContext context, string state, Hand? hand)
    {
        var component = hand switch { Hand.Right => FieldComponent.Right, Hand.Left => FieldComponent.Left, _ => FieldComponent.Total };
        var quantity = context.LevelQuantity(state);
        var figure = context.FindAtCut(quantity, state, known => known.At == FigurePlace.Axis && known.Component == component);
        return figure is null || !double.IsFinite(figure.Value) ? null
            : $"{(component == FieldComponent.Total ? "total " : string.Empty)}{(figure.Realized == true ? "realized " : string.Empty)}{quantity.Name} {FigureText.WithUnit(figure)}";
    }

    private static string Match(ReportContext context, string state)
    {
        var band = context.Find(QuantityCatalogue.MatchBand, state, figure => (figure.Rank ?? 1) == 1 && figure.LowHz is not null && figure.HighHz is not null);
        if (band is { LowHz: { } low, HighHz: { } high } && double.IsFinite(band.Value))
        {
            var threshold = band.Threshold is { } limit ? $" (return loss at least {UnitText.Join(NumberText.Trimmed(limit, 1), "dB")})" : string.Empty;
            var open = band.Open is null ? string.Empty : ", where the sweep ends";
            return $"matched from {BandText.Edge(low)} to {FrequencyText.Label(high)}{threshold}{open}";
        }

        var best = context.Find(QuantityCatalogue.ReturnLoss, state, figure => figure.At == FigurePlace.Resonance && (figure.Rank ?? 1) == 1);
        return best is null ? (context.Traces(QuantityCatalogue.ReturnLoss, state).Any() ? "no resonance and no match band inside the sweep" : "no reflection sweep") : $"nowhere matched, return loss at most {FigureText.WithUnit(best)}";
    }
}
