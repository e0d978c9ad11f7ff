namespace RangeReduce.Quantities;

/// <summary>The words that results and sentences use for the small closed lists of keys.</summary>
public static class KeyWords
{
    /// <summary>Gives <c>measured</c>, <c>simulated</c> or <c>expected</c>.</summary>
    public static string Word(this DataSource source) => source switch
    {
        DataSource.Measured => "measured",
        DataSource.Simulated => "simulated",
        _ => "expected",
    };

    /// <summary>Gives <c>right</c>, <c>left</c> or <c>linear</c>.</summary>
    public static string Word(this Hand hand) => hand switch
    {
        Hand.Right => "right",
        Hand.Left => "left",
        _ => "linear",
    };

    /// <summary>Gives the component in lower case; null for none.</summary>
    public static string? Word(this FieldComponent component) => component switch
    {
        FieldComponent.Right => "right",
        FieldComponent.Left => "left",
        FieldComponent.Theta => "theta",
        FieldComponent.Phi => "phi",
        FieldComponent.Co => "co",
        FieldComponent.Cross => "cross",
        FieldComponent.Total => "total",
        _ => null,
    };

    /// <summary>Gives the place in lower case; null for none.</summary>
    public static string? Word(this FigurePlace place) => place switch
    {
        FigurePlace.Resonance => "resonance",
        FigurePlace.Axis => "axis",
        FigurePlace.Peak => "peak",
        FigurePlace.Cone => "cone",
        _ => null,
    };
}
