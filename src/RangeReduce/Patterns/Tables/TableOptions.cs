namespace RangeReduce.Patterns.Tables;

/// <summary>What the reader of tables is told beside the file itself: meanings laid down by hand, fallbacks, and limits.</summary>
public sealed record TableOptions
{
    /// <summary>Gets meanings by heading (case does not matter) or by column number as text (<c>"1"</c> is the first). A meaning is written as a heading would be: <c>frequency [GHz]</c>, <c>theta [deg]</c>, <c>h re</c>, or <c>ignore</c>.</summary>
    public IReadOnlyDictionary<string, string> Columns { get; init; } = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);

    /// <summary>Gets the frequency in hertz where neither a column nor the preamble gives one; NaN for none.</summary>
    public double FrequencyHz { get; init; } = double.NaN;

    /// <summary>Gets the fixed angle of the cut in degrees where neither a column nor the preamble gives one; NaN for none.</summary>
    public double FixedDeg { get; init; } = double.NaN;

    /// <summary>Gets the name of the channel where the headings do not name it; null for none.</summary>
    public string? Channel { get; init; }

    /// <summary>Gets the longest line in bytes.</summary>
    public int MaxLineBytes { get; init; } = 4 << 20;

    /// <summary>Gets the highest number of columns.</summary>
    public int MaxColumns { get; init; } = 16_384;

    /// <summary>Gets the highest number of rows times value columns.</summary>
    public long MaxSamples { get; init; } = 2_000_000_000;
}
