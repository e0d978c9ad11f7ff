using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Widths and decimal points of a table's columns.</summary>
internal sealed class TableLayout
{
    private readonly float[] _points;

    /// <summary>Measures a table.</summary>
    public TableLayout(TableBlock table, float width, StateStyles styles)
    {
        (Columns, Width, Styles) = (table.Columns, width, styles);
        (Size, Widths) = TableMeasure.Fit(table, width);
        _points = [.. table.Columns.Select((_, at) => table.Rows
            .Select(row => TableMeasure.AtPoint(row.Cells[at].Plain) is { } parts ? TextMeter.Width(parts.Left, FaceAt(row.Cells[at]), Size) : 0f)
            .DefaultIfEmpty(0f).Max())];
    }

    /// <summary>Gets the size of the letters.</summary>
    public float Size { get; }

    /// <summary>Gets the columns.</summary>
    public IReadOnlyList<TableColumn> Columns { get; }

    /// <summary>Gets the widths without gaps.</summary>
    public float[] Widths { get; }

    /// <summary>Gets the width of the table.</summary>
    public float Width { get; }

    /// <summary>Gets the styles of the states.</summary>
    public StateStyles Styles { get; }

    /// <summary>Gives the left end of a column.</summary>
    public float Left(int column) => Widths.Take(column).Sum() + (column * TableMeasure.Gap(Widths.Length));

    /// <summary>Gives how far a line is moved to the right so that its decimal point stands below the others.</summary>
    public float Shift(int column, TextLine line)
    {
        if (Columns[column].Alignment != ColumnAlignment.DecimalPoint || line.Words.Count == 0)
        {
            return 0f;
        }

        var text = string.Concat(line.Words.Select(word => word.Text));
        return TableMeasure.AtPoint(text) is { } parts
            ? Math.Max(0f, _points[column] - TextMeter.Width(parts.Left, TextWrapper.FaceOf(line.Words[0].Span), Size))
            : Math.Clamp(_points[column] - TextMeter.Width("0", TextFace.Regular, Size), 0f, Math.Max(0f, Widths[column] - line.Width));
    }

    private static TextFace FaceAt(RichText text) => text.Spans.Count == 0 ? TextFace.Regular : TextWrapper.FaceOf(text.Spans[0]);
}
