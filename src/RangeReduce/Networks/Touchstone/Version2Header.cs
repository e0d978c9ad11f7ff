namespace RangeReduce.Networks.Touchstone;

/// <summary>What the keywords of a version 2 file say.</summary>
internal sealed class Version2Header
{
    /// <summary>Gets or sets the version.</summary>
    public required string Version { get; init; }

    /// <summary>Gets or sets [Number of Ports]; 0 until it is seen.</summary>
    public int Ports { get; set; }

    /// <summary>Gets or sets [Two-Port Data Order]: true for 21_12; null until it is seen.</summary>
    public bool? ColumnFirst { get; set; }

    /// <summary>Gets or sets [Number of Frequencies]; 0 until it is seen.</summary>
    public long Frequencies { get; set; }

    /// <summary>Gets or sets [Number of Noise Frequencies]; 0 until it is seen.</summary>
    public long NoiseFrequencies { get; set; }

    /// <summary>Gets the references of [Reference] in ohm; empty where there are none.</summary>
    public List<double> ReferenceOhm { get; } = [];

    /// <summary>Gets or sets the line of [Reference].</summary>
    public int ReferenceLine { get; set; }

    /// <summary>Gets or sets [Matrix Format].</summary>
    public MatrixFormat Format { get; set; } = MatrixFormat.Full;

    /// <summary>Gets or sets [Mixed-Mode Order]; null where the file is single-ended.</summary>
    public MixedModeOrder? MixedMode { get; set; }
}
