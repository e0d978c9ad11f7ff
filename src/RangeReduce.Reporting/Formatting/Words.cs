using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Formatting;

/// <summary>Names of keys in plain words.</summary>
internal static class Words
{
    /// <summary>Gives a text with a capital first letter.</summary>
    public static string Capital(string text) => text.Length == 0 ? text : char.ToUpperInvariant(text[0]) + text[1..];

    /// <summary>Gives a component in words; empty for none.</summary>
    public static string Of(FieldComponent component) => component switch
    {
        FieldComponent.Right => "right-hand",
        FieldComponent.Left => "left-hand",
        FieldComponent.Theta => "theta",
        FieldComponent.Phi => "phi",
        FieldComponent.Co => "co-polar",
        FieldComponent.Cross => "cross-polar",
        FieldComponent.Total => "total",
        _ => string.Empty,
    };

    /// <summary>Gives a source in words.</summary>
    public static string Of(DataSource source) => source switch
    {
        DataSource.Measured => "measured",
        DataSource.Simulated => "simulated",
        _ => "expected",
    };

    /// <summary>Gives a kind of place in words; empty for none.</summary>
    public static string Of(FigurePlace place) => place switch
    {
        FigurePlace.Resonance => "at the resonance",
        FigurePlace.Axis => "on the axis",
        FigurePlace.Peak => "at the maximum",
        FigurePlace.Cone => "over the cone",
        _ => string.Empty,
    };

    /// <summary>Joins parts with commas and a last "and".</summary>
    public static string List(IReadOnlyList<string> parts) => parts.Count switch
    {
        0 => string.Empty,
        1 => parts[0],
        _ => string.Join(", ", parts.Take(parts.Count - 1)) + " and " + parts[^1],
    };

    /// <summary>Gives the cut in words, such as "φ = 45°"; empty where no angle is known.</summary>
    public static string Cut(double? phiDeg, double? thetaDeg) => (phiDeg, thetaDeg) switch
    {
        ({ } phi, _) when !double.IsNaN(phi) => $"φ{UnitText.NoBreakSpace}={UnitText.NoBreakSpace}{NumberText.Trimmed(phi, 2)}°",
        (_, { } theta) when !double.IsNaN(theta) => $"θ{UnitText.NoBreakSpace}={UnitText.NoBreakSpace}{NumberText.Trimmed(theta, 2)}°",
        _ => string.Empty,
    };
}
