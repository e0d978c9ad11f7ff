namespace RangeReduce.Reporting.Results;

/// <summary>When and by what a report was made: the only part that differs between two runs over the same input.</summary>
/// <param name="At">The time.</param>
/// <param name="Version">Version of the program.</param>
/// <param name="Seconds">How long the work took; NaN where it is not known.</param>
public sealed record ReportStamp(DateTimeOffset At, string Version, double Seconds = double.NaN);
