namespace RangeReduce.Patterns;

/// <summary>The angle that moves along a cut.</summary>
public enum CutAxis
{
    /// <summary>Theta moves at fixed phi: a great circle through the pole.</summary>
    Theta,

    /// <summary>Phi moves at fixed theta: a cone about the pole.</summary>
    Phi,
}
