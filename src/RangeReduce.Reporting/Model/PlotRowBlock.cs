using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Model;

/// <summary>Plots side by side; on a narrow screen one under the other.</summary>
/// <param name="Plots">One plot or a few; their widths share the line by <see cref="PlotFigure.WidthShare"/>.</param>
public sealed record PlotRowBlock(IReadOnlyList<PlotFigure> Plots) : ReportBlock;
