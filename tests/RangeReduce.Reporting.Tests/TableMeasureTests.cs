using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Pdf;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Tests;

public sealed class TableMeasureTests
{
    [Fact]
    public void Numbers_with_uncertainty_are_never_broken_however_many_columns_there_are()
    {
        var columns = Enumerable.Range(0, 7).Select(at => new TableColumn($"A long heading of several words {at}", ColumnAlignment.DecimalPoint)).Prepend(new("State"));
        var rows = new[] { "1.6162\u00A0±\u00A00.0014", "−13.6\u00A0+3.8/−5.5", "0.00955\u00A0±\u00A00.0007" }.Select(text => new TableRow(["right", .. Enumerable.Repeat(RichText.FromString(text), 7)]));
        var layout = new TableLayout(new TableBlock("Wide", [.. columns], [.. rows]), 495f, new StateStyles([]));
        Assert.True(layout.Size >= 5.8f);
        Assert.All(rows.SelectMany(row => row.Cells.Skip(1)), cell => Assert.True(TextMeter.Width(cell.Plain, TextFace.Regular, layout.Size) <= layout.Widths[1] + 0.1f));
        Assert.Equal(495f, layout.Widths.Sum() + (7 * TableMeasure.Gap(8)), 0.5f);
    }

    [Fact]
    public void Decimal_points_of_a_column_stand_below_each_other()
    {
        var texts = new[] { "7.39\u00A0±\u00A00.51", "−11.38", "112.5" };
        var layout = new TableLayout(new TableBlock("T", [new("Value", ColumnAlignment.DecimalPoint)], [.. texts.Select(text => new TableRow([text]))]), 300f, new StateStyles([]));
        var points = texts.Select(text => layout.Shift(0, TextWrapper.Wrap(text, layout.Size, 200f)[0]) + TextMeter.Width(text[..text.IndexOf('.', StringComparison.Ordinal)], TextFace.Regular, layout.Size)).ToList();
        Assert.All(points, point => Assert.Equal(points[0], point, 0.01f));
    }
}
