using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 4: what changes over frequency.</summary>
internal static class OverFrequencySection
{
    /// <summary>Makes the section; null where there is nothing over frequency but the match.</summary>
    public static ReportSection? Build(ReportContext context)
    {
        var level = context.States.Any(state => context.LevelQuantity(state) == QuantityCatalogue.Gain) ? QuantityCatalogue.Gain : QuantityCatalogue.Level;
        var levels = new[] { FieldComponent.Right, FieldComponent.Left }.Select(component => Plot(context, level, component, "on the axis", null)).OfType<PlotFigure>().ToList();
        if (levels.Count == 0 && Plot(context, level, FieldComponent.Total, "on the axis", null) is { } total)
        {
            levels.Add(total);
        }

        var others = new[]
        {
            Plot(context, QuantityCatalogue.AxialRatio, FieldComponent.None, "on the axis", 3.0),
            Plot(context, QuantityCatalogue.CrossPolarRatio, FieldComponent.None, "on the axis", null),
            Plot(context, QuantityCatalogue.HalfPowerBeamwidth, FieldComponent.None, string.Empty, null),
        }.OfType<PlotFigure>();
        var blocks = levels.Concat(others).Chunk(2).Select(pair => (ReportBlock)new PlotRowBlock(pair)).ToList();
        return blocks.Count == 0 ? null : new("over-frequency", "Over frequency", blocks);
    }

    private static PlotFigure? Plot(ReportContext context, Quantity quantity, FieldComponent component, string place, double? limit)
    {
        var traces = context.Reduced.Table.TracesOf(quantity).Where(trace => trace.Axis == TraceAxis.Frequency && trace.X.Length > 1).ToList();
        if (traces.Count == 0)
        {
            return null;
        }

        var unit = FrequencyUnit.For(traces.Max(trace => trace.X[^1]));
        var curves = CurveSource.OverFrequency(context, quantity, unit, component);
        var (least, most) = PlotCurve.Range(curves);
        if (double.IsNaN(most))
        {
            return null;
        }

        const double MostAxialRatioDb = 20.0;
        var isRatio = quantity == QuantityCatalogue.AxialRatio;
        var scale = isRatio ? AxisScale.Outward(0.0, Math.Clamp(most, 4.0, MostAxialRatioDb), 5) : AxisScale.Outward(least, most, 5);
        var printed = UnitText.Of(quantity, component);
        var name = component == FieldComponent.None ? quantity.Name : $"{Words.Of(component)} {quantity.Name}";
        var cut = traces.Where(trace => trace.Component == component || component == FieldComponent.None).Select(trace => Words.Cut(trace.PhiDeg, trace.ThetaDeg)).FirstOrDefault(text => text.Length > 0);
        var caption = $"{Words.Capital(name)}{(place.Length == 0 ? string.Empty : " " + place)} over frequency{(cut is null ? string.Empty : $", from the cut {cut}")}."
            + (isRatio && most > scale.Maximum ? $" Values above {UnitText.Join(NumberText.Fixed(scale.Maximum, 0), "dB")} are not drawn." : string.Empty);
        var (first, last) = (curves.Min(curve => curve.X[0]), curves.Max(curve => curve.X[^1]));
        return new PlotFigure
        {
            FileName = $"frequency-{quantity.Id}{(component == FieldComponent.None ? string.Empty : "-" + Words.Of(component))}",
            Kind = $"{quantity.Name} over frequency",
            Caption = caption,
            AlternativeText = $"{Words.Capital(name)} {place} over frequency of {Words.List([.. curves.Select(curve => curve.State).OfType<string>().Distinct(StringComparer.Ordinal)])}.",
            WidthShare = 0.5,
            Aspect = 0.74,
            Readout = new("f", unit.Name, 4, printed, 1),
            Make = () => CurvePlot.Make(curves, LegendEntry.ForStates(curves, context.Styles), unit.Title, AxisScale.Within(first, last, 5), PlotFrame.Title(name, printed), scale, limit, limit is { } value ? UnitText.Join(NumberText.Trimmed(value, 1), printed) : string.Empty),
        };
    }
}
