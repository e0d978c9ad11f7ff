namespace RangeReduce.Runs.Description;

/// <summary>What became of a file.</summary>
public enum FileUse
{
    /// <summary>It was not read: it is no data, or nothing says whose.</summary>
    NotRead,

    /// <summary>It is used.</summary>
    Used,

    /// <summary>All that it holds repeats other files; kept for repeatability.</summary>
    Repeat,

    /// <summary>It is a byte-for-byte copy of a file that is used.</summary>
    Copy,

    /// <summary>It could not be used; the remarks say why.</summary>
    Faulty,
}
