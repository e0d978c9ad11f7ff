namespace RangeReduce.SampleData;

/// <summary>The gain standard, a linearly polarized horn.</summary>
internal static class GainStandardHorn
{
    /// <summary>What the table says too much.</summary>
    public const double TableErrorDb = 0.08;

    /// <summary>Gets the frequencies of the table.</summary>
    public static double[] TableHz { get; } = [.. Enumerable.Range(0, 11).Select(i => 1.50e9 + (i * 0.025e9))];

    /// <summary>Gives the gain that the table states: that of an aperture, growing with the square of the frequency.</summary>
    public static double TableGainDbi(double frequencyHz) => 10.30 + (20.0 * Math.Log10(frequencyHz / 1.5e9));

    /// <summary>Gives the realized gain that the horn really has.</summary>
    public static double TrueGainDbi(double frequencyHz) => TableGainDbi(frequencyHz) - TableErrorDb;
}
