using System.Globalization;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>Holds the measured figures against the requirements of the manifest: each is a filter on the table and a bound, and the worst case decides.</summary>
/// <remarks>
/// The rule is simple acceptance (ILAC-G8:09/2019): the value decides, its uncertainty is shown beside it. A requirement over a band or a cone is
/// met only if the data reach over all of it; one without a state, only if every state that was measured for it answers.
/// </remarks>
public static class RequirementEvaluator
{
    private static readonly Quantity[] OfSweeps =
    [
        QuantityCatalogue.ResonanceFrequency, QuantityCatalogue.ReturnLoss, QuantityCatalogue.Vswr, QuantityCatalogue.MismatchLoss, QuantityCatalogue.InputResistance,
        QuantityCatalogue.InputReactance, QuantityCatalogue.QualityFactor, QuantityCatalogue.MatchBand, QuantityCatalogue.MatchBandFraction, QuantityCatalogue.Isolation,
    ];

    private static readonly Quantity[] OfComparisons =
    [
        QuantityCatalogue.SwitchingContrast, QuantityCatalogue.SwitchingReduction, QuantityCatalogue.Deviation, QuantityCatalogue.FrequencyScale, QuantityCatalogue.CurveAgreement,
    ];

    /// <summary>Evaluates all requirements of a run.</summary>
    public static IReadOnlyList<RequirementOutcome> Evaluate(MeasurementRun run, FigureTable table)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(table);
        return [.. run.Requirements.Select(requirement => requirement.EqualTo is { } hand ? Hands(requirement, run, table, hand) : Bounds(requirement, run, table))];
    }

    private static RequirementOutcome Bounds(Requirement requirement, MeasurementRun run, FigureTable table)
    {
        var text = RequirementWords.Of(requirement);
        var parts = Array.ConvertAll(StatesOf(requirement, run), state => (State: state, Found: RequirementPoints.Of(requirement with { State = state }, table, run.AxisDeg)));
        RequirementPoint[] points = [.. parts.SelectMany(part => part.Found.Points)];
        if (points.Length == 0)
        {
            return new(requirement, text, RequirementVerdict.Undecided, [], double.NaN, requirement.ConeDeg is null ? "no measured figure answers it" : "no measured curve over the angle answers it");
        }

        var worst = points.MinBy(point => Margin(requirement, point.Value));
        var margin = Margin(requirement, worst.Value);
        var where = Where(requirement, worst);
        var uncovered = parts.Select(part => part.Found.Points.Count == 0 ? $"no measured figure of state {part.State} answers it" : part.Found.Uncovered).FirstOrDefault(words => words is not null);
        var verdict = margin < 0.0 ? RequirementVerdict.NotMet : uncovered is null ? RequirementVerdict.Met : RequirementVerdict.Undecided;
        return new(requirement, text, verdict, [worst.Id], margin, verdict == RequirementVerdict.Undecided ? $"{where}; {uncovered}" : where) { Worst = worst.Value };
    }

    private static double Margin(Requirement requirement, double value) => Math.Min(
        requirement.AtLeast is { } low ? value - low : double.PositiveInfinity,
        requirement.AtMost is { } high ? high - value : double.PositiveInfinity);

    private static string Where(Requirement requirement, RequirementPoint worst)
    {
        var places = new List<string>();
        if (worst.FrequencyHz is { } hertz)
        {
            places.Add(string.Create(CultureInfo.InvariantCulture, $"{hertz / 1e9:0.####} GHz"));
        }

        if (worst.DirectionDeg is { } direction)
        {
            places.Add(string.Create(CultureInfo.InvariantCulture, $"{direction:0.##}°"));
        }

        var state = requirement.State is null && worst.State is { } name ? $" in state {name}" : string.Empty;
        return places.Count > 0 ? $"worst at {string.Join(", ", places)}{state}" : $"worst value{state}";
    }

    private static RequirementOutcome Hands(Requirement requirement, MeasurementRun run, FigureTable table, Hand wanted)
    {
        var text = RequirementWords.Of(requirement);
        if (requirement.ConeDeg is not null)
        {
            return new(requirement, text, RequirementVerdict.Undecided, [], double.NaN, "the hand is judged on the axis, not over a cone");
        }

        var parts = Array.ConvertAll(StatesOf(requirement, run), state => (State: state, Figures: Array.FindAll(RequirementFilter.Figures(requirement with { State = state }, table), figure => figure.Hand is not null)));
        Figure[] told = [.. parts.SelectMany(part => part.Figures)];
        if (told.Length == 0)
        {
            return new(requirement, text, RequirementVerdict.Undecided, [], double.NaN, "no measured hand answers it");
        }

        var wrong = Array.FindAll(told, figure => figure.Hand != wanted);
        if (wrong.Length > 0)
        {
            var state = requirement.State is null ? $" in state {wrong[0].State}" : string.Empty;
            return new(requirement, text, RequirementVerdict.NotMet, [.. wrong.Select(figure => figure.Id)], double.NaN, string.Create(CultureInfo.InvariantCulture, $"{wrong[0].Hand!.Value.Word()} at {wrong[0].FrequencyHz / 1e9:0.####} GHz{state}"));
        }

        var uncovered = parts
            .Select(part => part.Figures.Length == 0 ? $"no measured hand of state {part.State} answers it" : RequirementPoints.BandGap(requirement, part.Figures.Select(figure => figure.FrequencyHz)))
            .FirstOrDefault(words => words is not null);
        var frequencies = string.Create(CultureInfo.InvariantCulture, $"{wanted.Word()} at all {told.Length} frequencies");
        return uncovered is null
            ? new(requirement, text, RequirementVerdict.Met, [told[0].Id], double.NaN, frequencies)
            : new(requirement, text, RequirementVerdict.Undecided, [told[0].Id], double.NaN, $"{frequencies} that were measured; {uncovered}");
    }

    /// <summary>Gives the states that have to answer: the named one, or all that were measured for the quantity; one null where the rows of the table need no state by state look.</summary>
    private static string?[] StatesOf(Requirement requirement, MeasurementRun run)
    {
        if (requirement.State is not null || OfComparisons.Contains(requirement.Quantity))
        {
            return [requirement.State];
        }

        var measured = OfSweeps.Contains(requirement.Quantity)
            ? run.Sweeps.Where(sweep => sweep.Source == DataSource.Measured).Select(sweep => sweep.State)
            : run.Cuts.Where(cut => cut.Source == DataSource.Measured).Select(cut => cut.State);
        return [.. measured.Distinct(StringComparer.Ordinal)];
    }
}
