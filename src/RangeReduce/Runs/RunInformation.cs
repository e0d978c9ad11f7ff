namespace RangeReduce.Runs;

/// <summary>What the manifest says about the run as a whole; null where it does not say.</summary>
public sealed record RunInformation
{
    /// <summary>Gets the name; the name of the folder where the manifest gives none.</summary>
    public required string Name { get; init; }

    /// <summary>Gets the folder, as given on the command line.</summary>
    public required string Folder { get; init; }

    /// <summary>Gets the date as YYYY-MM-DD.</summary>
    public string? Date { get; init; }

    /// <summary>Gets who took the data.</summary>
    public string? Operator { get; init; }

    /// <summary>Gets the chamber or range.</summary>
    public string? Chamber { get; init; }

    /// <summary>Gets free notes.</summary>
    public string? Notes { get; init; }

    /// <summary>Gets the antenna under test.</summary>
    public string? Antenna { get; init; }

    /// <summary>Gets its serial number.</summary>
    public string? Serial { get; init; }

    /// <summary>Gets words to find the run by.</summary>
    public IReadOnlyList<string> Tags { get; init; } = [];

    /// <summary>Gets the statements for the report head (laboratory, customer, item, method, issued-by, ...) by their key in the manifest.</summary>
    public IReadOnlyDictionary<string, string> ReportFields { get; init; } = new Dictionary<string, string>(StringComparer.Ordinal);
}
