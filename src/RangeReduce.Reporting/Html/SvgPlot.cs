using System.Globalization;
using System.Net;

using OxyPlot;

using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Html;

/// <summary>Makes the SVG element of a plot, with what a script needs to turn a point of the screen into a value.</summary>
internal static class SvgPlot
{
    // The width of the text on paper, in points: letters have the same size beside the text as there.
    private const double LineWidth = 490.0;

    /// <summary>Draws a plot.</summary>
    /// <param name="figure">The plot.</param>
    /// <param name="id">Begins the ids of the plot, unique in the document.</param>
    public static string Draw(PlotFigure figure, string id)
    {
        var width = LineWidth * figure.WidthShare;
        var height = width * figure.Aspect;
        var context = new SvgPlotContext(id);
        var model = figure.Make();
        ((IPlotModel)model).Update(true);
        ((IPlotModel)model).Render(context, new OxyRect(0, 0, width, height));
        return string.Create(CultureInfo.InvariantCulture, $"<svg viewBox=\"0 0 {width:0.##} {height:0.##}\" role=\"img\" aria-label=\"{WebUtility.HtmlEncode(figure.AlternativeText)}\"{Reading(figure, model)}>\n{context}</svg>");
    }

    private static string Reading(PlotFigure figure, PlotModel model)
    {
        if (figure.Readout is not { } readout)
        {
            return string.Empty;
        }

        var (x, y) = (model.Axes.First(axis => string.Equals(axis.Key, PlotFrame.XKey, StringComparison.Ordinal)), model.Axes.First(axis => string.Equals(axis.Key, PlotFrame.YKey, StringComparison.Ordinal)));
        var names = string.Create(CultureInfo.InvariantCulture, $" data-names=\"{readout.XName}|{readout.XUnit}|{readout.XDecimals}|{readout.YUnit}|{readout.YDecimals}\"");
        if (readout.PolarFloor is { } floor)
        {
            var (cx, cy) = (x.Transform(0.0), y.Transform(0.0));
            return names + string.Create(CultureInfo.InvariantCulture, $" data-polar=\"{cx:0.##} {cy:0.##} {x.Transform(1.0) - cx:0.##} {floor} {readout.PolarTop}\"");
        }

        return names + string.Create(
            CultureInfo.InvariantCulture,
            $" data-x=\"{x.Transform(x.ActualMinimum):0.###} {x.Transform(x.ActualMaximum):0.###} {x.ActualMinimum} {x.ActualMaximum}\" data-y=\"{y.Transform(y.ActualMinimum):0.###} {y.Transform(y.ActualMaximum):0.###} {y.ActualMinimum} {y.ActualMaximum}\"");
    }
}
