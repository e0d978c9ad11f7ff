namespace RangeReduce.Patterns.Tables;

/// <summary>One understood heading.</summary>
internal sealed record Heading
{
    /// <summary>Gets the heading as it stands in the file.</summary>
    public required string Text { get; init; }

    /// <summary>Gets what it names.</summary>
    public HeadingKind Kind { get; init; }

    /// <summary>Gets the unit.</summary>
    public HeadingUnit Unit { get; init; } = HeadingUnit.None;

    /// <summary>Gets the part of the channel.</summary>
    public ChannelPart Part { get; init; }

    /// <summary>Gets the canonical name of the channel; empty where the heading gives a part or unit only.</summary>
    public string Channel { get; init; } = string.Empty;

    /// <summary>Gets the value of the wide form: the frequency or angle that all samples of this column share; NaN for none.</summary>
    public double Across { get; init; } = double.NaN;

    /// <summary>Gets what <see cref="Across"/> is; <see cref="HeadingKind.Unknown"/> where it is a bare number.</summary>
    public HeadingKind AcrossKind { get; init; }

    /// <summary>Gets the unit of <see cref="Across"/>; <see cref="UnitKind.None"/> where the heading does not say.</summary>
    public HeadingUnit AcrossUnit { get; init; } = HeadingUnit.None;

    /// <summary>Gets whether the column belongs to one frequency or angle.</summary>
    public bool IsAcross => !double.IsNaN(Across);

    /// <summary>Gets whether the heading names an angle.</summary>
    public bool IsAngle => Kind is HeadingKind.Theta or HeadingKind.Phi or HeadingKind.Azimuth or HeadingKind.Elevation or HeadingKind.Roll or HeadingKind.Angle;

    /// <summary>Gets whether anything was understood.</summary>
    public bool IsKnown => Kind != HeadingKind.Unknown || IsAcross;
}
