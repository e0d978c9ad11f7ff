namespace RangeReduce.Reporting;

/// <summary>What the caller decides about a report.</summary>
public sealed record ReportOptions
{
    /// <summary>Gets the paper of the PDF; A4 unless said otherwise.</summary>
    public PaperSize Paper { get; init; } = PaperSize.A4;

    /// <summary>Gets when the report was made: the only date that is not out of the measurement folder.</summary>
    public required DateTimeOffset Made { get; init; }

    /// <summary>Gets the version of the program, as printed.</summary>
    public required string Version { get; init; }
}
