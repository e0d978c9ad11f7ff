namespace RangeReduce.SampleData;

/// <summary>One state of the antenna: two crossed dipoles in parallel on one short feed wire over a round plate; z is the axis, the plate lies at z = 0.</summary>
/// <param name="XArmMm">Length of the arms along x, from the feed wire to the tip.</param>
/// <param name="YArmMm">Length of the arms along y.</param>
internal sealed record DipolePairGeometry(double XArmMm, double YArmMm)
{
    /// <summary>Gets the height of the middle of the feed wire over the plate.</summary>
    public double HeightMm { get; init; } = 22.5;

    /// <summary>Gets what the arm along +x is longer than its partner along -x.</summary>
    public double ExtraPlusXMm { get; init; }

    /// <summary>Gets what the arm along +y is longer than its partner along -y.</summary>
    public double ExtraPlusYMm { get; init; }

    /// <summary>Gets the capacitor in the middle of the feed wire, which tunes out the inductance of that wire.</summary>
    public double FeedCapacitorPf { get; init; } = 2.80;

    /// <summary>Gets the resistance of the joint at the root of each arm.</summary>
    public double JointOhm { get; init; }

    /// <summary>Gets whether the arms touch the feed wire; if not, each floats with a gap before it.</summary>
    public bool ArmsConnected { get; init; } = true;
}
