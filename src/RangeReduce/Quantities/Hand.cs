namespace RangeReduce.Quantities;

/// <summary>Sense of polarization by IEEE Std 145: judged looking along the direction of propagation.</summary>
public enum Hand
{
    /// <summary>Linear: no sense within the noise.</summary>
    Linear,

    /// <summary>Right-hand: clockwise for an observer looking along propagation.</summary>
    Right,

    /// <summary>Left-hand: counter-clockwise for an observer looking along propagation.</summary>
    Left,
}
