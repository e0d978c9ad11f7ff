using OxyPlot;

using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Turns traces of the table into curves of a plot.</summary>
internal static class CurveSource
{
    /// <summary>Gives the curves of a quantity over frequency, one a state and source.</summary>
    /// <param name="context">The queries.</param>
    /// <param name="quantity">The quantity.</param>
    /// <param name="unit">Unit of the abscissae.</param>
    /// <param name="component">The component; None where the quantity has none.</param>
    public static IReadOnlyList<PlotCurve> OverFrequency(ReportContext context, Quantity quantity, FrequencyUnit unit, FieldComponent component = FieldComponent.None)
    {
        var curves = new List<PlotCurve>();
        foreach (var state in context.States)
        {
            var traces = context.Traces(quantity, state).Where(trace => trace.Axis == TraceAxis.Frequency && (component == FieldComponent.None || trace.Component == component)).ToList();
            foreach (var source in new[] { DataSource.Measured, DataSource.Simulated })
            {
                var own = traces.Where(trace => trace.Source == source).MinBy(trace => trace.PhiDeg ?? trace.ThetaDeg ?? 0.0);
                if (own is not null && own.X.Length > 0)
                {
                    curves.Add(ForState(context, own, unit.Of(own.X)));
                }
            }
        }

        return curves;
    }

    /// <summary>Makes the curve of a trace in the style of its state and source.</summary>
    public static PlotCurve ForState(ReportContext context, Trace trace, double[] x) => new($"{trace.State}, {Words.Of(trace.Source ?? DataSource.Measured)}", x, Printed(trace))
    {
        State = trace.State,
        Color = context.Styles.ColorOf(trace.State),
        Marker = context.Styles.MarkerOf(trace.State),
        Dashed = trace.Source == DataSource.Simulated,
        Thickness = trace.Source == DataSource.Simulated ? 1.0 : 1.4,
    };

    /// <summary>Gives the trace along the angle of one cut; null where there is none.</summary>
    public static Trace? AlongCut(ReportContext context, Quantity quantity, CutKey cut, DataSource source, FieldComponent component) => context.Traces(quantity, cut.State)
        .FirstOrDefault(trace => trace.Axis == TraceAxis.Angle && trace.Source == source && trace.Component == component && cut.Holds(trace));

    /// <summary>Gives the curves of one cut: co-polar in the colour of the state, cross-polar grey; where neither is known, both components so.</summary>
    public static IReadOnlyList<PlotCurve> CoAndCross(ReportContext context, Quantity quantity, CutKey cut, out IReadOnlyList<LegendEntry> legend)
    {
        var pair = context.CoCross(cut.State);
        var (first, second) = pair ?? ComponentsOf(context, quantity, cut);
        var curves = new List<PlotCurve>();
        foreach (var source in new[] { DataSource.Measured, DataSource.Simulated })
        {
            foreach (var component in new[] { second, first })
            {
                if (component != FieldComponent.None && AlongCut(context, quantity, cut, source, component) is { } trace)
                {
                    curves.Add(ForComponent(context, trace, component == first));
                }
            }
        }

        var entries = new List<LegendEntry>
        {
            new(Words.Of(first) + (pair is null ? string.Empty : " (co)"), context.Styles.ColorOf(cut.State), context.Styles.MarkerOf(cut.State)),
        };
        if (second != FieldComponent.None)
        {
            entries.Add(new(Words.Of(second) + (pair is null ? string.Empty : " (cross)"), PlotPalette.Quiet));
        }

        LegendEntry.AddSources(entries, curves);
        legend = entries;
        return curves;
    }

    private static PlotCurve ForComponent(ReportContext context, Trace trace, bool isFirst) => new($"{Words.Of(trace.Component)}, {Words.Of(trace.Source ?? DataSource.Measured)}", trace.X, Printed(trace))
    {
        Color = isFirst ? context.Styles.ColorOf(trace.State) : PlotPalette.Quiet,
        Marker = isFirst ? context.Styles.MarkerOf(trace.State) : MarkerType.None,
        Dashed = trace.Source == DataSource.Simulated,
        Thickness = trace.Source == DataSource.Simulated ? 1.0 : isFirst ? 1.5 : 1.1,
    };

    private static (FieldComponent First, FieldComponent Second) ComponentsOf(ReportContext context, Quantity quantity, CutKey cut)
    {
        bool Has(FieldComponent component) => AlongCut(context, quantity, cut, DataSource.Measured, component) is not null || AlongCut(context, quantity, cut, DataSource.Simulated, component) is not null;
        return Has(FieldComponent.Right) && Has(FieldComponent.Left) ? (FieldComponent.Right, FieldComponent.Left)
            : Has(FieldComponent.Theta) ? (FieldComponent.Theta, Has(FieldComponent.Phi) ? FieldComponent.Phi : FieldComponent.None)
            : (Has(FieldComponent.Phi) ? FieldComponent.Phi : FieldComponent.Total, FieldComponent.None);
    }

    private static double[] Printed(Trace trace)
    {
        var factor = trace.Quantity.PrintFactor;
        return factor == 1.0 ? trace.Y : Array.ConvertAll(trace.Y, value => value * factor);
    }
}
