namespace RangeReduce.Reporting.Model;

/// <summary>One remark as printed.</summary>
/// <param name="Label">Its severity in a word.</param>
/// <param name="Tone">The tone of the label.</param>
/// <param name="Text">Its sentence.</param>
/// <param name="Place">File, line and column; empty where there is none.</param>
public sealed record RemarkItem(string Label, TextTone Tone, string Text, string Place);
