using System.Globalization;
using System.Text;

using RangeReduce.Reporting.Html;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting;

/// <summary>Sets a report as one HTML file that asks the network for nothing, reads without scripts, and is well-formed XML.</summary>
/// <remarks>The same model gives the same bytes.</remarks>
public static class HtmlReportWriter
{
    /// <summary>Writes a report.</summary>
    /// <param name="model">The report.</param>
    /// <param name="target">Where the HTML goes, in UTF-8; it is left open.</param>
    public static void Write(ReportModel model, Stream target)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(target);
        var styles = new StateStyles(model.States);
        var plots = model.Plots.ToArray();
        var drawn = new string[plots.Length];
        Parallel.For(0, plots.Length, at => drawn[at] = SvgPlot.Draw(plots[at], string.Create(CultureInfo.InvariantCulture, $"p{at + 1}")));
        var svg = plots.Zip(drawn).ToDictionary(pair => pair.First.FileName, pair => pair.Second, StringComparer.Ordinal);

        using var writer = new StreamWriter(target, new UTF8Encoding(false), 1 << 16, leaveOpen: true) { NewLine = "\n" };
        WriteHead(writer, model);
        WriteBody(writer, model, styles, svg);
    }

    private static void WriteHead(StreamWriter writer, ReportModel model)
    {
        // The policy forbids what the file does not need: a reader can trust that opening it sends nothing anywhere.
        writer.Write("<!DOCTYPE html>\n<html lang=\"en\"><head><meta charset=\"utf-8\"/>\n");
        writer.Write("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline'; script-src 'unsafe-inline'; font-src data:\"/>\n");
        writer.Write("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/><meta name=\"color-scheme\" content=\"light dark\"/>\n");
        writer.Write($"<title>{HtmlText.Of(model.Title)}</title>\n<style>\n{Font("DejaVuSans", 400)}{Font("DejaVuSans-Bold", 700)}");
        writer.Write(Encoding.UTF8.GetString(ReportingAssembly.ReadFile("Html/report.css")));
        writer.Write("</style></head>\n");
    }

    private static string Font(string name, int weight) => string.Create(
        CultureInfo.InvariantCulture,
        $"@font-face{{font-family:\"Report Sans\";font-weight:{weight};src:url(data:font/woff2;base64,{Convert.ToBase64String(ReportingAssembly.ReadFile($"Fonts/{name}.woff2"))}) format(\"woff2\")}}\n");

    private static void WriteBody(StreamWriter writer, ReportModel model, StateStyles styles, Dictionary<string, string> svg)
    {
        writer.Write($"<body><header><h1>{HtmlText.Of(model.Title)}</h1><p class=\"quiet\">{HtmlText.Of(model.Subtitle)}</p></header>\n<nav aria-label=\"Contents\"><ol>");
        foreach (var section in model.Sections)
        {
            writer.Write($"<li><a href=\"#{HtmlText.Of(section.Id)}\">{HtmlText.Of(section.Title)}</a></li>");
        }

        writer.Write("</ol></nav>\n<main>\n");
        for (var at = 0; at < model.Sections.Count; at++)
        {
            var section = model.Sections[at];
            writer.Write(string.Create(CultureInfo.InvariantCulture, $"<section aria-labelledby=\"{section.Id}\"><h2 id=\"{section.Id}\">{at + 1}\u00A0 {HtmlText.Of(section.Title)}</h2>\n"));
            foreach (var block in section.Blocks)
            {
                writer.Write(Block(block, styles, svg));
            }

            writer.Write("</section>\n");
        }

        writer.Write($"</main>\n<footer><p>{HtmlText.Of(model.MadeText)}</p></footer>\n<script>/*<![CDATA[*/\n");
        writer.Write(Encoding.UTF8.GetString(ReportingAssembly.ReadFile("Html/report.js")));
        writer.Write("/*]]>*/</script></body></html>\n");
    }

    private static string Block(ReportBlock block, StateStyles styles, Dictionary<string, string> svg) => block switch
    {
        HeadingBlock heading => $"<h3 id=\"{HtmlText.Of(heading.Id)}\">{Mark(styles, heading.State)}{HtmlText.Of(heading.Text)}</h3>\n",
        ParagraphBlock paragraph => $"<p{(paragraph.Lead ? " class=\"lead\"" : string.Empty)}>{Mark(styles, paragraph.State)}{HtmlText.Of(paragraph.Text)}</p>\n",
        TableBlock table => HtmlTable.Of(table, styles),
        PlotRowBlock row => $"<div class=\"row\">{string.Concat(row.Plots.Select(plot => Figure(plot, svg[plot.FileName])))}</div>\n",
        RemarkListBlock remarks => $"<ul class=\"remarks\">{string.Concat(remarks.Items.Select(Remark))}</ul>\n",
        _ => throw new InvalidOperationException($"No HTML is known for {block.GetType().Name}."),
    };

    private static string Mark(StateStyles styles, string? state) => state is null ? string.Empty : HtmlText.Mark(styles, state);

    private static string Figure(PlotFigure plot, string svg) => string.Create(
        CultureInfo.InvariantCulture,
        $"<figure style=\"flex:{plot.WidthShare:0.##} 1 {(plot.WidthShare > 0.9 ? 30 : 17)}rem\"><div class=\"plot{(plot.WidthShare > 0.9 ? " wide" : string.Empty)}\" tabindex=\"0\">{svg}</div><figcaption>{HtmlText.Of(plot.Caption)}</figcaption></figure>\n");

    private static string Remark(RemarkItem item) =>
        $"<li><span class=\"label {HtmlText.ClassOf(item.Tone)}\">{HtmlText.Of(item.Label)}</span> {HtmlText.Of(item.Text)}{(item.Place.Length == 0 ? string.Empty : $" <code>{HtmlText.Of(item.Place)}</code>")}</li>\n";
}
