using System.Globalization;
using RangeReduce.Quantities;
using RangeReduce.Reduction;
using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>Gathers the values that a requirement of one state is held against, and says what of the asked range the data leave uncovered.</summary>
/// <param name="Points">The values.</param>
/// <param name="Uncovered">What is not covered, in words; null where all is.</param>
internal sealed record RequirementPoints(IReadOnlyList<RequirementPoint> Points, string? Uncovered)
{
    private const double SameAngleDeg = 1e-6;

    /// <summary>Gathers from the curve over frequency where there is one and a band is asked for, else from the figures.</summary>
    public static RequirementPoints Of(Requirement requirement, FigureTable table, double axisDeg)
    {
        if (requirement.ConeDeg is { } cone)
        {
            return OverCone(requirement, table, axisDeg, cone);
        }

        if (requirement is { BandLowHz: { } low, BandHighHz: { } high } && RequirementFilter.Trace(requirement, table) is { } curve)
        {
            return OverBand(curve, low, high);
        }

        var figures = RequirementFilter.Figures(requirement, table);
        RequirementPoint[] points = [.. figures.Where(figure => double.IsFinite(figure.Value)).Select(figure => new RequirementPoint(figure.Value, figure.FrequencyHz, null, figure.State, figure.Id))];
        return new(points, BandGap(requirement, points.Select(point => point.FrequencyHz)));
    }

    /// <summary>Says which part of the band single frequencies leave uncovered; null where they reach over it, where no band is asked for, and where there are none.</summary>
    public static string? BandGap(Requirement requirement, IEnumerable<double?> frequencyHz)
    {
        var known = frequencyHz.OfType<double>().ToArray();
        return requirement is { BandLowHz: { } low, BandHighHz: { } high } && known.Length > 0
            && (known.Min() > low + RequirementFilter.SameFrequencyHz || known.Max() < high - RequirementFilter.SameFrequencyHz)
            ? string.Create(CultureInfo.InvariantCulture, $"inside the band there are data only from {known.Min() / 1e9:0.####} to {known.Max() / 1e9:0.####} GHz")
            : null;
    }

    /// <summary>Takes the curve at its samples inside the band and, between samples, at the ends of the band.</summary>
    private static RequirementPoints OverBand(Trace curve, double low, double high)
    {
        var points = new List<RequirementPoint>();
        string? uncovered = null;
        for (var i = 0; i < curve.X.Length; i++)
        {
            if (curve.X[i] >= low && curve.X[i] <= high)
            {
                Take(curve.X[i], curve.Y[i]);
            }
        }

        foreach (var end in new[] { low, high })
        {
            var found = Array.BinarySearch(curve.X, end);
            if (found < 0 && ~found > 0 && ~found < curve.X.Length)
            {
                Take(end, OnChord(curve.X[~found - 1], curve.Y[~found - 1], curve.X[~found], curve.Y[~found], end));
            }
        }

        if (curve.X[0] > low + RequirementFilter.SameFrequencyHz || curve.X[^1] < high - RequirementFilter.SameFrequencyHz)
        {
            uncovered = string.Create(CultureInfo.InvariantCulture, $"the data reach only from {curve.X[0] / 1e9:0.####} to {curve.X[^1] / 1e9:0.####} GHz");
        }

        return new(points, uncovered);

        void Take(double hertz, double value)
        {
            if (double.IsNaN(value))
            {
                uncovered ??= string.Create(CultureInfo.InvariantCulture, $"the value at {hertz / 1e9:0.####} GHz is missing");
                return;
            }

            points.Add(new(value, hertz, null, curve.State, curve.Id));
        }
    }

    /// <summary>Takes every cut through the axis at its samples inside the cone and, between samples, at its rim.</summary>
    private static RequirementPoints OverCone(Requirement requirement, FigureTable table, double axisDeg, double coneDeg)
    {
        var points = new List<RequirementPoint>();
        string? uncovered = null;
        var curves = RequirementFilter.TracesAlongAngle(requirement, table);
        foreach (var curve in curves)
        {
            var around = new TurnedSpan(curve.X, curve.Y);
            for (var i = 0; i < around.Count; i++)
            {
                var off = around.IsClosed ? Math.IEEERemainder(curve.X[i] - axisDeg, 360.0) : curve.X[i] - axisDeg;
                if (Math.Abs(off) <= coneDeg + SameAngleDeg)
                {
                    Take(curve, curve.X[i], curve.Y[i]);
                }
            }

            foreach (var rim in new[] { axisDeg - coneDeg, axisDeg + coneDeg })
            {
                var at = TurnedSpan.InTurn(curve.X, rim);
                var found = Array.BinarySearch(curve.X, at);
                if (found < 0)
                {
                    // Beyond the ends of an open cut angle and ordinate are NaN, and so is the value.
                    Take(curve, at, OnChord(around.AngleDeg(~found - 1), around.Y(~found - 1), around.AngleDeg(~found), around.Y(~found), at));
                }
            }
        }

        // The figures over the cone say the same in one row a frequency, and are all there is for a ratio that has no curve along the angle.
        Figure[] figures = RequirementFilter.ConeFigures(requirement, table, coneDeg);
        if (uncovered is null && figures.Length > 0 && curves.All(curve => figures.Any(figure => figure.FrequencyHz == curve.FrequencyHz && string.Equals(figure.State, curve.State, StringComparison.Ordinal))))
        {
            points = [.. figures.Select(figure => new RequirementPoint(figure.Value, figure.FrequencyHz, figure.DirectionDeg, figure.State, figure.Id))];
            return new(points, BandGap(requirement, figures.Select(figure => figure.FrequencyHz)));
        }

        return new(points, uncovered ?? BandGap(requirement, curves.Select(curve => curve.FrequencyHz)));

        void Take(Trace curve, double angleDeg, double value)
        {
            if (double.IsNaN(value))
            {
                uncovered ??= string.Create(CultureInfo.InvariantCulture, $"the cut at {curve.FrequencyHz / 1e9:0.####} GHz has no value at {angleDeg:0.##}°");
                return;
            }

            points.Add(new(value, curve.FrequencyHz, angleDeg, curve.State, curve.Id));
        }
    }

    // No straight line leads to an infinite value (a perfect match, a linear wave): the nearer sample stands for it.
    private static double OnChord(double left, double atLeft, double right, double atRight, double at) =>
        double.IsInfinity(atLeft) || double.IsInfinity(atRight)
            ? at - left < right - at ? atLeft : atRight
            : atLeft + ((at - left) / (right - left) * (atRight - atLeft));
}
