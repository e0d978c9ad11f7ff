namespace RangeReduce.Diagnostics;

/// <summary>Something doubtful or worth knowing that is carried to the report.</summary>
/// <param name="Severity">How much it matters.</param>
/// <param name="Code">A short stable name of the kind of remark, such as <c>fortran-exponent</c>.</param>
/// <param name="Text">One sentence.</param>
/// <param name="Place">Where it applies; null where it is about the run as a whole.</param>
/// <param name="State">The configuration state that it is about, where there is one.</param>
public sealed record Remark(RemarkSeverity Severity, string Code, string Text, SourcePlace? Place = null, string? State = null);
