namespace RangeReduce.Comparison.Identification;

/// <summary>The kind of answer to the question which state a sweep belongs to.</summary>
public enum IdentificationAnswer
{
    /// <summary>One state fits, and no other does nearly as well.</summary>
    State,

    /// <summary>No state fits: the antenna is in none of them, or something else is wrong.</summary>
    Unknown,

    /// <summary>Several states fit about as well.</summary>
    Ambiguous,

    /// <summary>The sweep cannot be compared with the signatures.</summary>
    Refused,
}
