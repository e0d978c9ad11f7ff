using RangeReduce.Diagnostics;
using RangeReduce.Quantities;

namespace RangeReduce.Comparison;

/// <summary>Measured curves against simulated ones: the frequency scale that explains a shift of the match, and the agreement of curves by Feature Selective Validation.</summary>
public static class CurveComparison
{
    private const string ScaleFormula = "factor s for which measured(f) = simulated(f/s) fits best in decibels of return loss; 95 % interval from the curvature of the sum of squares";
    private const string AgreementFormula = "global difference measure of Feature Selective Validation (IEEE Std 1597.1), mean over the points; " + FsvResult.Choices;

    // A return loss beyond this is decided by the last digits of the calibration; its depth would rule the whole comparison.
    private const double MostReturnLossDb = 40.0;

    private const double LeastSpanDb = 3.0;

    /// <summary>Adds frequency scale and curve agreement for each state that has both sides.</summary>
    /// <param name="table">The table that the curves are read from.</param>
    /// <returns>Remarks about curves that could not be compared.</returns>
    public static IReadOnlyList<Remark> Add(FigureTable table)
    {
        ArgumentNullException.ThrowIfNull(table);
        var remarks = new List<Remark>();
        // A curve without a dip has nothing to lay on the other, and a measure relative to its own wiggles says nothing.
        foreach (var (measured, simulated) in Pairs(table, QuantityCatalogue.ReturnLoss).Where(pair => pair.Measured.Y.Max() - pair.Measured.Y.Min() >= LeastSpanDb).ToArray())
        {
            AddScale(table, measured, simulated, remarks);
            AddAgreement(table, measured, simulated, Array.ConvertAll(measured.Y, Bounded), Array.ConvertAll(simulated.Y, Bounded), remarks);
        }

        foreach (var (measured, simulated) in Pairs(table, QuantityCatalogue.Gain).Where(pair => IsShown(table, pair.Measured)).ToArray())
        {
            AddAgreement(table, measured, simulated, measured.Y, simulated.Y, remarks);
        }

        return remarks;
    }

    private static double Bounded(double returnLossDb) => Math.Min(returnLossDb, MostReturnLossDb);

    private static IEnumerable<(Trace Measured, Trace Simulated)> Pairs(FigureTable table, Quantity quantity)
    {
        var curves = table.TracesOf(quantity).Where(trace => trace.Method is null && trace.OtherState is null && trace.At == FigurePlace.None).ToArray();
        return
            from measured in curves
            where measured.Source == DataSource.Measured
            join simulated in curves.Where(trace => trace.Source == DataSource.Simulated)
                on (measured.State, measured.Axis, measured.FrequencyHz, measured.PhiDeg, measured.ThetaDeg, measured.Component)
                equals (simulated.State, simulated.Axis, simulated.FrequencyHz, simulated.PhiDeg, simulated.ThetaDeg, simulated.Component)
            select (measured, simulated);
    }

    /// <summary>Tells whether a cut lies at the frequency nearest to the deepest resonance of its state: one frequency a state keeps the table readable.</summary>
    private static bool IsShown(FigureTable table, Trace cut)
    {
        if (cut is not { Axis: TraceAxis.Angle, Component: FieldComponent.Total, FrequencyHz: { } hertz })
        {
            return false;
        }

        var resonance = table.Of(QuantityCatalogue.ResonanceFrequency).FirstOrDefault(figure =>
            figure is { Source: DataSource.Measured, Rank: 1 } && string.Equals(figure.State, cut.State, StringComparison.Ordinal));
        var nearest = table.TracesOf(QuantityCatalogue.Gain)
            .Where(trace => trace is { Source: DataSource.Measured, Axis: TraceAxis.Angle, FrequencyHz: not null } && string.Equals(trace.State, cut.State, StringComparison.Ordinal))
            .Min(trace => Math.Abs(trace.FrequencyHz!.Value - (resonance?.Value ?? double.NaN)));
        return resonance is not null && Math.Abs(hertz - resonance.Value).Equals(nearest);
    }

    private static void AddScale(FigureTable table, Trace measured, Trace simulated, List<Remark> remarks)
    {
        if (!FrequencyScaleFit.TryFit(simulated.X, Array.ConvertAll(simulated.Y, Bounded), measured.X, Array.ConvertAll(measured.Y, Bounded), out var scale, out var reason))
        {
            remarks.Add(new(RemarkSeverity.Note, "no-frequency-scale", $"No frequency scale is given for state {measured.State}: {reason}", State: measured.State));
            return;
        }

        var half = 0.5 * (scale!.High - scale.Low);
        table.Add(new Figure
        {
            Quantity = QuantityCatalogue.FrequencyScale,
            Of = measured.Quantity.Id,
            Value = scale.Factor,
            State = measured.State,
            Uncertainty = new(half, 2.0, BudgetState.Partial) { Standard = 0.5 * half },
            Origin = OriginOf(measured, simulated, ScaleFormula),
        });
        remarks.AddRange(scale.Remarks.Select(remark => remark with { State = measured.State, Text = $"Return loss of state {measured.State}: {char.ToLowerInvariant(remark.Text[0])}{remark.Text[1..]}" }));
    }

    private static void AddAgreement(FigureTable table, Trace measured, Trace simulated, double[] measuredY, double[] simulatedY, List<Remark> remarks)
    {
        if (!FeatureSelectiveValidation.TryCompare(measured.X, measuredY, simulated.X, simulatedY, out var result, out var reason))
        {
            remarks.Add(new(RemarkSeverity.Note, "no-curve-agreement", $"The {measured.Quantity.Name} curves of state {measured.State} were not graded: {reason}", State: measured.State));
            return;
        }

        table.Add(new Figure
        {
            Quantity = QuantityCatalogue.CurveAgreement,
            Of = measured.Quantity.Id,
            Value = result!.Global.Total,
            Grade = Words(result.Global.TotalGrade),
            State = measured.State,
            FrequencyHz = measured.FrequencyHz,
            PhiDeg = measured.PhiDeg,
            ThetaDeg = measured.ThetaDeg,
            Component = measured.Component,
            Origin = OriginOf(measured, simulated, AgreementFormula),
        });
    }

    private static string Words(FsvGrade grade) => grade switch
    {
        FsvGrade.Excellent => "excellent",
        FsvGrade.VeryGood => "very good",
        FsvGrade.Good => "good",
        FsvGrade.Fair => "fair",
        FsvGrade.Poor => "poor",
        _ => "very poor",
    };

    private static FigureOrigin OriginOf(Trace measured, Trace simulated, string formula) => new([.. measured.Origin.Inputs, .. simulated.Origin.Inputs], measured.Origin.Corrections, formula);
}
