using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Numerics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction.Sweeps;

/// <summary>Makes the figures and traces of a reflection sweep: resonances, match at each, match bands.</summary>
public static class ReflectionReducer
{
    /// <summary>Return loss in dB that a match band must keep; the usual bound, VSWR 1.925 (common practice).</summary>
    public const double MatchThresholdDb = 10.0;

    private const string ResonanceFormula = "minimum of |Γ|, real and imaginary part by a cubic between samples";
    private const string BandFormula = "connected run with return loss ≥ threshold; edges where |Γ|, real and imaginary part by a cubic between samples, crosses it";

    /// <summary>Reduces one sweep into the context's table.</summary>
    public static void Reduce(StateSweep input, ReductionContext context)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(context);
        for (var port = 0; port < input.Sweep.Ports; port++)
        {
            ReducePort(input, port, context);
        }

        PortPairReducer.Reduce(input, context);
    }

    private static void ReducePort(StateSweep input, int port, ReductionContext context)
    {
        var curve = new ReflectionCurve(input.Sweep, port);
        var method = input.Sweep.Ports > 1 ? string.Create(CultureInfo.InvariantCulture, $"port {port + 1}") : null;
        AddTraces(input, curve, method, context);
        RemarkActivePoints(input, curve, context);

        var resonances = ResonanceFinder.Find(curve);
        if (resonances.Count == 0)
        {
            context.Remarks.Add(
                RemarkSeverity.Note,
                "no-resonance",
                string.Create(CultureInfo.InvariantCulture, $"The {input.Source.Word()} sweep of state {input.State} has no dip of {ResonanceFinder.LeastReturnLossDb:0} dB return loss or more inside its range, so no resonance is given."),
                input.State,
                context.PlaceOf(input.InputId));
        }

        for (var rank = 1; rank <= resonances.Count; rank++)
        {
            AddResonance(input, curve, resonances[rank - 1], rank, method, context);
        }

        AddBands(input, curve, resonances, method, context);
        QualityReducer.Reduce(input, curve, resonances, method, context);
    }

    private static void AddResonance(StateSweep input, ReflectionCurve curve, Resonance resonance, int rank, string? method, ReductionContext context)
    {
        var magnitude = resonance.Reflection.Magnitude;
        Add(QuantityCatalogue.ResonanceFrequency, resonance.FrequencyHz, ResonanceFormula);
        Add(QuantityCatalogue.ReturnLoss, Reflection.ReturnLossDb(magnitude), "−20 lg |Γ| (IEEE Std 145) at the resonance");
        Add(QuantityCatalogue.Vswr, Reflection.Vswr(magnitude), "(1 + |Γ|)/(1 − |Γ|) at the resonance");
        Add(QuantityCatalogue.MismatchLoss, Reflection.MismatchLossDb(magnitude), "−10 lg (1 − |Γ|²) at the resonance");
        if (curve.HasPhase)
        {
            var impedance = Reflection.ImpedanceOhm(resonance.Reflection, curve.ReferenceOhm);
            Add(QuantityCatalogue.InputResistance, impedance.Real, "Re Z0 (1 + Γ)/(1 − Γ) at the resonance, at the plane of the calibration");
            Add(QuantityCatalogue.InputReactance, impedance.Imaginary, "Im Z0 (1 + Γ)/(1 − Γ) at the resonance, at the plane of the calibration");
        }
        else
        {
            context.Remarks.Add(RemarkSeverity.Note, "no-phase", $"The {input.Source.Word()} sweep of state {input.State} has no phase, so no input impedance is given.", input.State, context.PlaceOf(input.InputId));
        }

        void Add(Quantity quantity, double value, string formula) => context.Table.Add(new Figure
        {
            Quantity = quantity,
            Value = value,
            Why = double.IsFinite(value) ? null
                : double.IsNaN(value) ? "|Γ| is above 1"
                : curve.HasPhase ? "the match is perfect to the last digit"
                : "the dip is deeper than samples without phase can tell",
            State = input.State,
            Source = input.Source,
            FrequencyHz = resonance.FrequencyHz,
            At = FigurePlace.Resonance,
            Rank = rank,
            Method = method,
            Origin = ReductionContext.OriginOfSweep(input.InputId, formula),
        });
    }

    private static void AddBands(StateSweep input, ReflectionCurve curve, IReadOnlyList<Resonance> resonances, string? method, ReductionContext context)
    {
        var bands = MatchBandFinder.Find(curve, resonances, Reflection.MagnitudeOfReturnLoss(MatchThresholdDb));

        // Rank 1 is the band of the deepest resonance; the others follow by how deep they go.
        var deepest = resonances.Count > 0 ? resonances[0].FrequencyHz : double.NaN;
        var ranked = bands.OrderBy(band => band.Contains(deepest) ? 0 : 1).ThenBy(band => LeastMagnitude(curve, resonances, band)).ToArray();
        for (var rank = 1; rank <= ranked.Length; rank++)
        {
            var band = ranked[rank - 1];
            var figure = new Figure
            {
                Quantity = QuantityCatalogue.MatchBand,
                Value = band.Width,
                State = input.State,
                Source = input.Source,
                LowHz = band.Low,
                HighHz = band.High,
                Threshold = MatchThresholdDb,
                Rank = rank,
                Open = band.Open,
                Method = method,
                Origin = ReductionContext.OriginOfSweep(input.InputId, BandFormula),
            };
            context.Table.Add(figure);
            context.Table.Add(figure with
            {
                Quantity = QuantityCatalogue.MatchBandFraction,
                Value = 200.0 * band.Width / (band.Low + band.High),
                Origin = ReductionContext.OriginOfSweep(input.InputId, "width over the arithmetic mean of the edges"),
            });
            if (band.Open is { } open)
            {
                context.Remarks.Add(RemarkSeverity.Note, "open-band", $"The {input.Source.Word()} match band of state {input.State} goes on beyond the {OpenEnd(open)} of the sweep: its width is a lower bound.", input.State, context.PlaceOf(input.InputId));
            }
        }
    }

    private static double LeastMagnitude(ReflectionCurve curve, IReadOnlyList<Resonance> resonances, Band band) => resonances
        .Where(resonance => band.Contains(resonance.FrequencyHz))
        .Select(resonance => resonance.Reflection.Magnitude)
        .Concat(curve.Magnitude.Where((_, sample) => band.Contains(curve.FrequencyHz[sample])))
        .Min();

    private static string OpenEnd(string open) => open switch
    {
        "low" => "lower end",
        "high" => "upper end",
        _ => "ends",
    };

    private static void RemarkActivePoints(StateSweep input, ReflectionCurve curve, ReductionContext context)
    {
        var count = curve.Magnitude.Count(magnitude => magnitude > 1.0);
        if (count > 0)
        {
            context.Remarks.Add(
                RemarkSeverity.Doubt,
                "not-passive",
                string.Create(CultureInfo.InvariantCulture, $"|Γ| is above 1 at {count} of {curve.Magnitude.Length} points of the {input.Source.Word()} sweep of state {input.State}, at most {curve.Magnitude.Max():0.0000}: a passive antenna cannot do that, so look at the calibration."),
                input.State,
                context.PlaceOf(input.InputId));
        }
    }

    private static void AddTraces(StateSweep input, ReflectionCurve curve, string? method, ReductionContext context)
    {
        Add(QuantityCatalogue.ReturnLoss, Array.ConvertAll(curve.Magnitude, Reflection.ReturnLossDb), "−20 lg |Γ|");
        Add(QuantityCatalogue.Vswr, Array.ConvertAll(curve.Magnitude, Reflection.Vswr), "(1 + |Γ|)/(1 − |Γ|)");
        if (curve.HasPhase)
        {
            Add(QuantityCatalogue.ReflectionReal, curve.Re, "Re Γ");
            Add(QuantityCatalogue.ReflectionImaginary, curve.Im, "Im Γ");
        }

        void Add(Quantity quantity, double[] y, string formula) => context.Table.Add(new Trace
        {
            Quantity = quantity,
            Axis = TraceAxis.Frequency,
            X = curve.FrequencyHz,
            Y = y,
            State = input.State,
            Source = input.Source,
            Method = method,
            Origin = ReductionContext.OriginOfSweep(input.InputId, formula),
        });
    }
}
