using System.Globalization;
using System.Numerics;
using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Numerics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>Adds what two ports of a sweep have to do with each other: the worst isolation and the worst envelope correlation.</summary>
internal static class PortPairReducer
{
    public static void Reduce(StateSweep input, ReductionContext context)
    {
        var sweep = input.Sweep;
        if (sweep.Ports < 2)
        {
            return;
        }

        var first = new ReflectionCurve(sweep, 0);
        var (low, high, where) = Range(first);
        for (var one = 0; one < sweep.Ports; one++)
        {
            for (var other = one + 1; other < sweep.Ports; other++)
            {
                var (a, b) = (one, other);
                var pair = string.Create(CultureInfo.InvariantCulture, $"ports {a + 1} and {b + 1}");
                AddWorst(QuantityCatalogue.Isolation, i => -Reflection.ReturnLossDb(Math.Max(sweep[i, b, a].Magnitude, sweep[i, a, b].Magnitude)), -1.0, pair, "least of −20 lg |S_ij|, both directions");
                if (sweep.HasPhase)
                {
                    AddWorst(QuantityCatalogue.EnvelopeCorrelation, i => Correlation(sweep[i, a, a], sweep[i, a, b], sweep[i, b, a], sweep[i, b, b]), 1.0, pair, "|S11* S12 + S21* S22|²/((1 − |S11|² − |S21|²)(1 − |S22|² − |S12|²)) (Blanch et al. 2003), largest");
                    context.Remarks.Add(RemarkSeverity.Note, "envelope-correlation", $"The envelope correlation of state {input.State} is made of scattering parameters: it holds for antennas without loss, other ports terminated, in a uniform unpolarized surrounding. Below a radiation efficiency of 90 % it may be off by more than 0.1 and says little.", input.State, context.PlaceOf(input.InputId));
                }
            }
        }

        // The largest of a measure; the sign turns it into the value of the figure.
        void AddWorst(Quantity quantity, Func<int, double> measure, double sign, string pair, string formula)
        {
            var (worst, at) = (double.NegativeInfinity, -1);
            for (var i = 0; i < sweep.Count; i++)
            {
                if (sweep.FrequencyHz[i] >= low && sweep.FrequencyHz[i] <= high && measure(i) is var value && value > worst)
                {
                    (worst, at) = (value, i);
                }
            }

            if (at >= 0 && double.IsFinite(worst))
            {
                context.Table.Add(new Figure
                {
                    Quantity = quantity,
                    Value = sign * worst,
                    State = input.State,
                    Source = input.Source,
                    FrequencyHz = sweep.FrequencyHz[at],
                    LowHz = low,
                    HighHz = high,
                    Method = pair,
                    Origin = ReductionContext.OriginOfSweep(input.InputId, $"{formula} over {where}"),
                });
            }
        }
    }

    /// <summary>Gives the envelope correlation of two ports from their scattering parameters.</summary>
    /// <returns>NaN where a port radiates nothing.</returns>
    internal static double Correlation(Complex s11, Complex s12, Complex s21, Complex s22)
    {
        var first = 1.0 - Power(s11) - Power(s21);
        var second = 1.0 - Power(s22) - Power(s12);
        return first > 0.0 && second > 0.0 ? Power((Complex.Conjugate(s11) * s12) + (Complex.Conjugate(s21) * s22)) / (first * second) : double.NaN;

        static double Power(Complex s) => (s.Real * s.Real) + (s.Imaginary * s.Imaginary);
    }

    private static (double Low, double High, string Where) Range(ReflectionCurve first)
    {
        var resonances = ResonanceFinder.Find(first);
        var bands = MatchBandFinder.Find(first, resonances, Reflection.MagnitudeOfReturnLoss(ReflectionReducer.MatchThresholdDb));
        Band[] holding = resonances.Count == 0 ? [] : [.. bands.Where(band => band.Contains(resonances[0].FrequencyHz))];

        // A band that fits between two samples holds none.
        return holding.Length > 0 && first.FrequencyHz.Any(holding[0].Contains)
            ? (holding[0].Low, holding[0].High, "the match band of port 1")
            : (first.FrequencyHz[0], first.FrequencyHz[^1], "the sweep");
    }
}
