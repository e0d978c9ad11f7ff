namespace RangeReduce.Reporting;

/// <summary>Marks the assembly that holds the fonts and other embedded files.</summary>
internal static class ReportingAssembly;
