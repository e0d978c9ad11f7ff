namespace RangeReduce.Networks.Touchstone;

/// <summary>The network parameters that a file holds.</summary>
public enum ParameterKind
{
    /// <summary>Scattering parameters.</summary>
    S,

    /// <summary>Admittance parameters.</summary>
    Y,

    /// <summary>Impedance parameters.</summary>
    Z,

    /// <summary>Hybrid parameters: V1 = h11 I1 + h12 V2, I2 = h21 I1 + h22 V2.</summary>
    H,

    /// <summary>Inverse hybrid parameters: I1 = g11 V1 + g12 I2, V2 = g21 V1 + g22 I2.</summary>
    G,
}
