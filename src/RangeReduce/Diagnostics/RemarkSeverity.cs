namespace RangeReduce.Diagnostics;

/// <summary>How much a remark matters.</summary>
public enum RemarkSeverity
{
    /// <summary>Worth knowing; no number is in doubt.</summary>
    Note,

    /// <summary>A number may be off, or one could not be made.</summary>
    Doubt,

    /// <summary>Something is wrong: data was left out or contradicts itself.</summary>
    Fault,
}
