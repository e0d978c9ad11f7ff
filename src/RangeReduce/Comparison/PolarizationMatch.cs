using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>Adds how well the polarization of one state takes up the wave of another, on the axis at each frequency.</summary>
public static class PolarizationMatch
{
    private const string Formula = "10 lg (1 + sin 2χ₁ sin 2χ₂ + cos 2χ₁ cos 2χ₂ cos 2Δτ)/2, χ = ±arctan of the inverse axial ratio, both as transmitted (standard antenna texts)";

    /// <summary>Adds the rows for every pair of states of one source.</summary>
    /// <param name="table">The table that they are read from.</param>
    public static void Add(FigureTable table)
    {
        ArgumentNullException.ThrowIfNull(table);
        var onAxis = table.Figures.Where(figure => figure is { At: FigurePlace.Axis, Method: null } && figure.FrequencyHz is not null).ToArray();
        var hands = onAxis.Where(figure => figure is { Hand: not null, PhiDeg: null, ThetaDeg: null }).ToLookup(Key);
        var tilts = onAxis.Where(figure => figure.Quantity == QuantityCatalogue.TiltAngle).ToLookup(Key);
        var rows = onAxis.Where(figure => figure.Quantity == QuantityCatalogue.AxialRatio && figure is { PhiDeg: null, ThetaDeg: null }).ToArray();
        foreach (var group in rows.GroupBy(row => (row.Source, row.FrequencyHz)))
        {
            foreach (var one in group)
            {
                foreach (var other in group.Where(other => string.CompareOrdinal(one.State, other.State) < 0))
                {
                    AddPair(table, one, other, hands, tilts);
                }
            }
        }
    }

    /// <summary>Gives the polarization efficiency of two polarizations, 0 to 1.</summary>
    /// <param name="chiOne">Ellipticity angle of the one in radians, positive for right hand.</param>
    /// <param name="chiOther">Ellipticity angle of the other.</param>
    /// <param name="tiltDifferenceDeg">Difference of their tilts in degrees.</param>
    public static double Efficiency(double chiOne, double chiOther, double tiltDifferenceDeg) =>
        0.5 * (1.0 + (Math.Sin(2.0 * chiOne) * Math.Sin(2.0 * chiOther)) + (Math.Cos(2.0 * chiOne) * Math.Cos(2.0 * chiOther) * Math.Cos(2.0 * double.DegreesToRadians(tiltDifferenceDeg))));

    private static (string?, DataSource?, double?) Key(Figure figure) => (figure.State, figure.Source, figure.FrequencyHz);

    private static void AddPair(FigureTable table, Figure one, Figure other, ILookup<(string?, DataSource?, double?), Figure> hands, ILookup<(string?, DataSource?, double?), Figure> tilts)
    {
        var (chiOne, chiOther) = (Ellipticity(one, hands[Key(one)]), Ellipticity(other, hands[Key(other)]));
        if (double.IsNaN(chiOne) || double.IsNaN(chiOther))
        {
            return;
        }

        // Tilt is read in the basis of a cut, so both must come from the same one. A circle has no tilt and needs none.
        double? difference = tilts[Key(one)].Join(tilts[Key(other)], tilt => tilt.PhiDeg, tilt => tilt.PhiDeg, (a, b) => (double?)(a.Value - b.Value)).FirstOrDefault();
        if (difference is null && !IsCircular(one) && !IsCircular(other))
        {
            return;
        }

        var value = 10.0 * Math.Log10(Math.Max(0.0, Efficiency(chiOne, chiOther, difference ?? 45.0)));
        table.Add(new Figure
        {
            Quantity = QuantityCatalogue.PolarizationEfficiency,
            Value = double.IsFinite(value) ? value : double.NaN,
            Why = double.IsFinite(value) ? null : "the two polarizations are orthogonal to the last digit",
            State = one.State,
            OtherState = other.State,
            Source = one.Source,
            FrequencyHz = one.FrequencyHz,
            At = FigurePlace.Axis,
            Origin = new([.. one.Origin.Inputs.Concat(other.Origin.Inputs).Distinct(StringComparer.Ordinal)], one.Origin.Corrections, Formula),
        });
    }

    private static bool IsCircular(Figure ratio) => ratio.Value < Patterns.PolarizationEllipse.TiltFromDb;

    private static double Ellipticity(Figure ratio, IEnumerable<Figure> hands)
    {
        if (hands.FirstOrDefault()?.Hand is not { } hand)
        {
            return double.NaN;
        }

        // The hand is not named where the minor axis is all but zero; its sign does not matter there.
        var chi = double.IsFinite(ratio.Value) ? Math.Atan(Math.Pow(10.0, -ratio.Value / 20.0)) : 0.0;
        return hand == Hand.Left ? -chi : chi;
    }
}
