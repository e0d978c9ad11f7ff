namespace RangeReduce.Quantities;

/// <summary>The component of the field that a figure is about.</summary>
public enum FieldComponent
{
    /// <summary>Not about a component.</summary>
    None,

    /// <summary>Right-hand circular (IEEE Std 145, looking along propagation).</summary>
    Right,

    /// <summary>Left-hand circular.</summary>
    Left,

    /// <summary>Along the unit vector of growing theta.</summary>
    Theta,

    /// <summary>Along the unit vector of growing phi.</summary>
    Phi,

    /// <summary>Co-polar.</summary>
    Co,

    /// <summary>Cross-polar.</summary>
    Cross,

    /// <summary>Sum of the powers of two orthogonal components.</summary>
    Total,
}
