namespace RangeReduce.Patterns.Tables;

/// <summary>A column of samples and where they belong.</summary>
internal sealed record ValueColumn
{
    /// <summary>Gets the index of the column in the file.</summary>
    public required int Column { get; init; }

    /// <summary>Gets the heading.</summary>
    public required Heading Heading { get; init; }

    /// <summary>Gets the channel.</summary>
    public required string Channel { get; init; }

    /// <summary>Gets the part of the channel.</summary>
    public required ChannelPart Part { get; init; }

    /// <summary>Gets the factor to the base unit.</summary>
    public double Factor { get; init; } = 1.0;

    /// <summary>Gets the slot that the column itself fixes (see <see cref="TableKey"/>); -1 in the long form.</summary>
    public int AcrossSlot { get; init; } = -1;

    /// <summary>Gets the value that the column fixes, in hertz or degrees.</summary>
    public double Across { get; init; } = double.NaN;

    /// <summary>Gives whether the samples are decibels.</summary>
    public bool IsDecibel => Part is ChannelPart.Level or ChannelPart.ReturnLoss;
}
