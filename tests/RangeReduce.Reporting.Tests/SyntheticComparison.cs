using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Tests;

/// <summary>States against each other and measured against simulated, joined out of the table.</summary>
internal static class SyntheticComparison
{
    public static void Add(FigureTable table)
    {
        var figures = table.Figures.ToList();
        var axis = figures.Where(figure => figure.Quantity == QuantityCatalogue.Gain && figure.At == FigurePlace.Axis && figure.PhiDeg == 0.0 && figure.Source == DataSource.Measured && figure.Component != FieldComponent.Total).ToList();
        foreach (var one in axis)
        {
            foreach (var other in axis.Where(other => other.Component == one.Component && other.FrequencyHz.Equals(one.FrequencyHz) && one.Value > other.Value + 1.0))
            {
                var contrast = one with { Quantity = QuantityCatalogue.SwitchingContrast, Value = one.Value - other.Value, OtherState = other.State, Uncertainty = SyntheticRun.Known(0.72) };
                table.Add(contrast);
                table.Add(contrast with { Quantity = QuantityCatalogue.SwitchingReduction, Value = 100.0 * (1.0 - Math.Pow(10.0, -contrast.Value / 10.0)), Uncertainty = Uncertainty.None });
            }
        }

        var shifts = figures.Where(figure => figure.Quantity == QuantityCatalogue.ResonanceFrequency && figure.Source == DataSource.Measured).ToList();
        table.Add(shifts[1] with { Quantity = QuantityCatalogue.Deviation, Of = "resonance-frequency", OtherState = "right", Value = shifts[1].Value - shifts[0].Value });
        foreach (var measured in figures.Where(figure => figure.Source == DataSource.Measured && double.IsFinite(figure.Value)))
        {
            var simulated = figures.Find(figure => figure.Source == DataSource.Simulated && figure.Quantity == measured.Quantity && string.Equals(figure.State, measured.State, StringComparison.Ordinal) && figure.At == measured.At
                && figure.Component == measured.Component && figure.PhiDeg.Equals(measured.PhiDeg) && (measured.At == FigurePlace.Resonance || figure.FrequencyHz.Equals(measured.FrequencyHz)));
            if (simulated is not null && measured.PhiDeg is null or 0.0)
            {
                table.Add(measured with { Quantity = QuantityCatalogue.Deviation, Of = measured.Quantity.Id, Value = measured.Value - simulated!.Value, Source = null });
            }
        }

        foreach (var state in new[] { "right", "left" })
        {
            table.Add(new Figure { Quantity = QuantityCatalogue.FrequencyScale, Of = "return-loss", State = state, Value = 0.99206 });
            table.Add(new Figure { Quantity = QuantityCatalogue.CurveAgreement, Of = "return-loss", State = state, Value = 0.183, Grade = "very good" });
            table.Add(new Figure { Quantity = QuantityCatalogue.CurveAgreement, Of = "gain", Component = FieldComponent.Right, FrequencyHz = 1.62e9, PhiDeg = 0.0, State = state, Value = 0.62, Grade = "fair" });
        }
    }
}
