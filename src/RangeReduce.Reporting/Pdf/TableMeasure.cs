using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Gives the columns of a table their widths.</summary>
internal static class TableMeasure
{
    /// <summary>Room of the mark in the heading of a state's column.</summary>
    public const float MarkRoom = 9f;

    private static readonly float[] Sizes = [7.8f, 7.4f, 7.0f, 6.6f, 6.2f, 5.8f];

    /// <summary>Gives the space between columns: less where there are many.</summary>
    public static float Gap(int columns) => columns > 8 ? 6f : 10f;

    /// <summary>Measures a table at the largest size of letters at which no number and no word has to be broken.</summary>
    /// <returns>The size, and the width of each column without the gap; with the gaps the columns fill the line.</returns>
    public static (float Size, float[] Widths) Fit(TableBlock table, float width)
    {
        foreach (var size in Sizes)
        {
            var widths = Widths(table, size, width, out var fits);
            if (fits || size == Sizes[^1])
            {
                return (size, widths);
            }
        }

        throw new InvalidOperationException("There is no size of letters for tables.");
    }

    private static float[] Widths(TableBlock table, float size, float width, out bool fits)
    {
        var count = table.Columns.Count;
        var free = width - (Gap(count) * (count - 1));
        var (natural, least) = (new float[count], new float[count]);
        for (var at = 0; at < count; at++)
        {
            var column = table.Columns[at];
            var mark = column.State is null ? 0f : MarkRoom;
            var cells = table.Rows.Select(row => row.Cells[at]).ToList();
            natural[at] = Math.Max(mark + TextWrapper.Natural(column.Head.AsStrong(), size), Widest(cells, column.Alignment, size)) + 0.5f;

            // Only words of text may be broken, and only those that would take a third of the line.
            var words = column.Alignment == ColumnAlignment.DecimalPoint ? Widest(cells, column.Alignment, size)
                : Math.Min(Math.Max(free * 0.34f, free / count), cells.Select(cell => TextWrapper.WidestWord(cell, size)).DefaultIfEmpty(0f).Max());
            least[at] = Math.Max(words, mark + TextWrapper.WidestWord(column.Head.AsStrong(), size)) + 0.5f;
        }

        fits = least.Sum() <= free;

        return natural.Sum() <= free ? Widen(natural, free) : Squeeze(natural, least, free);
    }

    /// <summary>Cuts a cell at its decimal point: what stands left of it and what follows; a word has no right part.</summary>
    public static (string Left, string Right)? AtPoint(string text)
    {
        var digits = text.AsSpan().TrimStart(Formatting.NumberText.Minus);
        if (digits.Length == 0 || !char.IsAsciiDigit(digits[0]))
        {
            return null;
        }

        var end = text.Length - digits.Length;
        while (end < text.Length && char.IsAsciiDigit(text[end]))
        {
            end++;
        }

        return (text[..end], text[end..]);
    }

    private static float Widest(List<RichText> cells, ColumnAlignment alignment, float size)
    {
        var widest = cells.Select(cell => TextWrapper.Natural(cell, size)).DefaultIfEmpty(0f).Max();
        if (alignment == ColumnAlignment.DecimalPoint)
        {
            var parts = cells.Select(cell => AtPoint(cell.Plain)).OfType<(string Left, string Right)>().ToList();
            widest = parts.Count == 0 ? widest : Math.Max(widest, parts.Max(part => TextWrapper.Natural(part.Left, size)) + parts.Max(part => TextWrapper.Natural(part.Right, size)));
        }

        return widest;
    }

    // Spare room goes to all columns alike up to a point, and then to the last.
    private static float[] Widen(float[] natural, float free)
    {
        var spare = free - natural.Sum();
        var each = Math.Min(spare / natural.Length, 30f);
        var widths = Array.ConvertAll(natural, width => width + each);
        widths[^1] += spare - (each * natural.Length);
        return widths;
    }

    // Columns that are narrow by nature keep their width; the others share what is left by their wish, and none gets less than its widest word.
    private static float[] Squeeze(float[] natural, float[] least, float free)
    {
        var widths = new float[natural.Length];
        var open = Enumerable.Range(0, natural.Length).ToList();
        var left = free;
        while (open.Count > 0)
        {
            var fair = left / open.Count;
            var narrow = open.FindAll(at => natural[at] <= fair);
            if (narrow.Count == 0)
            {
                break;
            }

            narrow.ForEach(at => widths[at] = natural[at]);
            left -= narrow.Sum(at => natural[at]);
            open.RemoveAll(narrow.Contains);
        }

        var floor = open.Sum(at => least[at]);
        var wish = Math.Max(1f, open.Sum(at => natural[at] - least[at]));
        foreach (var at in open)
        {
            widths[at] = floor <= left ? least[at] + ((left - floor) * (natural[at] - least[at]) / wish) : left * least[at] / floor;
        }

        return widths;
    }
}
