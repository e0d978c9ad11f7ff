namespace RangeReduce.Reporting.Model;

/// <summary>Starts a page in print; nothing on a screen.</summary>
public sealed record PageBreakBlock : ReportBlock;
