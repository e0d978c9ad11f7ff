using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 2: reflection at the port.</summary>
internal static class MatchSection
{
    private const int MostMarks = 2;

    /// <summary>Makes the section; null where the run has no sweeps.</summary>
    public static ReportSection? Build(ReportContext context)
    {
        var traces = context.Reduced.Table.TracesOf(QuantityCatalogue.ReturnLoss).Where(trace => trace.Axis == TraceAxis.Frequency && trace.X.Length > 1).ToList();
        if (traces.Count == 0)
        {
            return null;
        }

        var unit = FrequencyUnit.For(traces.Max(trace => trace.X[^1]));
        var blocks = new List<ReportBlock> { new PlotRowBlock([ReturnLoss(context, unit)]) };
        var pair = new List<PlotFigure>();
        if (Vswr(context, unit) is { } vswr)
        {
            pair.Add(vswr);
        }

        if (ReflectionPlane(context) is { } plane)
        {
            pair.Add(plane);
        }

        if (pair.Count > 0)
        {
            blocks.Add(new PlotRowBlock(pair));
        }

        blocks.Add(ResonanceTable(context));
        if (BandTable(context) is { } bands)
        {
            blocks.Add(bands);
        }

        return new("match", "Match", blocks);
    }

    private static PlotFigure ReturnLoss(ReportContext context, FrequencyUnit unit)
    {
        var curves = CurveSource.OverFrequency(context, QuantityCatalogue.ReturnLoss, unit);
        var figures = context.Reduced.Table.Of(QuantityCatalogue.MatchBand).Where(band => band.LowHz is not null && band.HighHz is not null && band.State is not null).ToList();
        var threshold = figures.Count > 0 ? figures[0].Threshold : null;
        var bands = figures.Where(band => Nullable.Equals(band.Threshold, threshold)).OrderBy(band => context.Styles.IndexOf(band.State)).ThenBy(band => band.Source).ThenBy(band => band.Rank)
            .Select(band => new BandBar(band.State!, band.LowHz!.Value * unit.Factor, band.HighHz!.Value * unit.Factor, band.Source == DataSource.Simulated, $"{band.State} {BandText.Edges(band)}")).ToList();
        var marks = context.States.SelectMany(state => Marks(context, state, unit)).ToList();
        var text = Words.List([.. marks.Select(mark => $"{mark.State} {mark.Label}")]);
        var limit = threshold is { } value ? $" Bars: bands with a return loss of at least {UnitText.Join(NumberText.Trimmed(value, 1), "dB")}, full measured, outlined simulated." : string.Empty;
        return new PlotFigure
        {
            FileName = "match-return-loss",
            Kind = "return loss",
            Caption = $"Return loss over frequency; a better match lies lower. Rings mark resonances.{limit}",
            AlternativeText = $"Return loss over frequency of {Words.List(context.States)}. Resonances: {(text.Length == 0 ? "none" : text)}.",
            Aspect = 0.52,
            Readout = new("f", unit.Name, 4, "dB", 1),
            Make = () => ReturnLossPlot.Make(curves, unit, threshold, bands, marks, context.Styles),
        };
    }

    private static IEnumerable<ResonanceMark> Marks(ReportContext context, string state, FrequencyUnit unit) => context.Figures(QuantityCatalogue.ResonanceFrequency, state)
        .Where(figure => figure.Source == DataSource.Measured && double.IsFinite(figure.Value) && (figure.Rank ?? 1) <= MostMarks)
        .Select(figure => (Figure: figure, Loss: LossAt(context, figure)))
        .Where(pair => pair.Loss is not null)
        .Select(pair => new ResonanceMark(state, pair.Figure.Value * unit.Factor, pair.Loss!.Value, FrequencyText.Label(pair.Figure.Value)));

    private static double? LossAt(ReportContext context, Figure resonance) => context.Figures(QuantityCatalogue.ReturnLoss, resonance.State)
        .FirstOrDefault(figure => figure.At == FigurePlace.Resonance && figure.Source == resonance.Source && figure.Rank == resonance.Rank && double.IsFinite(figure.Value))?.Value;

    private static PlotFigure? Vswr(ReportContext context, FrequencyUnit unit)
    {
        const double Most = 5.0;
        var curves = CurveSource.OverFrequency(context, QuantityCatalogue.Vswr, unit);
        if (curves.Count == 0)
        {
            return null;
        }

        var (least, most) = (curves.Min(curve => curve.X[0]), curves.Max(curve => curve.X[^1]));
        return new PlotFigure
        {
            FileName = "match-vswr",
            Kind = "VSWR",
            Caption = $"Voltage standing wave ratio over frequency; values above {NumberText.Fixed(Most, 0)} are not drawn.",
            AlternativeText = $"Voltage standing wave ratio over frequency of {Words.List(context.States)}.",
            WidthShare = 0.55,
            Aspect = 0.86,
            Readout = new("f", unit.Name, 4, string.Empty, 2),
            Make = () => CurvePlot.Make(curves, LegendEntry.ForStates(curves, context.Styles), unit.Title, AxisScale.Within(least, most, 5), "VSWR", new AxisScale(1.0, Most, 0.5), 2.0, "2"),
        };
    }

    private static PlotFigure? ReflectionPlane(ReportContext context)
    {
        var curves = new List<PlotCurve>();
        var marks = new List<ResonanceMark>();
        foreach (var real in context.Reduced.Table.TracesOf(QuantityCatalogue.ReflectionReal))
        {
            var imaginary = context.Traces(QuantityCatalogue.ReflectionImaginary, real.State).FirstOrDefault(trace => trace.Source == real.Source && trace.X.Length == real.X.Length);
            if (imaginary is null)
            {
                continue;
            }

            curves.Add(CurveSource.ForState(context, real, real.Y) with { Y = imaginary.Y });
            var resonance = context.Figures(QuantityCatalogue.ResonanceFrequency, real.State).FirstOrDefault(figure => figure.Source == real.Source && (figure.Rank ?? 1) == 1 && double.IsFinite(figure.Value));
            if (resonance is not null && real.Source == DataSource.Measured)
            {
                var at = Nearest(real.X, resonance.Value);
                marks.Add(new(real.State ?? string.Empty, real.Y[at], imaginary.Y[at], string.Empty));
            }
        }

        if (curves.Count == 0)
        {
            return null;
        }

        return new PlotFigure
        {
            FileName = "match-reflection-plane",
            Kind = "complex reflection plane",
            Caption = "Reflection coefficient in its complex plane, |Γ| = 1 at the rim, with circles of constant resistance and reactance over the reference impedance. Rings mark the deepest resonances.",
            AlternativeText = $"Reflection coefficient in its complex plane for {Words.List(context.States)}; the nearer a curve comes to the centre, the better the match.",
            WidthShare = 0.45,
            Aspect = 1.05,
            Make = () => ReflectionPlanePlot.Make(curves, LegendEntry.ForStates(curves, context.Styles), marks, context.Styles),
        };
    }

    private static int Nearest(double[] x, double value)
    {
        var at = Array.BinarySearch(x, value);
        if (at >= 0)
        {
            return at;
        }

        var above = Math.Min(~at, x.Length - 1);
        return above > 0 && value - x[above - 1] < x[above] - value ? above - 1 : above;
    }

    private static TableBlock ResonanceTable(ReportContext context)
    {
        Quantity[] columns = [QuantityCatalogue.ReturnLoss, QuantityCatalogue.Vswr, QuantityCatalogue.MismatchLoss, QuantityCatalogue.InputResistance, QuantityCatalogue.InputReactance];
        var cells = new FigureCell();
        var rows = new List<TableRow>();
        foreach (var state in context.States)
        {
            foreach (var resonance in context.Figures(QuantityCatalogue.ResonanceFrequency, state).OrderBy(figure => figure.Source).ThenBy(figure => figure.Rank))
            {
                Figure? At(Quantity quantity) => context.Figures(quantity, state).FirstOrDefault(figure => figure.At == FigurePlace.Resonance && figure.Source == resonance.Source && figure.Rank == resonance.Rank);
                rows.Add(new(
                [
                    state,
                    resonance.Source is { } source ? Words.Of(source) : string.Empty,
                    resonance.Rank is { } rank ? NumberText.Fixed(rank, 0) : string.Empty,
                    cells.OfKnownSource(resonance),
                    .. columns.Select(quantity => cells.OfKnownSource(At(quantity))),
                ])
                {
                    StartsGroup = rows.Count > 0 && !string.Equals(rows[^1].Cells[0].Plain, state, StringComparison.Ordinal),
                });
            }
        }

        return new(
            "Resonances, the deepest first.",
            [
                new("State"), new("Source"), new("Rank"), new(Glossary.Named("Frequency", QuantityCatalogue.ResonanceFrequency, " (GHz)"), ColumnAlignment.DecimalPoint),
                .. columns.Select(quantity => new TableColumn(quantity == QuantityCatalogue.Vswr ? Glossary.Named("VSWR", quantity) : Glossary.Head(quantity, UnitText.Of(quantity)), ColumnAlignment.DecimalPoint)),
            ],
            rows)
        {
            Notes = cells.Notes,
            Sortable = true,
        };
    }

    private static TableBlock? BandTable(ReportContext context)
    {
        var bands = context.Reduced.Table.Of(QuantityCatalogue.MatchBand).OrderBy(band => context.Styles.IndexOf(band.State)).ThenBy(band => band.Source).ThenBy(band => band.Threshold).ThenBy(band => band.Rank).ToList();
        if (bands.Count == 0)
        {
            return null;
        }

        var cells = new FigureCell();
        var rows = bands.Select(band => new TableRow(
        [
            band.State ?? string.Empty,
            band.Source is { } source ? Words.Of(source) : string.Empty,
            band.Rank is { } rank ? NumberText.Fixed(rank, 0) : string.Empty,
            band.Threshold is { } threshold ? NumberText.Trimmed(threshold, 2) : string.Empty,
            BandText.Edges(band),
            cells.OfKnownSource(band),
            cells.OfKnownSource(context.Figures(QuantityCatalogue.MatchBandFraction, band.State).FirstOrDefault(figure => figure.Source == band.Source && figure.Rank == band.Rank && Nullable.Equals(figure.Threshold, band.Threshold))),
        ])).ToList();
        return new(
            "Match bands; rank 1 holds the deepest resonance.",
            [new("State"), new("Source"), new("Rank"), new("Threshold (dB)", ColumnAlignment.DecimalPoint), new("Edges (GHz)"), new(Glossary.Head(QuantityCatalogue.MatchBand, "MHz"), ColumnAlignment.DecimalPoint), new(Glossary.Named("Over centre frequency", QuantityCatalogue.MatchBandFraction, " (%)"), ColumnAlignment.DecimalPoint)],
            rows)
        {
            Notes = cells.Notes,
            Sortable = true,
        };
    }
}
