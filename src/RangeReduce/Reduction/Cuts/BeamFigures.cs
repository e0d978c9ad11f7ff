using RangeReduce.Diagnostics;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>Figures of the main beam and the lobes of a cut at one frequency.</summary>
internal static class BeamFigures
{
    /// <summary>A cut of fewer angles has no beam to speak of.</summary>
    public const int LeastAngles = 5;

    // Two maxima closer than this in level cannot be told apart on an ordinary range (common practice).
    private const double SameLevelDb = 0.1;

    // Main beam and main lobe are refined from the same samples, so their directions agree to rounding.
    private const double SameDirectionDeg = 1e-6;

    // A cut flatter than this is round: its maximum is noise and ripple.
    private const double RoundDb = 0.5;

    private const string WidthFormula = "distance of the directions 3.0103 dB under the maximum, levels in dB by a cubic between samples (IEEE Std 145)";
    private const string LobeFormula = "highest maximum that rises by more than 0.5 dB, against the main lobe";

    /// <summary>Adds the figures.</summary>
    /// <returns>Direction of the maximum in degrees, inside the angles of the cut; NaN if no level is finite.</returns>
    public static double Add(ReducedCut cut, CutSlice slice, CutKeys keys)
    {
        // The total where it is known; else the one component there is.
        var main = cut.HasTotal ? FieldComponent.Total : cut.Components.First();
        var level = slice.LevelDb(main);
        if (!Beam.TryFind(slice.AngleDeg, level, out var beam))
        {
            keys.Context.Remarks.Add(RemarkSeverity.Doubt, "no-level", $"In {keys.Words} some frequencies have no sample with a level: they have no figures of the beam.", keys.Source.State);
            return double.NaN;
        }

        // Within 10 dB of the noise floor a maximum is noise as like as not.
        var lobes = LobeFinder.Find(slice.AngleDeg, level, floorDb: keys.NoiseFloorDb + 10.0);
        AddPeak(slice, keys, main, beam, lobes);
        AddWidth(slice, keys, main, beam);
        if (cut.HasEllipse && main == FieldComponent.Total)
        {
            AddCircularWidth(slice, keys, beam);
        }

        AddLobes(slice, keys, main, beam, lobes);
        AddFrontToBack(slice, keys, main, beam);
        return TurnedSpan.InTurn(slice.AngleDeg, beam.PeakDeg);
    }

    private static void AddPeak(CutSlice slice, CutKeys keys, FieldComponent main, Beam beam, IReadOnlyList<Lobe> lobes)
    {
        var rival = Others(lobes, beam).Any(lobe => lobe.LevelDb > beam.PeakDb - SameLevelDb);
        if (beam.SpanDb < RoundDb || rival || !beam.IsPeakSeen)
        {
            var why = beam.SpanDb < RoundDb ? "the cut is round within 0.5 dB"
                : rival ? "two lobes are equal within 0.1 dB"
                : "the highest level lies at the end of the data or beside a missing sample";
            keys.Context.Remarks.Add(RemarkSeverity.Note, "peak-not-unique", $"No direction of the maximum is given at some frequencies of {keys.Words}: {why}.", keys.Source.State);
            return;
        }

        keys.Context.Table.Add(keys.Figure(QuantityCatalogue.PeakDirection, slice.FrequencyHz, TurnedSpan.InTurn(slice.AngleDeg, beam.PeakDeg), "vertex of the parabola through the three highest levels in dB") with
        {
            Component = main,
            At = FigurePlace.Peak,
        });
        if (keys.Source.Cut.Axis == Patterns.CutAxis.Theta && !keys.IsBeside)
        {
            SquintFigure.Add(slice, keys, main, beam);
        }
    }

    private static void AddWidth(CutSlice slice, CutKeys keys, FieldComponent main, Beam beam)
    {
        if (double.IsNaN(beam.WidthDeg))
        {
            keys.Context.Remarks.Add(RemarkSeverity.Note, "no-beamwidth", $"No half-power beamwidth is given at some frequencies of {keys.Words}: the level does not fall 3 dB on both sides of the maximum inside the data.", keys.Source.State);
            return;
        }

        keys.Context.Table.Add(keys.Figure(QuantityCatalogue.HalfPowerBeamwidth, slice.FrequencyHz, beam.WidthDeg, WidthFormula) with
        {
            Component = main == FieldComponent.Total ? FieldComponent.None : main,
            DirectionDeg = TurnedSpan.InTurn(slice.AngleDeg, beam.PeakDeg),
        });
    }

    /// <summary>Adds the beamwidth of the stronger hand about its own maximum.</summary>
    private static void AddCircularWidth(CutSlice slice, CutKeys keys, Beam total)
    {
        var component = slice.AmplitudeAt(FieldComponent.Right, total.PeakDeg) >= slice.AmplitudeAt(FieldComponent.Left, total.PeakDeg) ? FieldComponent.Right : FieldComponent.Left;
        if (Beam.TryFind(slice.AngleDeg, slice.LevelDb(component), out var beam) && !double.IsNaN(beam.WidthDeg))
        {
            keys.Context.Table.Add(keys.Figure(QuantityCatalogue.HalfPowerBeamwidth, slice.FrequencyHz, beam.WidthDeg, WidthFormula) with
            {
                Component = component,
                DirectionDeg = TurnedSpan.InTurn(slice.AngleDeg, beam.PeakDeg),
            });
        }
    }

    private static void AddLobes(CutSlice slice, CutKeys keys, FieldComponent main, Beam beam, IReadOnlyList<Lobe> lobes)
    {
        // The highest in front and the highest behind.
        var others = Others(lobes, beam).Select(lobe => (Lobe: lobe, Back: DistanceDeg(lobe.AngleDeg, beam.PeakDeg) > 90.0)).ToArray();
        var rank = 0;
        foreach (var (lobe, back) in others.GroupBy(other => other.Back).Select(group => group.First()).OrderByDescending(other => other.Lobe.LevelDb))
        {
            keys.Context.Table.Add(keys.Figure(QuantityCatalogue.SidelobeLevel, slice.FrequencyHz, lobe.LevelDb - beam.PeakDb, LobeFormula) with
            {
                Component = main,
                DirectionDeg = TurnedSpan.InTurn(slice.AngleDeg, lobe.AngleDeg),
                Rank = ++rank,
                BackLobe = back,
            });
        }
    }

    private static void AddFrontToBack(CutSlice slice, CutKeys keys, FieldComponent main, Beam beam)
    {
        if (double.IsNaN(beam.BackDb))
        {
            var why = TurnedSpan.ClosesTurn(slice.AngleDeg) ? "the level 180 degrees from the maximum is missing at some frequencies" : "the cut is not a closed turn";
            keys.Context.Remarks.Add(RemarkSeverity.Note, "no-back", $"The front-to-back ratio is not given for {keys.Words}: {why}.", keys.Source.State);
            return;
        }

        if (beam.SpanDb < RoundDb)
        {
            return;
        }

        var ratio = beam.PeakDb - beam.BackDb;
        keys.Context.Table.Add(keys.Figure(QuantityCatalogue.FrontToBackRatio, slice.FrequencyHz, double.IsFinite(ratio) ? ratio : double.NaN, "maximum less the level 180 degrees from it") with
        {
            Component = main,
            DirectionDeg = TurnedSpan.InTurn(slice.AngleDeg, beam.PeakDeg),
            Why = double.IsFinite(ratio) ? null : "the level 180 degrees from the maximum is exactly zero",
        });
    }

    /// <summary>Gives all lobes but the main one, the highest first.</summary>
    private static IEnumerable<Lobe> Others(IReadOnlyList<Lobe> lobes, Beam beam) => lobes.Where(lobe => DistanceDeg(lobe.AngleDeg, beam.PeakDeg) > SameDirectionDeg);

    private static double DistanceDeg(double first, double second)
    {
        var distance = Math.Abs(first - second) % 360.0;
        return Math.Min(distance, 360.0 - distance);
    }
}
