namespace RangeReduce.SampleData;

/// <summary>The antennas of the scenario: what was designed, and what stood in the chamber.</summary>
internal static class Scenario
{
    /// <summary>Gets the states by name.</summary>
    public static string[] States { get; } = ["right", "left", "stowed"];

    /// <summary>Gets the antenna as designed, by state; the long arm along y makes a right-hand wave.</summary>
    public static DipolePairGeometry[] Design { get; } =
    [
        new(38.40, 42.40),
        new(42.40, 38.40),
        new(38.40, 42.40) { ArmsConnected = false },
    ];

    /// <summary>Gets the two lab runs with the antenna as it stood there, by state.</summary>
    public static (string Run, string[] Words, DipolePairGeometry[] States)[] Runs { get; } =
    [
        ("spring-build", ["as built in spring: arms up to 0.2 % off, one of them", "0.1 mm too long, 0.2 ohm in each joint"],
        [
            new(38.45, 42.38) { ExtraPlusXMm = 0.10, JointOhm = 0.2 },
            new(42.41, 38.36) { ExtraPlusYMm = 0.05, JointOhm = 0.2 },
            new(38.45, 42.38) { ExtraPlusXMm = 0.10, JointOhm = 0.2, ArmsConnected = false },
        ]),
        ("autumn-retest", ["as found in autumn: deposits make the arms act 0.5 % longer,", "corrosion puts 2.2 ohm in each joint, the pair 0.2 mm lower"],
        [
            new(38.65, 42.60) { ExtraPlusXMm = 0.10, JointOhm = 2.2, HeightMm = 22.3, FeedCapacitorPf = 2.84 },
            new(42.62, 38.56) { ExtraPlusYMm = 0.05, JointOhm = 2.2, HeightMm = 22.3, FeedCapacitorPf = 2.84 },
            new(38.65, 42.60) { ExtraPlusXMm = 0.10, JointOhm = 2.2, HeightMm = 22.3, FeedCapacitorPf = 2.84, ArmsConnected = false },
        ]),
    ];
}
