namespace RangeReduce.Quantities;

/// <summary>A curve: one quantity against frequency or angle, with the same keys as a <see cref="Figure"/>.</summary>
public sealed record Trace
{
    /// <summary>Gets the id that is unique within a table (<c>t1</c>, <c>t2</c>, ...); empty until a table has taken the trace.</summary>
    public string Id { get; init; } = string.Empty;

    /// <summary>Gets the quantity.</summary>
    public required Quantity Quantity { get; init; }

    /// <summary>Gets what the trace runs along.</summary>
    public required TraceAxis Axis { get; init; }

    /// <summary>Gets the abscissae in hertz or degrees, rising.</summary>
    public required double[] X { get; init; }

    /// <summary>Gets the ordinates in the unit of the quantity, as many as <see cref="X"/>; NaN where there is no value.</summary>
    public required double[] Y { get; init; }

    /// <summary>Gets the configuration state.</summary>
    public string? State { get; init; }

    /// <summary>Gets the state that <see cref="State"/> is compared with.</summary>
    public string? OtherState { get; init; }

    /// <summary>Gets the source of the data.</summary>
    public DataSource? Source { get; init; }

    /// <summary>Gets the frequency in hertz of a trace along angle.</summary>
    public double? FrequencyHz { get; init; }

    /// <summary>Gets the fixed phi of the cut in degrees.</summary>
    public double? PhiDeg { get; init; }

    /// <summary>Gets the fixed theta of the cut in degrees.</summary>
    public double? ThetaDeg { get; init; }

    /// <summary>Gets the kind of place that a trace over frequency was taken at.</summary>
    public FigurePlace At { get; init; }

    /// <summary>Gets the field component.</summary>
    public FieldComponent Component { get; init; }

    /// <summary>Gets the method, where the same curve can be had by more than one.</summary>
    public string? Method { get; init; }

    /// <summary>Gets what made the trace.</summary>
    public FigureOrigin Origin { get; init; } = FigureOrigin.None;
}
