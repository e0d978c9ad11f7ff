namespace RangeReduce.Quantities;

/// <summary>What made a figure: enough to walk back from the number to the files.</summary>
/// <param name="Inputs">Ids of the input files that the figure was made of, in the order of use.</param>
/// <param name="Corrections">Names of the corrections that were applied to them, in order.</param>
/// <param name="Formula">The formula or rule, with its source.</param>
public sealed record FigureOrigin(IReadOnlyList<string> Inputs, IReadOnlyList<string> Corrections, string Formula)
{
    /// <summary>An origin that says nothing.</summary>
    public static readonly FigureOrigin None = new([], [], string.Empty);
}
