using RangeReduce.Reporting.Fonts;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Plots side by side, each with its caption below.</summary>
internal sealed class PlotRowPiece : FlowPiece
{
    private const float Gap = 14f;
    private const float CaptionSize = 7.5f;
    private const float CaptionGap = 3f;

    private readonly List<(PlotFigure Figure, float X, float Width, float Height, IReadOnlyList<TextLine> Caption)> _plots = [];

    /// <summary>Shares the line among the plots.</summary>
    /// <param name="plots">The plots.</param>
    /// <param name="width">Width of the line.</param>
    public PlotRowPiece(IReadOnlyList<PlotFigure> plots, float width)
    {
        var free = width - (Gap * (plots.Count - 1));
        var shares = plots.Sum(plot => plot.WidthShare);
        var x = 0f;
        foreach (var plot in plots)
        {
            var own = (float)(free * plot.WidthShare / Math.Max(1.0, shares));
            _plots.Add((plot, x, own, (float)(own * plot.Aspect), TextWrapper.Wrap(plot.Caption, CaptionSize, own - 4f)));
            x += own + Gap;
        }

        Height = PlotHeight + CaptionGap + _plots.Max(plot => plot.Caption.Count * CaptionSize * TextWrapper.Leading);
    }

    /// <inheritdoc/>
    public override float Height { get; }

    private float PlotHeight => _plots.Max(plot => plot.Height);

    /// <inheritdoc/>
    public override void Draw(PageBrush brush, float x, float y)
    {
        foreach (var (figure, left, width, height, caption) in _plots)
        {
            // Frames of plots in a row end on one line.
            brush.DrawPlot(figure, x + left, y + PlotHeight - height, width, height);
            var baseline = y + PlotHeight + CaptionGap + (CaptionSize * TextMeter.Ascent);
            foreach (var line in caption)
            {
                brush.DrawLine(line, CaptionSize, x + left + 2f, baseline);
                baseline += CaptionSize * TextWrapper.Leading;
            }
        }
    }
}
