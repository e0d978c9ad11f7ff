namespace RangeReduce.Reporting.Model;

/// <summary>Something that stands in a section.</summary>
public abstract record ReportBlock;
