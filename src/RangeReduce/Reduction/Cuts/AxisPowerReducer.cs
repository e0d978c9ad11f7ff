using RangeReduce.Numerics;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>What powers alone tell on the axis: the total of two linear levels without phase, or the one hand that was taken.</summary>
internal static class AxisPowerReducer
{
    /// <summary>Reduces the cuts of one state and source that share probe, frequencies and reference, none of which has both hands.</summary>
    /// <param name="through">The cuts through the axis.</param>
    /// <param name="method">The method key that the figures of the cuts have.</param>
    /// <param name="context">The run and its table.</param>
    public static void Reduce(IReadOnlyList<ReducedCut> through, string? method, ReductionContext context)
    {
        foreach (var component in new[] { FieldComponent.Right, FieldComponent.Left, FieldComponent.Total })
        {
            var usable = through.Where(cut => cut.Components.Contains(component)).ToArray();
            if (usable.Length == 0)
            {
                continue;
            }

            var (owner, frequencies) = (usable[0].Source, usable[0].Cut.FrequencyHz);
            var levelDb = Array.ConvertAll(AxisMean.Amplitude(usable, component, context.Run.AxisDeg), Decibels.OfAmplitude);
            if (!levelDb.Any(double.IsFinite))
            {
                continue;
            }

            var quantity = CutKeys.LevelQuantityOf(owner);
            var origin = context.OriginOfCut([.. usable.SelectMany(cut => cut.Source.InputIds).Distinct(StringComparer.Ordinal)], "power of the component averaged over the cuts through the axis");
            for (var i = 0; i < frequencies.Length; i++)
            {
                if (double.IsFinite(levelDb[i]))
                {
                    context.Table.Add(new Figure
                    {
                        Quantity = quantity,
                        Value = levelDb[i],
                        State = owner.State,
                        Source = owner.Source,
                        FrequencyHz = frequencies[i],
                        At = FigurePlace.Axis,
                        Component = component,
                        Method = method,
                        Realized = quantity == QuantityCatalogue.Gain ? owner.Cut.IsRealized : null,
                        Origin = origin,
                    });
                }
            }

            context.Table.Add(new Trace
            {
                Quantity = quantity,
                Axis = TraceAxis.Frequency,
                X = frequencies,
                Y = levelDb,
                State = owner.State,
                Source = owner.Source,
                At = FigurePlace.Axis,
                Component = component,
                Method = method,
                Origin = origin,
            });
        }
    }
}
