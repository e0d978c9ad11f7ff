namespace RangeReduce.Reporting.Model;

/// <summary>Remarks, faults first.</summary>
/// <param name="Items">The remarks.</param>
public sealed record RemarkListBlock(IReadOnlyList<RemarkItem> Items) : ReportBlock;
