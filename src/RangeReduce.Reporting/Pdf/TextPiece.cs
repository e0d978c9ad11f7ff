using OxyPlot;

using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Pdf;

/// <summary>A wrapped text: heading, paragraph, caption or note.</summary>
internal sealed class TextPiece : FlowPiece
{
    private const float MarkRoom = 12f;

    private readonly IReadOnlyList<TextLine> _lines;
    private readonly float _size;

    /// <summary>Wraps a text.</summary>
    /// <param name="text">The text.</param>
    /// <param name="size">Size of the letters.</param>
    /// <param name="width">Width of the line.</param>
    /// <param name="mark">Marker and colour of a state that stand before the text; null for none.</param>
    public TextPiece(RichText text, float size, float width, (MarkerType Marker, OxyColor Color)? mark = null)
    {
        (_size, Mark) = (size, mark);
        _lines = TextWrapper.Wrap(text, size, width - Indent);
    }

    /// <inheritdoc/>
    public override float Height => _lines.Count * _size * TextWrapper.Leading;

    private (MarkerType Marker, OxyColor Color)? Mark { get; }

    private float Indent => Mark is null ? 0f : MarkRoom;

    /// <inheritdoc/>
    public override void Draw(PageBrush brush, float x, float y)
    {
        var baseline = y + (_size * (TextMeter.Ascent + (0.5f * (TextWrapper.Leading - TextMeter.Ascent - TextMeter.Descent))));
        if (Mark is { } mark)
        {
            brush.DrawMark(mark.Marker, mark.Color, x + 4f, baseline - (0.36f * _size), 3.1f);
        }

        foreach (var line in _lines)
        {
            brush.DrawLine(line, _size, x + Indent, baseline);
            baseline += _size * TextWrapper.Leading;
        }
    }
}
