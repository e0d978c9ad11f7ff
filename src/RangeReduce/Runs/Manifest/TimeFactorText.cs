namespace RangeReduce.Runs.Manifest;

/// <summary>The ways in which a time factor is written.</summary>
internal static class TimeFactorText
{
    /// <summary>Spelling used when writing: exp(+jwt).</summary>
    public const string PlusJ = "exp(+jwt)";

    /// <summary>Spelling used when writing: exp(-iwt).</summary>
    public const string MinusI = "exp(-iwt)";

    /// <summary>Spellings accepted. The letter of the imaginary unit does not matter, only the sign before it.</summary>
    public static readonly IReadOnlyDictionary<string, TimeFactor> Words = new Dictionary<string, TimeFactor>(StringComparer.Ordinal)
    {
        [PlusJ] = TimeFactor.PlusJ,
        [MinusI] = TimeFactor.MinusI,
        ["exp(jwt)"] = TimeFactor.PlusJ,
        ["exp(+iwt)"] = TimeFactor.PlusJ,
        ["exp(iwt)"] = TimeFactor.PlusJ,
        ["exp(-jwt)"] = TimeFactor.MinusI,
    };

    /// <summary>Gives the spelling used when writing.</summary>
    public static string Write(TimeFactor time) => time == TimeFactor.MinusI ? MinusI : PlusJ;
}
