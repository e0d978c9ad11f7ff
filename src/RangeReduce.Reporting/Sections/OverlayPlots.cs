using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Measured over simulated curves of one state, each with its difference strip.</summary>
internal static class OverlayPlots
{
    /// <summary>Makes the row of plots; null where there is no pair of curves.</summary>
    public static PlotRowBlock? Row(ReportContext context, string state, string name)
    {
        var plots = new[] { ReturnLoss(context, state, name), Cut(context, state, name) }.OfType<PlotFigure>().ToList();
        return plots.Count == 0 ? null : new(plots);
    }

    private static PlotFigure? ReturnLoss(ReportContext context, string state, string name)
    {
        Trace? Of(DataSource source) => context.Traces(QuantityCatalogue.ReturnLoss, state).FirstOrDefault(trace => trace.Axis == TraceAxis.Frequency && trace.Source == source && trace.X.Length > 1);
        if (Of(DataSource.Measured) is not { } measured || Of(DataSource.Simulated) is not { } simulated)
        {
            return null;
        }

        var unit = FrequencyUnit.For(measured.X[^1]);
        PlotCurve[] curves = [CurveSource.ForState(context, simulated, unit.Of(simulated.X)), CurveSource.ForState(context, measured, unit.Of(measured.X))];
        var difference = Difference(curves[1], curves[0]);
        var (least, most) = PlotCurve.Range(curves);
        var y = AxisScale.Outward(Math.Min(0.0, least), Math.Max(10.0, most), 4);
        return new PlotFigure
        {
            FileName = $"simulated-{name}-return-loss",
            Kind = "measured over simulated",
            Caption = $"State {state}: return loss, and measured minus simulated below (±{UnitText.Join(NumberText.Fixed(DifferencePlot.Reach(difference), 0), "dB")} at most).",
            AlternativeText = $"Return loss of state {state}, measured over simulated, with their difference.",
            WidthShare = 0.5,
            Aspect = 0.86,
            Readout = new("f", unit.Name, 4, "dB", 1),
            Make = () => DifferencePlot.Make(curves, difference, unit.Title, AxisScale.Within(curves[1].X[0], curves[1].X[^1], 5), "Return loss (dB)", y, downward: true),
        };
    }

    private static PlotFigure? Cut(ReportContext context, string state, string name)
    {
        if (CutKey.Of(context, state) is not [var cut, ..])
        {
            return null;
        }

        var quantity = context.LevelQuantity(state);
        var component = context.CoCross(state)?.Co ?? FieldComponent.Total;
        if (CurveSource.AlongCut(context, quantity, cut, DataSource.Measured, component) is not { } measured || CurveSource.AlongCut(context, quantity, cut, DataSource.Simulated, component) is not { } simulated)
        {
            return null;
        }

        PlotCurve[] curves = [CurveSource.ForState(context, simulated, simulated.X), CurveSource.ForState(context, measured, measured.X)];
        var difference = Difference(curves[1], curves[0]);
        var (_, most) = PlotCurve.Range(curves);
        var unit = UnitText.Of(quantity, component);
        var what = $"{Words.Of(component)} {quantity.Name}";
        return new PlotFigure
        {
            FileName = $"simulated-{name}-cut",
            Kind = "measured over simulated",
            Caption = $"State {state}: {what}, cut {cut.Text} at {FrequencyText.WithUnit(cut.FrequencyHz)}, and measured minus simulated below (±{UnitText.Join(NumberText.Fixed(DifferencePlot.Reach(difference), 0), "dB")} at most).",
            AlternativeText = $"{Words.Capital(what)} of state {state} along the cut {cut.Text}, measured over simulated, with their difference.",
            WidthShare = 0.5,
            Aspect = 0.86,
            Readout = new(cut.PhiDeg is null ? "φ" : "θ", "°", 1, unit, 1),
            Make = () => DifferencePlot.Make(curves, difference, cut.AngleTitle, CurvePlot.Angles(measured.X[0], measured.X[^1], wide: false), PlotFrame.Title(what, unit), CurvePlot.Levels(most, 40.0), downward: false),
        };
    }

    // At the measured abscissae, the simulated curve linear between its samples; nothing outside of them.
    private static PlotCurve Difference(PlotCurve measured, PlotCurve simulated)
    {
        var difference = new double[measured.X.Length];
        var above = 1;
        for (var at = 0; at < difference.Length; at++)
        {
            var x = measured.X[at];
            while (above < simulated.X.Length - 1 && simulated.X[above] < x)
            {
                above++;
            }

            var (x0, x1) = (simulated.X[above - 1], simulated.X[above]);
            var share = (x - x0) / (x1 - x0);
            difference[at] = share is < -1e-9 or > 1.0 + 1e-9 ? double.NaN : measured.Y[at] - (simulated.Y[above - 1] + (share * (simulated.Y[above] - simulated.Y[above - 1])));
        }

        return new("measured minus simulated", measured.X, difference);
    }
}
