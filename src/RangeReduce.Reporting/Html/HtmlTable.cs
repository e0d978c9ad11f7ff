using System.Globalization;
using System.Text;

using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Pdf;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Html;

/// <summary>Sets a table.</summary>
internal static class HtmlTable
{
    /// <summary>Sets a table with its caption and notes.</summary>
    public static string Of(TableBlock table, StateStyles styles)
    {
        var html = new StringBuilder("<div class=\"table\" tabindex=\"0\" role=\"region\" aria-label=\"Table\">");
        html.Append(table.Sortable ? "<table class=\"sortable\">" : "<table>");
        if (table.Caption.Spans.Count > 0)
        {
            html.Append("<caption>").Append(HtmlText.Of(table.Caption)).Append("</caption>");
        }

        html.Append("<thead><tr>");
        foreach (var column in table.Columns)
        {
            html.Append(column.Alignment == ColumnAlignment.DecimalPoint ? "<th scope=\"col\" class=\"num\">" : "<th scope=\"col\">");
            html.Append(column.State is { } state ? HtmlText.Mark(styles, state) : string.Empty).Append(HtmlText.Of(column.Head)).Append("</th>");
        }

        html.Append("</tr></thead><tbody>\n");
        var widths = Enumerable.Range(0, table.Columns.Count).Select(at => LeftDigits(table, at)).ToList();
        foreach (var row in table.Rows)
        {
            html.Append("<tr").Append(row.Id is { } id ? $" id=\"{HtmlText.Of(id)}\"" : string.Empty).Append(row.StartsGroup ? " class=\"group\">" : ">");
            for (var at = 0; at < row.Cells.Count; at++)
            {
                html.Append(table.Columns[at].Alignment == ColumnAlignment.DecimalPoint ? Number(row.Cells[at], widths[at]) : $"<td>{HtmlText.Of(row.Cells[at])}</td>");
            }

            html.Append("</tr>\n");
        }

        html.Append("</tbody></table></div>\n");
        foreach (var note in table.Notes)
        {
            html.Append("<p class=\"note\">").Append(HtmlText.Of(note)).Append("</p>\n");
        }

        return html.ToString();
    }

    private static int LeftDigits(TableBlock table, int column) =>
        table.Rows.Select(row => TableMeasure.AtPoint(row.Cells[column].Plain)?.Left.Length ?? 1).DefaultIfEmpty(1).Max();

    // What stands left of the decimal point fills a box as wide as the widest of the column, so that the points stand below each other.
    private static string Number(RichText cell, int digits)
    {
        if (cell.Spans.Count == 0)
        {
            return "<td class=\"num\"></td>";
        }

        var first = cell.Spans[0];
        var (left, right) = TableMeasure.AtPoint(first.Text) ?? (string.Empty, string.Empty);
        var pad = string.Create(CultureInfo.InvariantCulture, $"<span class=\"pad\" style=\"width:{(left.Length == 0 ? digits - 1 : digits - left.Length)}ch\"></span>");
        var text = left.Length == 0 ? first.Text : left + right;
        return $"<td class=\"num\">{pad}{HtmlText.Of(first, text)}{string.Concat(cell.Spans.Skip(1).Select(span => HtmlText.Of(span, span.Text)))}</td>";
    }
}
