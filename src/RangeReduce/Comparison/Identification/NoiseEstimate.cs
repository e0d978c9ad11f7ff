namespace RangeReduce.Comparison.Identification;

/// <summary>The scatter of a reflection coefficient from sweep to sweep.</summary>
/// <param name="StandardDeviation">Standard deviation in the real and in the imaginary part.</param>
/// <param name="DegreesOfFreedom">Degrees of freedom of the estimate; infinite for a stated one.</param>
/// <param name="Correlation">By how much correlation along frequency, such as from a connector or drift, lowers the number of independent points; 1 for white noise.</param>
public sealed record NoiseEstimate(double StandardDeviation, double DegreesOfFreedom, double Correlation);
