namespace RangeReduce.Runs;

/// <summary>The time factor of the phases in the files; the wrong one turns right into left.</summary>
public enum TimeFactor
{
    /// <summary>exp(+jwt): a delay turns the phase down. The engineering convention, and the one used inside.</summary>
    PlusJ,

    /// <summary>exp(-iwt): a delay turns the phase up. Data are conjugated on reading.</summary>
    MinusI,
}
