using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting;

/// <summary>A report as a list of sections whose every number is already text; the PDF, the HTML and the PNG writers only set it.</summary>
public sealed record ReportModel
{
    /// <summary>Gets the title: the name of the run.</summary>
    public required string Title { get; init; }

    /// <summary>Gets what stands under the title: item, laboratory and date.</summary>
    public required string Subtitle { get; init; }

    /// <summary>Gets the options that it was built with.</summary>
    public required ReportOptions Options { get; init; }

    /// <summary>Gets when and by what it was made, as printed on each page.</summary>
    public required string MadeText { get; init; }

    /// <summary>Gets the names of the configuration states in the order of their colours.</summary>
    public required IReadOnlyList<string> States { get; init; }

    /// <summary>Gets the sections in order.</summary>
    public required IReadOnlyList<ReportSection> Sections { get; init; }

    /// <summary>Gets every plot in the order of the report.</summary>
    public IEnumerable<Plots.PlotFigure> Plots => Sections.SelectMany(section => section.Blocks).SelectMany(block => block switch
    {
        PlotRowBlock row => row.Plots,
        _ => [],
    });
}
