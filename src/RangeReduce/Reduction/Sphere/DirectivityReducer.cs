using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Reduction.Sweeps;
using RangeReduce.Runs;

namespace RangeReduce.Reduction.Sphere;

/// <summary>Adds directivity, by component and total, and radiation efficiency from a sphere of cuts or from two principal ones.</summary>
internal static class DirectivityReducer
{
    // Two cuts tell no more than this in dB: rectangular apertures of a few wavelengths come out 0.8 dB to 2 dB low (computed from the closed form).
    private const double PrincipalCutsDb = 1.0;

    // Quadrature and interpolation of a sphere that is sampled well (computed from closed forms), doubled.
    private const double SphereDb = 0.1;

    public static void Reduce(IReadOnlyList<ReducedCut> cuts, ReductionContext context)
    {
        if (HalfPlanes.Of(cuts) is not { } planes)
        {
            return;
        }

        var (used, owner) = (planes.Cuts, planes.Cuts[0].Source);
        var method = planes.IsSphere ? "sphere" : "principal cuts";
        var inputs = used.SelectMany(cut => cut.Source.InputIds).Distinct(StringComparer.Ordinal).ToArray();
        for (var i = 0; i < owner.Cut.FrequencyHz.Length; i++)
        {
            var mean = planes.MeanPower(i);
            if (!(mean > 0.0))
            {
                continue;
            }

            foreach (var component in new[] { FieldComponent.Right, FieldComponent.Left, FieldComponent.Total }.Where(component => used[0].Components.Contains(component)))
            {
                context.Table.Add(Make(i, QuantityCatalogue.Directivity, PeakDb(used, i, component) - Decibels.OfPower(mean), "highest power of the component over the mean of the total power over all directions, Clenshaw-Curtis in theta, plain mean in phi") with
                {
                    Component = component,
                    Uncertainty = planes.IsSphere ? Uncertainty.None : new(PrincipalCutsDb, 2.0, BudgetState.Partial),
                });
            }

            if (owner.Cut.Reference == LevelReference.Isotropic && Matched(owner, owner.Cut.FrequencyHz[i], context.Run) is { } share)
            {
                var efficiency = mean / share;
                context.Table.Add(Make(i, QuantityCatalogue.RadiationEfficiency, 100.0 * efficiency, "mean of the gain over all directions, which is gain over directivity"));
                RemarkTooMuch(efficiency);
            }
        }

        if (!planes.IsSphere)
        {
            context.Remarks.Add(RemarkSeverity.Note, "directivity-estimated", $"The {owner.Source.Word()} directivity of state {owner.State} is an estimate from two principal cuts, exact only for fields of first azimuthal order; it is no better than 1 dB, and neither is the radiation efficiency made of it.", owner.State);
        }

        void RemarkTooMuch(double efficiency)
        {
            var term = owner.Source == DataSource.Measured ? context.Run.UncertaintyTerms.FirstOrDefault(term => term.Name is "gain-standard")?.Value ?? 0.0 : 0.0;
            var allowance = double.Hypot(planes.IsSphere ? SphereDb : PrincipalCutsDb, term);
            if (Decibels.OfPower(efficiency) > allowance)
            {
                context.Remarks.Add(RemarkSeverity.Doubt, "gain-above-directivity", string.Create(CultureInfo.InvariantCulture, $"The {owner.Source.Word()} gain of state {owner.State} lies above the directivity by more than the {allowance:0.0} dB that both leave open: no passive antenna does that, so look at the gain standard and at what the cuts miss."), owner.State);
            }
        }

        Figure Make(int frequency, Quantity quantity, double value, string formula) => new()
        {
            Quantity = quantity,
            Value = double.IsFinite(value) ? value : double.NaN,
            Why = double.IsFinite(value) ? null : "the component is zero everywhere",
            State = owner.State,
            Source = owner.Source,
            FrequencyHz = owner.Cut.FrequencyHz[frequency],
            At = FigurePlace.Peak,
            Method = method,
            Origin = context.OriginOfCut(inputs, formula),
        };
    }

    private static double PeakDb(ReducedCut[] cuts, int frequency, FieldComponent component)
    {
        var peak = double.NegativeInfinity;
        foreach (var cut in cuts)
        {
            var slice = new CutSlice(cut, frequency);
            peak = Beam.TryFind(slice.AngleDeg, slice.LevelDb(component), out var beam) ? Math.Max(peak, beam.PeakDb) : peak;
        }

        return peak;
    }

    /// <summary>Gives the accepted share of the incident power: 1 where the levels are gain; null where they are realized gain and the reflection is not known.</summary>
    private static double? Matched(StateCut cut, double hertz, MeasurementRun run)
    {
        if (!cut.Cut.IsRealized)
        {
            return 1.0;
        }

        var sweep = run.Sweeps.FirstOrDefault(sweep => sweep.Source == cut.Source && string.Equals(sweep.State, cut.State, StringComparison.Ordinal))?.Sweep;
        if (sweep is null || hertz < sweep.FrequencyHz[0] || hertz > sweep.FrequencyHz[^1] || sweep.Count < 2)
        {
            return null;
        }

        var found = Array.BinarySearch(sweep.FrequencyHz, hertz);
        var segment = Math.Clamp(found >= 0 ? found : ~found - 1, 0, sweep.Count - 2);
        var magnitude = new ReflectionCurve(sweep, 0).MagnitudeBetween(segment, hertz);
        return magnitude < 1.0 ? 1.0 - (magnitude * magnitude) : null;
    }
}
