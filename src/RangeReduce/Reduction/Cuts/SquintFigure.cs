using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>The signed angle from the axis to the beam of a theta cut: to its maximum, and to the middle of its half-power directions (IEEE Std 145).</summary>
internal static class SquintFigure
{
    /// <summary>Adds the figures of a beam whose maximum is unique; a beam that looks more than a quarter turn away from the axis has none.</summary>
    public static void Add(CutSlice slice, CutKeys keys, FieldComponent main, Beam beam)
    {
        var axisDeg = keys.Context.Run.AxisDeg;
        Put(beam.PeakDeg, "maximum", "direction of the maximum less the axis");
        Put(0.5 * (beam.LowDeg + beam.HighDeg), "half-power middle", "middle of the half-power directions less the axis");

        void Put(double directionDeg, string method, string formula)
        {
            var squint = Math.IEEERemainder(directionDeg - axisDeg, 360.0);
            if (Math.Abs(squint) <= 90.0)
            {
                keys.Context.Table.Add(keys.Figure(QuantityCatalogue.BeamSquint, slice.FrequencyHz, squint, formula) with { Component = main, Method = method });
            }
        }
    }
}
