using System.Numerics;

using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Tests;

/// <summary>Reflection of a series resonance.</summary>
internal static class SyntheticMatch
{
    private const int Points = 401;

    public static void Add(FigureTable table, string state, DataSource source)
    {
        var resonance = SyntheticRun.FrequencyOf(state, source);
        var (resistance, quality) = state is "stowed" ? (8.0, 30.0) : (56.0, 9.0);
        var (x, loss, vswr, re, im) = (new double[Points], new double[Points], new double[Points], new double[Points], new double[Points]);
        for (var at = 0; at < Points; at++)
        {
            x[at] = 1.2e9 + (at * 2.5e6);
            var gamma = Gamma(x[at], resonance, resistance, quality, source);
            loss[at] = -SyntheticRun.DecibelsOf(gamma);
            vswr[at] = (1.0 + gamma.Magnitude) / (1.0 - gamma.Magnitude);
            (re[at], im[at]) = (gamma.Real, gamma.Imaginary);
        }

        void Trace(Quantity quantity, double[] y) => table.Add(new Trace { Quantity = quantity, Axis = TraceAxis.Frequency, X = x, Y = y, State = state, Source = source });
        Trace(QuantityCatalogue.ReturnLoss, loss);
        Trace(QuantityCatalogue.Vswr, vswr);
        Trace(QuantityCatalogue.ReflectionReal, re);
        Trace(QuantityCatalogue.ReflectionImaginary, im);

        var best = Array.IndexOf(loss, loss.Max());
        var uncertainty = source == DataSource.Measured && state is not "stowed" ? SyntheticRun.Known(0.62, ("effective-directivity", 0.28), ("repeatability", 0.13)) : Uncertainty.None;
        table.Add(new Figure { Quantity = QuantityCatalogue.ResonanceFrequency, Value = x[best], State = state, Source = source, Rank = 1, At = FigurePlace.Resonance });
        void At(Quantity quantity, double value, Uncertainty? known = null) =>
            table.Add(new Figure { Quantity = quantity, Value = value, State = state, Source = source, FrequencyHz = x[best], At = FigurePlace.Resonance, Rank = 1, Uncertainty = known ?? Uncertainty.None });
        At(QuantityCatalogue.ReturnLoss, loss[best], uncertainty);
        At(QuantityCatalogue.Vswr, vswr[best]);
        At(QuantityCatalogue.MismatchLoss, -10.0 * Math.Log10(1.0 - Math.Pow(10.0, -loss[best] / 10.0)));
        At(QuantityCatalogue.InputResistance, resistance);
        At(QuantityCatalogue.InputReactance, state is "left" ? 3.2 : -1.7);
        if (state is not "stowed")
        {
            var inside = Enumerable.Range(0, Points).Where(at => loss[at] >= 10.0).ToList();
            var (low, high) = (x[inside[0]], x[inside[^1]]);
            var band = new Figure { Quantity = QuantityCatalogue.MatchBand, Value = high - low, State = state, Source = source, LowHz = low, HighHz = high, Threshold = 10.0, Rank = 1, Open = state is "left" ? "high" : null };
            table.Add(band);
            table.Add(band with { Quantity = QuantityCatalogue.MatchBandFraction, Value = 200.0 * (high - low) / (high + low) });
        }
    }

    private static Complex Gamma(double frequency, double resonance, double resistance, double quality, DataSource source)
    {
        var impedance = new Complex(resistance, resistance * quality * ((frequency / resonance) - (resonance / frequency)));
        var gamma = (impedance - 50.0) / (impedance + 50.0);

        // A short piece of line and, where measured, a little of an unwanted reflection.
        var ripple = source == DataSource.Measured ? 0.012 * Complex.Exp(new Complex(0.0, frequency * 4e-8)) : Complex.Zero;
        return (gamma * Complex.Exp(new Complex(0.0, -frequency * 3e-10))) + ripple;
    }
}
