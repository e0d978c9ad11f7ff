using OxyPlot;

namespace RangeReduce.Reporting.Plots;

/// <summary>A plot as the report model holds it: what it is called, what it shows, and how it is drawn.</summary>
public sealed record PlotFigure
{
    /// <summary>Gets the file name without ending, unique in the report.</summary>
    public required string FileName { get; init; }

    /// <summary>Gets the kind of plot in words.</summary>
    public required string Kind { get; init; }

    /// <summary>Gets the caption.</summary>
    public required string Caption { get; init; }

    /// <summary>Gets what a reader who cannot see the plot is told.</summary>
    public required string AlternativeText { get; init; }

    /// <summary>Gets the share of the line that the plot takes, above 0 and at most 1.</summary>
    public double WidthShare { get; init; } = 1.0;

    /// <summary>Gets the height over the width.</summary>
    public required double Aspect { get; init; }

    /// <summary>Gets how values under the pointer are printed; null where the plot has no such reading.</summary>
    internal PlotReadout? Readout { get; init; }

    /// <summary>Gets the maker of a fresh plot. Each writer takes its own, because a plot keeps the layout of its last drawing.</summary>
    public required Func<PlotModel> Make { get; init; }
}
