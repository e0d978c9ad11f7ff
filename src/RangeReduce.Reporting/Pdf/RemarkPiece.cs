using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Pdf;

/// <summary>A remark: its severity in the margin of the text, its sentence, its place.</summary>
internal sealed class RemarkPiece : FlowPiece
{
    private const float LabelRoom = 42f;
    private const float Size = 8f;

    private readonly TextLine _label;
    private readonly IReadOnlyList<TextLine> _text;

    /// <summary>Wraps a remark.</summary>
    public RemarkPiece(RemarkItem item, float width)
    {
        _label = new([new(item.Label, new TextSpan(item.Label) { Strong = true, Tone = item.Tone }, 0f, LabelRoom)]);
        var text = RichText.FromString(item.Text);
        _text = TextWrapper.Wrap(item.Place.Length == 0 ? text : text.Then("  ").Then(new RichText([new TextSpan(item.Place) { Code = true, Tone = TextTone.Quiet }])), Size, width - LabelRoom);
    }

    /// <inheritdoc/>
    public override float Height => _text.Count * Size * TextWrapper.Leading;

    /// <inheritdoc/>
    public override void Draw(PageBrush brush, float x, float y)
    {
        var baseline = y + (Size * TextMeter.Ascent);
        brush.DrawLine(_label, Size, x, baseline);
        foreach (var line in _text)
        {
            brush.DrawLine(line, Size, x + LabelRoom, baseline);
            baseline += Size * TextWrapper.Leading;
        }
    }
}
