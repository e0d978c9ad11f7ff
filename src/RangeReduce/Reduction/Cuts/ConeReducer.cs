using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>Adds the worst axial ratio and the least cross-polar ratio over all theta cuts inside a cone about the axis.</summary>
public static class ConeReducer
{
    /// <summary>Half angle in degrees of the cone that is always given (common practice).</summary>
    public const double UsualConeDeg = 30.0;

    /// <summary>Gives the method key by which the figures of a cone are told apart.</summary>
    /// <param name="coneDeg">Half angle in degrees.</param>
    public static string MethodOf(double coneDeg) => string.Create(CultureInfo.InvariantCulture, $"cone {coneDeg:0.###} deg");

    /// <summary>Reduces the cuts of one state and source that share probe, frequencies and reference.</summary>
    /// <param name="cuts">The cuts.</param>
    /// <param name="context">The run and its table.</param>
    public static void Reduce(IReadOnlyList<ReducedCut> cuts, ReductionContext context)
    {
        ArgumentNullException.ThrowIfNull(cuts);
        ArgumentNullException.ThrowIfNull(context);
        var usable = cuts.Where(cut => cut.HasEllipse && cut.Cut.Axis == CutAxis.Theta && cut.Cut.AngleDeg.Length >= BeamFigures.LeastAngles).ToArray();
        if (usable.Length == 0)
        {
            return;
        }

        var asked = context.Run.Requirements
            .Where(requirement => requirement.Quantity == QuantityCatalogue.AxialRatio || requirement.Quantity == QuantityCatalogue.CrossPolarRatio)
            .Select(requirement => requirement.ConeDeg)
            .OfType<double>();
        foreach (var coneDeg in asked.Append(UsualConeDeg).Distinct().Order())
        {
            for (var i = 0; i < usable[0].Cut.FrequencyHz.Length; i++)
            {
                AddCone(usable, i, coneDeg, context);
            }
        }
    }

    private static void AddCone(ReducedCut[] cuts, int frequency, double coneDeg, ReductionContext context)
    {
        var owner = cuts[0].Source;
        var slices = Array.ConvertAll(cuts, cut => new CutSlice(cut, frequency));
        var axisDeg = context.Run.AxisDeg;
        var intended = context.Run.States.FirstOrDefault(state => string.Equals(state.Name, owner.State, StringComparison.Ordinal))?.IntendedHand;
        var co = intended is Hand.Right || (intended is null or Hand.Linear && slices[0].AmplitudeAt(FieldComponent.Right, axisDeg) >= slices[0].AmplitudeAt(FieldComponent.Left, axisDeg))
            ? FieldComponent.Right
            : FieldComponent.Left;
        var cross = co == FieldComponent.Right ? FieldComponent.Left : FieldComponent.Right;
        var worst = (Ratio: double.NegativeInfinity, RatioDeg: 0.0, CrossPolar: double.PositiveInfinity, CrossDeg: 0.0);
        var whole = true;
        foreach (var slice in slices)
        {
            var (angle, coDb, crossDb) = (slice.AngleDeg, slice.LevelDb(co), slice.LevelDb(cross));
            var closed = TurnedSpan.ClosesTurn(angle);
            for (var i = 0; i < angle.Length; i++)
            {
                var off = closed ? Math.IEEERemainder(angle[i] - axisDeg, 360.0) : angle[i] - axisDeg;
                if (Math.Abs(off) <= coneDeg + 1e-6)
                {
                    Take(angle[i], Decibels.ToAmplitude(coDb[i]), Decibels.ToAmplitude(crossDb[i]));
                }
            }

            foreach (var rim in new[] { axisDeg - coneDeg, axisDeg + coneDeg })
            {
                Take(TurnedSpan.InTurn(angle, rim), slice.AmplitudeAt(co, rim), slice.AmplitudeAt(cross, rim));
            }
        }

        if (!whole)
        {
            context.Remarks.Add(RemarkSeverity.Note, "cone-not-covered", string.Create(CultureInfo.InvariantCulture, $"State {owner.State} has no figures over the cone of {coneDeg:0.###} degrees about the axis: a {owner.Source.Word()} cut does not reach over it or misses a sample in it."), owner.State);
            return;
        }

        context.Table.Add(Make(QuantityCatalogue.AxialRatio, worst.Ratio, worst.RatioDeg, "largest axial ratio over the cuts inside the cone, at the samples and at its rim"));
        context.Table.Add(Make(QuantityCatalogue.CrossPolarRatio, worst.CrossPolar, worst.CrossDeg, "least ratio of co-polar to cross-polar level over the cuts inside the cone, at the samples and at its rim") with { Component = co });

        void Take(double angleDeg, double coAmplitude, double crossAmplitude)
        {
            var ratio = PolarizationEllipse.AxialRatioDb(coAmplitude, crossAmplitude);
            whole &= !double.IsNaN(ratio);
            worst = ratio > worst.Ratio ? worst with { Ratio = ratio, RatioDeg = angleDeg } : worst;
            var polar = Decibels.OfAmplitude(coAmplitude / crossAmplitude);
            worst = polar < worst.CrossPolar ? worst with { CrossPolar = polar, CrossDeg = angleDeg } : worst;
        }

        Figure Make(Quantity quantity, double value, double directionDeg, string formula) => new()
        {
            Quantity = quantity,
            Value = double.IsFinite(value) ? value : double.NaN,
            Why = double.IsFinite(value) ? null : "one of the two hands is zero, or the wave is linear",
            State = owner.State,
            Source = owner.Source,
            FrequencyHz = cuts[0].Cut.FrequencyHz[frequency],
            DirectionDeg = directionDeg,
            At = FigurePlace.Cone,
            Method = MethodOf(coneDeg),
            Origin = context.OriginOfCut([.. cuts.SelectMany(cut => cut.Source.InputIds).Distinct(StringComparer.Ordinal)], formula),
        };
    }
}
