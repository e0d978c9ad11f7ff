namespace RangeReduce.Reporting;

/// <summary>Paper of the PDF report.</summary>
public enum PaperSize
{
    /// <summary>210 mm by 297 mm (ISO 216).</summary>
    A4,

    /// <summary>8.5 in by 11 in (ANSI A).</summary>
    Letter,
}
