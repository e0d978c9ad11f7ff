using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Legends;

using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Plots;

/// <summary>The common look of plots: light frame and grid, dark data, a legend above the frame where it never covers data.</summary>
internal static class PlotFrame
{
    /// <summary>Size of the letters in points.</summary>
    public const double FontSize = 7.5;

    /// <summary>Key of the abscissa.</summary>
    public const string XKey = "x";

    /// <summary>Key of the ordinate.</summary>
    public const string YKey = "y";

    /// <summary>Makes an empty plot.</summary>
    public static PlotModel New() => new()
    {
        Background = OxyColors.Undefined,
        PlotAreaBorderColor = PlotPalette.Frame,
        PlotAreaBorderThickness = new OxyThickness(0.6),
        TextColor = PlotPalette.Ink,
        DefaultFontSize = FontSize,
        Padding = new OxyThickness(1, 3, 5, 1),
        AxisTierDistance = 0,
    };

    /// <summary>Makes an abscissa below the frame.</summary>
    public static LinearAxis Abscissa(string title, AxisScale scale) => Axis(XKey, AxisPosition.Bottom, title, scale);

    /// <summary>Makes an ordinate left of the frame.</summary>
    public static LinearAxis Ordinate(string title, AxisScale scale) => Axis(YKey, AxisPosition.Left, title, scale);

    /// <summary>Makes an axis.</summary>
    public static LinearAxis Axis(string key, AxisPosition position, string title, AxisScale scale) => new()
    {
        Key = key,
        Position = position,
        Title = title,
        Minimum = scale.Minimum,
        Maximum = scale.Maximum,
        MajorStep = scale.Step,
        MinorTickSize = 0,
        MajorTickSize = 3,
        TickStyle = TickStyle.Outside,
        TicklineColor = PlotPalette.Frame,
        AxislineColor = PlotPalette.Frame,
        MajorGridlineStyle = LineStyle.Solid,
        MajorGridlineColor = PlotPalette.Grid,
        MajorGridlineThickness = 0.5,
        TextColor = PlotPalette.Ink,
        TitleColor = PlotPalette.Ink,
        AxisTitleDistance = position == AxisPosition.Bottom ? 2 : 4,
        AxisTickToLabelDistance = 2,
        LabelFormatter = value => NumberText.Fixed(value, scale.Decimals),
        IsPanEnabled = false,
        IsZoomEnabled = false,
    };

    /// <summary>Adds curves; their first markers are moved against each other.</summary>
    public static void AddCurves(PlotModel plot, IReadOnlyList<PlotCurve> curves, string yKey = YKey)
    {
        for (var at = 0; at < curves.Count; at++)
        {
            var series = MarkedSeries.Of(curves[at], (double)at / curves.Count);
            (series.XAxisKey, series.YAxisKey) = (XKey, yKey);
            plot.Series.Add(series);
        }
    }

    /// <summary>Adds a legend of the given entries above the frame.</summary>
    public static void AddLegend(PlotModel plot, IReadOnlyList<LegendEntry> entries)
    {
        plot.Legends.Add(new Legend
        {
            LegendPlacement = LegendPlacement.Outside,
            LegendPosition = LegendPosition.TopLeft,
            LegendOrientation = LegendOrientation.Horizontal,
            LegendFontSize = FontSize,
            LegendTextColor = PlotPalette.Ink,
            LegendSymbolLength = 20,
            LegendSymbolMargin = 4,
            LegendItemSpacing = 12,
            LegendPadding = 0,
            LegendMargin = 2,
            LegendBorderThickness = 0,
            LegendBackground = OxyColors.Undefined,
        });
        foreach (var entry in entries)
        {
            plot.Series.Add(new MarkedSeries(null, entry.State, 0.0)
            {
                Title = entry.Text,
                RenderInLegend = true,
                Color = entry.Color,
                StrokeThickness = 1.3,
                Dashes = entry.Dashed ? [4.0, 2.5] : null!,
                SparseMarker = entry.Marker,
                XAxisKey = XKey,
                YAxisKey = YKey,
            });
        }
    }

    /// <summary>Gives the title of an axis: name with a capital letter and unit in brackets.</summary>
    public static string Title(string name, string unit) => unit.Length == 0 ? Words.Capital(name) : $"{Words.Capital(name)} ({unit})";
}
