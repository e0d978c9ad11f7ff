namespace RangeReduce.Comparison.Identification;

/// <summary>What may differ in phase between a sweep and the signatures without meaning anything, because of the cable.</summary>
public enum CablePhase
{
    /// <summary>A constant phase and a delay, as after a change of cable or adapter.</summary>
    PhaseAndDelay,

    /// <summary>A constant phase.</summary>
    Phase,

    /// <summary>Nothing: both were taken at one calibrated plane.</summary>
    Fixed,
}
