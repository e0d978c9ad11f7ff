namespace RangeReduce.Runs;

/// <summary>What an input file holds.</summary>
public enum InputKind
{
    /// <summary>The manifest run.toml.</summary>
    Manifest,

    /// <summary>A reflection or network sweep.</summary>
    Sweep,

    /// <summary>Pattern cuts of a configuration state.</summary>
    Cut,

    /// <summary>The gain of the gain standard over frequency.</summary>
    GainTable,

    /// <summary>Levels of the gain standard through the same probe and receiver.</summary>
    GainStandardCut,

    /// <summary>Nothing that is read: a note, a picture, a document.</summary>
    Other,
}
