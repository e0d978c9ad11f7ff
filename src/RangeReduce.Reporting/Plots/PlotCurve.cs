using OxyPlot;

namespace RangeReduce.Reporting.Plots;

/// <summary>A curve ready to be drawn: abscissae and ordinates in printed units, and its style.</summary>
/// <param name="Name">Name of the curve, for the reading under the pointer.</param>
/// <param name="X">Abscissae in printed units.</param>
/// <param name="Y">Ordinates in printed units, as many; NaN breaks the curve.</param>
internal sealed record PlotCurve(string Name, double[] X, double[] Y)
{
    /// <summary>Gets the configuration state; null for none.</summary>
    public string? State { get; init; }

    /// <summary>Gets the colour.</summary>
    public OxyColor Color { get; init; } = PlotPalette.Ink;

    /// <summary>Gets the marker.</summary>
    public MarkerType Marker { get; init; } = MarkerType.None;

    /// <summary>Gets whether the curve is dashed, as simulated ones are.</summary>
    public bool Dashed { get; init; }

    /// <summary>Gets the thickness in points.</summary>
    public double Thickness { get; init; } = 1.3;

    /// <summary>Gets the least and the largest finite ordinate of some curves; NaN where there is none.</summary>
    public static (double Least, double Most) Range(IEnumerable<PlotCurve> curves)
    {
        var (least, most) = (double.NaN, double.NaN);
        foreach (var value in curves.SelectMany(curve => curve.Y).Where(double.IsFinite))
        {
            least = value >= least ? least : value;
            most = value <= most ? most : value;
        }

        return (least, most);
    }
}
