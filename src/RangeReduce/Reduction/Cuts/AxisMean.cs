using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>The mean of several cuts on the axis that they all go through.</summary>
internal static class AxisMean
{
    /// <summary>Averages the power of a component over the cuts through the axis.</summary>
    /// <param name="cuts">The cuts, with equal frequencies; each knows the component.</param>
    /// <param name="component">The component.</param>
    /// <param name="axisDeg">Direction of the axis in degrees.</param>
    /// <returns>Amplitudes (square roots of the mean powers), one a frequency; NaN where no cut has the axis.</returns>
    public static double[] Amplitude(ReducedCut[] cuts, FieldComponent component, double axisDeg)
    {
        var mean = new double[cuts[0].Cut.FrequencyHz.Length];
        for (var i = 0; i < mean.Length; i++)
        {
            var (sum, count) = (0.0, 0);
            foreach (var cut in cuts)
            {
                // A cut counts for both hands or for neither: a mean over other cuts each would bend their ratio.
                var slice = new CutSlice(cut, i);
                var amplitude = slice.AmplitudeAt(component, axisDeg);
                if (!double.IsNaN(amplitude) && (!cut.HasTotal || !double.IsNaN(slice.AmplitudeAt(FieldComponent.Total, axisDeg))))
                {
                    sum += amplitude * amplitude;
                    count++;
                }
            }

            mean[i] = count == 0 ? double.NaN : Math.Sqrt(sum / count);
        }

        return mean;
    }
}
