using System.Globalization;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>Holds the measured figures against the requirements of the manifest: each is a filter on the table and a bound, and the worst case decides.</summary>
/// <remarks>
/// The rule is simple acceptance (ILAC-G8:09/2019): the value decides, its uncertainty is shown beside it. A requirement over a band is
/// met only if the data reach over the whole band.
/// </remarks>
public static class RequirementEvaluator
{
    /// <summary>Evaluates all requirements of a run.</summary>
    public static IReadOnlyList<RequirementOutcome> Evaluate(MeasurementRun run, FigureTable table)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(table);
        return [.. run.Requirements.Select(requirement => Evaluate(requirement, table))];
    }

    private static RequirementOutcome Evaluate(Requirement requirement, FigureTable table)
    {
        var text = RequirementWords.Of(requirement);
        var figures = RequirementFilter.Figures(requirement, table);
        if (requirement.EqualTo is { } hand)
        {
            return Hands(requirement, text, figures, hand);
        }

        var curve = requirement.BandLowHz is null ? null : RequirementFilter.Trace(requirement, table);
        var points = curve is not null ? CurvePoints(requirement, curve, out var uncovered) : FigurePoints(requirement, figures, out uncovered);
        if (points.Length == 0)
        {
            return new(requirement, text, RequirementVerdict.Undecided, [], double.NaN, "no measured figure answers it");
        }

        var worst = points.MinBy(point => Margin(requirement, point.Value));
        var margin = Margin(requirement, worst.Value);
        var where = worst.FrequencyHz is { } hertz ? string.Create(CultureInfo.InvariantCulture, $"worst at {hertz / 1e9:0.####} GHz") : "worst value";
        if (uncovered is not null && margin >= 0.0)
        {
            return new(requirement, text, RequirementVerdict.Undecided, worst.FigureIds, margin, $"{where}; {uncovered}") { Worst = worst.Value };
        }

        return new(requirement, text, margin >= 0.0 ? RequirementVerdict.Met : RequirementVerdict.NotMet, worst.FigureIds, margin, where) { Worst = worst.Value };
    }

    private static double Margin(Requirement requirement, double value) => Math.Min(
        requirement.AtLeast is { } low ? value - low : double.PositiveInfinity,
        requirement.AtMost is { } high ? high - value : double.PositiveInfinity);

    private static RequirementOutcome Hands(Requirement requirement, string text, Figure[] figures, Hand wanted)
    {
        var told = figures.Where(figure => figure.Hand is not null).ToArray();
        if (told.Length == 0)
        {
            return new(requirement, text, RequirementVerdict.Undecided, [], double.NaN, "no measured hand answers it");
        }

        var wrong = told.Where(figure => figure.Hand != wanted).ToArray();
        return wrong.Length == 0
            ? new(requirement, text, RequirementVerdict.Met, [told[0].Id], double.NaN, $"{wanted.Word()} at all {told.Length.ToString(CultureInfo.InvariantCulture)} frequencies")
            : new(requirement, text, RequirementVerdict.NotMet, [.. wrong.Select(figure => figure.Id)], double.NaN, string.Create(CultureInfo.InvariantCulture, $"{wrong[0].Hand!.Value.Word()} at {wrong[0].FrequencyHz / 1e9:0.####} GHz"));
    }

    private static Point[] FigurePoints(Requirement requirement, Figure[] figures, out string? uncovered)
    {
        var finite = figures.Where(figure => double.IsFinite(figure.Value)).ToArray();
        uncovered = null;
        if (requirement is { BandLowHz: { } low, BandHighHz: { } high } && finite.Length > 0)
        {
            var frequencies = finite.Where(figure => figure.FrequencyHz is not null).Select(figure => figure.FrequencyHz!.Value).ToArray();
            uncovered = frequencies.Length > 0 && (frequencies.Min() > low || frequencies.Max() < high)
                ? string.Create(CultureInfo.InvariantCulture, $"the data reach from {frequencies.Min() / 1e9:0.####} to {frequencies.Max() / 1e9:0.####} GHz inside the band")
                : null;
        }

        return [.. finite.Select(figure => new Point(figure.Value, figure.FrequencyHz, [figure.Id]))];
    }

    /// <summary>Takes the curve at its samples inside the band and, between samples, at the ends of the band.</summary>
    private static Point[] CurvePoints(Requirement requirement, Trace curve, out string? uncovered)
    {
        var (low, high) = (requirement.BandLowHz!.Value, requirement.BandHighHz!.Value);
        var points = new List<Point>();
        for (var i = 0; i < curve.X.Length; i++)
        {
            if (curve.X[i] >= low && curve.X[i] <= high && !double.IsNaN(curve.Y[i]))
            {
                points.Add(new(curve.Y[i], curve.X[i], [curve.Id]));
            }
        }

        foreach (var end in new[] { low, high })
        {
            var found = Array.BinarySearch(curve.X, end);
            if (found < 0 && ~found > 0 && ~found < curve.X.Length)
            {
                var (left, right) = (~found - 1, ~found);
                var share = (end - curve.X[left]) / (curve.X[right] - curve.X[left]);
                var value = curve.Y[left] + (share * (curve.Y[right] - curve.Y[left]));
                if (!double.IsNaN(value))
                {
                    points.Add(new(value, end, [curve.Id]));
                }
            }
        }

        uncovered = curve.X[0] > low || curve.X[^1] < high
            ? string.Create(CultureInfo.InvariantCulture, $"the data reach only from {curve.X[0] / 1e9:0.####} to {curve.X[^1] / 1e9:0.####} GHz")
            : null;
        return [.. points];
    }

    private readonly record struct Point(double Value, double? FrequencyHz, IReadOnlyList<string> FigureIds);
}
