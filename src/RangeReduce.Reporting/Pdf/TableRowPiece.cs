using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Pdf;

/// <summary>A row of a table, or its head.</summary>
internal sealed class TableRowPiece : FlowPiece
{
    private const float Padding = 2.1f;

    private readonly TableLayout _layout;
    private readonly List<IReadOnlyList<TextLine>> _cells = [];
    private readonly bool _isHead;
    private readonly bool _startsGroup;

    /// <summary>Wraps the cells of a row.</summary>
    /// <param name="layout">Widths and decimal points of the table.</param>
    /// <param name="cells">The cells.</param>
    /// <param name="isHead">Whether it is the head.</param>
    /// <param name="startsGroup">Whether a line stands above it.</param>
    public TableRowPiece(TableLayout layout, IReadOnlyList<RichText> cells, bool isHead, bool startsGroup)
    {
        (_layout, _isHead, _startsGroup) = (layout, isHead, startsGroup);
        for (var at = 0; at < cells.Count; at++)
        {
            var mark = isHead && layout.Columns[at].State is not null ? TableMeasure.MarkRoom : 0f;
            _cells.Add(TextWrapper.Wrap(cells[at], _layout.Size, layout.Widths[at] - mark));
        }

        Height = (Math.Max(1, _cells.Max(lines => lines.Count)) * _layout.Size * TextWrapper.Leading) + (2f * Padding);
    }

    /// <inheritdoc/>
    public override float Height { get; }

    /// <inheritdoc/>
    public override void Draw(PageBrush brush, float x, float y)
    {
        if (_startsGroup)
        {
            brush.DrawRule(x, x + _layout.Width, y, 0.4f, PlotPalette.Frame);
        }

        if (_isHead)
        {
            brush.DrawRule(x, x + _layout.Width, y + Height, 0.8f, PlotPalette.Ink);
        }

        for (var at = 0; at < _cells.Count; at++)
        {
            // Heads stand on the lower line of a head of several lines.
            var lines = _cells[at];
            var top = y + Padding + (_isHead ? Height - (2f * Padding) - (lines.Count * _layout.Size * TextWrapper.Leading) : 0f);
            var baseline = top + (_layout.Size * (TextMeter.Ascent + 0.07f));
            var left = x + _layout.Left(at);
            if (_isHead && _layout.Columns[at].State is { } state)
            {
                var mark = _layout.Styles.IndexOf(state);
                brush.DrawMark(StateStyles.MarkerAt(mark), StateStyles.ColorAt(mark), left + 3f, baseline - 2.8f, 2.6f);
                left += TableMeasure.MarkRoom;
            }

            foreach (var line in lines)
            {
                brush.DrawLine(line, _layout.Size, left + (_isHead ? 0f : _layout.Shift(at, line)), baseline);
                baseline += _layout.Size * TextWrapper.Leading;
            }
        }
    }
}
