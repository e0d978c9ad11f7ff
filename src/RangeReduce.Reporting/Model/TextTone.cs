namespace RangeReduce.Reporting.Model;

/// <summary>How a text is meant; a word always says the same as the colour.</summary>
public enum TextTone
{
    /// <summary>Ordinary.</summary>
    Normal,

    /// <summary>Less important.</summary>
    Quiet,

    /// <summary>Met, in order.</summary>
    Good,

    /// <summary>Undecided, in doubt.</summary>
    Doubt,

    /// <summary>Not met, a fault.</summary>
    Bad,
}
