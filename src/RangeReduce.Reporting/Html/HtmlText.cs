using System.Net;
using System.Text;

using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Html;

/// <summary>Turns text and marks into HTML that is XML as well.</summary>
internal static class HtmlText
{
    /// <summary>Escapes text.</summary>
    public static string Of(string text) => WebUtility.HtmlEncode(text);

    /// <summary>Sets rich text.</summary>
    public static string Of(RichText text)
    {
        var html = new StringBuilder();
        foreach (var span in text.Spans)
        {
            html.Append(Of(span, span.Text));
        }

        return html.ToString();
    }

    /// <summary>Sets the first span's style about a text.</summary>
    public static string Of(TextSpan span, string text)
    {
        var html = Of(text);
        html = span.Code ? $"<code>{html.Replace(" ", " <wbr/>", StringComparison.Ordinal)}</code>" : html;
        html = span.Strong ? $"<strong>{html}</strong>" : html;
        html = span.Tone == TextTone.Normal ? html : $"<span class=\"{ClassOf(span.Tone)}\">{html}</span>";
        return span.LinkTo is { } anchor ? $"<a href=\"#{Of(anchor)}\">{html}</a>" : html;
    }

    /// <summary>Gives the class of a tone.</summary>
    public static string ClassOf(TextTone tone) => tone switch
    {
        TextTone.Quiet => "quiet",
        TextTone.Good => "good",
        TextTone.Doubt => "doubt",
        TextTone.Bad => "bad",
        _ => "normal",
    };

    /// <summary>Draws the mark of a state: its marker in its colour.</summary>
    public static string Mark(StateStyles styles, string state)
    {
        var at = styles.IndexOf(state);
        var role = $"f-{PlotPalette.RoleOf(StateStyles.ColorAt(at))}";
        var shape = StateStyles.MarkerAt(at) switch
        {
            OxyPlot.MarkerType.Square => "<rect x=\"2\" y=\"2\" width=\"8\" height=\"8\" class=\"{0}\"/>",
            OxyPlot.MarkerType.Triangle => "<polygon points=\"6,1 11,10 1,10\" class=\"{0}\"/>",
            OxyPlot.MarkerType.Diamond => "<polygon points=\"6,0.5 11.5,6 6,11.5 0.5,6\" class=\"{0}\"/>",
            _ => "<circle cx=\"6\" cy=\"6\" r=\"4.5\" class=\"{0}\"/>",
        };
        return $"<svg class=\"mark\" viewBox=\"0 0 12 12\" aria-hidden=\"true\">{shape.Replace("{0}", role, StringComparison.Ordinal)}</svg>";
    }
}
