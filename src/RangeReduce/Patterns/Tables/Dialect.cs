namespace RangeReduce.Patterns.Tables;

/// <summary>How a table separates its fields and writes its decimals.</summary>
/// <param name="Separator">The separating character; a blank stands for runs of blanks and tabs.</param>
/// <param name="Decimal">The decimal sign.</param>
internal readonly record struct Dialect(char Separator, char Decimal)
{
    /// <summary>Gets the separators that are tried, the least mistakable first.</summary>
    public static ReadOnlySpan<char> Separators => ['\t', ';', '|', ',', ' '];

    /// <summary>Gives whether runs of blanks separate the fields.</summary>
    public bool IsBlanks => Separator == ' ';

    /// <summary>Gives the separator in words.</summary>
    public string Words => Separator switch
    {
        '\t' => "tab",
        ';' => "semicolon",
        ',' => "comma",
        ' ' => "blanks",
        _ => "vertical bar",
    };
}
