using RangeReduce.Quantities;

namespace RangeReduce.Runs;

/// <summary>A requirement out of the manifest: a filter on the table of figures and a bound.</summary>
public sealed record Requirement
{
    /// <summary>Gets the id within the run: <c>r1</c>, <c>r2</c>, ...</summary>
    public required string Id { get; init; }

    /// <summary>Gets the quantity.</summary>
    public required Quantity Quantity { get; init; }

    /// <summary>Gets the configuration state; null for every state.</summary>
    public string? State { get; init; }

    /// <summary>Gets the other state of a comparison.</summary>
    public string? OtherState { get; init; }

    /// <summary>Gets the field component.</summary>
    public FieldComponent Component { get; init; }

    /// <summary>Gets the lower end of the band in hertz.</summary>
    public double? BandLowHz { get; init; }

    /// <summary>Gets the upper end of the band in hertz.</summary>
    public double? BandHighHz { get; init; }

    /// <summary>Gets the half angle of the cone about the axis in degrees.</summary>
    public double? ConeDeg { get; init; }

    /// <summary>Gets the lower bound in the unit of the quantity.</summary>
    public double? AtLeast { get; init; }

    /// <summary>Gets the upper bound in the unit of the quantity.</summary>
    public double? AtMost { get; init; }

    /// <summary>Gets the hand that is asked for.</summary>
    public Hand? EqualTo { get; init; }

    /// <summary>Gets the line of the requirement in the manifest.</summary>
    public int Line { get; init; }
}
