namespace RangeReduce.Comparison.Identification;

/// <summary>The arrays that one thread works in, so that a sweep costs no allocation but its answer.</summary>
internal sealed class IdentificationScratch(int length, int blocks, int states)
{
    internal double[] Re { get; } = new double[length];

    internal double[] Im { get; } = new double[length];

    internal double[] ProductRe { get; } = new double[length];

    internal double[] ProductIm { get; } = new double[length];

    internal double[] Blocks { get; } = new double[blocks];

    internal double[] Squares { get; } = new double[states];

    internal double[] LogLikelihood { get; } = new double[states];

    internal double[] Delay { get; } = new double[states];

    internal double[] Phase { get; } = new double[states];
}
