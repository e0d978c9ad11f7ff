using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>What all steps of reading one table share.</summary>
/// <param name="File">Path as the user knows it.</param>
/// <param name="Head">What stands over the samples.</param>
/// <param name="Options">What the reader was told.</param>
/// <param name="Remarks">Where remarks are collected.</param>
internal sealed record TableContext(string File, TableHead Head, TableOptions Options, List<Remark> Remarks)
{
    /// <summary>Gives the place of a heading.</summary>
    public SourcePlace HeadingPlace(int column) =>
        new(File, Head.HeadingLine, column < Head.HeadingColumns.Count ? Head.HeadingColumns[column] : 0);

    /// <summary>Gives the place of the line of headings.</summary>
    public SourcePlace HeadingsPlace => new(File, Head.HeadingLine);

    /// <summary>Adds a remark that is worth knowing.</summary>
    public void Note(string code, string text, SourcePlace? place = null) => Remarks.Add(new(RemarkSeverity.Note, code, text, place ?? HeadingsPlace));

    /// <summary>Adds a remark about something that may put a number in doubt.</summary>
    public void Doubt(string code, string text, SourcePlace? place = null) => Remarks.Add(new(RemarkSeverity.Doubt, code, text, place ?? HeadingsPlace));

    /// <summary>Finds the first metadata value whose key names the given kind, together with the unit of the key.</summary>
    public (string Value, HeadingUnit KeyUnit)? MetadataOf(HeadingKind kind)
    {
        foreach (var (key, value) in Head.Metadata)
        {
            var heading = HeadingParser.Parse(key);
            if (heading.Kind == kind && !heading.IsAcross)
            {
                return (value, heading.Unit);
            }
        }

        return null;
    }

    /// <summary>Finds the first metadata value under one of the keys.</summary>
    public string? Metadata(params ReadOnlySpan<string> keys)
    {
        foreach (var key in keys)
        {
            if (Head.Metadata.TryGetValue(key, out var value))
            {
                return value;
            }
        }

        return null;
    }
}
