namespace RangeReduce.Quantities;

/// <summary>Whether more of a quantity is better.</summary>
public enum Preference
{
    /// <summary>Neither; it depends on the purpose.</summary>
    None,

    /// <summary>More is better.</summary>
    More,

    /// <summary>Less is better.</summary>
    Less,
}
