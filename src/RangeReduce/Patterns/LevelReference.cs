namespace RangeReduce.Patterns;

/// <summary>What 0 dB means in a cut.</summary>
public enum LevelReference
{
    /// <summary>Nothing in particular: raw receiver levels.</summary>
    Receiver,

    /// <summary>An isotropic radiator: the square of an amplitude is a partial gain (or realized gain).</summary>
    Isotropic,
}
