using System.Globalization;

namespace RangeReduce.Diagnostics;

/// <summary>A place in a file that a person can go to.</summary>
/// <param name="File">Path as the user knows it: relative to the measurement folder where there is one.</param>
/// <param name="Line">Line number from 1; 0 where the whole file is meant.</param>
/// <param name="Column">Column number from 1, counted in characters; 0 where the whole line is meant.</param>
public readonly record struct SourcePlace(string File, int Line = 0, int Column = 0)
{
    /// <summary>Gives file, line and column joined by colons; parts that are 0 are left out.</summary>
    public override string ToString() => (Line, Column) switch
    {
        ( <= 0, _) => File,
        (_, <= 0) => string.Create(CultureInfo.InvariantCulture, $"{File}:{Line}"),
        _ => string.Create(CultureInfo.InvariantCulture, $"{File}:{Line}:{Column}"),
    };
}
