namespace RangeReduce.Patterns;

/// <summary>The pair of orthogonal components that a cut is given in.</summary>
public enum PolarizationBasis
{
    /// <summary>First is along theta, second along phi.</summary>
    ThetaPhi,

    /// <summary>First is right-hand, second left-hand circular (IEEE Std 145).</summary>
    RightLeft,
}
