using System.Text.Json.Nodes;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Tests.Patterns;

/// <summary>Against the polarization that NEC-2 (Burke and Poggio, 1981) prints for the design geometry of the sample data; it shares no code with us.</summary>
public sealed class NecReferenceTests
{
    private static readonly JsonArray Directions = JsonNode.Parse(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Data", "nec-crossed-dipole.json")))!["directions"]!.AsArray();

    public static TheoryData<int> All => [.. Enumerable.Range(0, Directions.Count)];

    [Theory]
    [MemberData(nameof(All))]
    public void Sense_axial_ratio_and_tilt_are_those_that_nec2_prints(int index)
    {
        var direction = Directions[index]!;
        var (right, left) = CircularSplit.ToCircular(Channel(direction["eTheta"]!), Channel(direction["ePhi"]!));
        var (a, b) = (Math.Sqrt(right.Power(0)), Math.Sqrt(left.Power(0)));

        // NEC-2 prints minor over major with four decimals; close to a linear wave that is few digits of a ratio in dB, so the quotient itself is compared.
        var quotient = Math.Abs(a - b) / (a + b);
        Assert.Equal((double)direction["axialRatio"]!, quotient, 2e-4);
        var expected = (string)direction["sense"]! is "RIGHT" ? Hand.Right : Hand.Left;
        if ((double)direction["axialRatio"]! > 0.011)
        {
            Assert.Equal(expected, PolarizationEllipse.HandOf(a, b));
        }

        if (PolarizationEllipse.AxialRatioDb(a, b) > 1.0)
        {
            var tilt = PolarizationEllipse.TiltDeg(right.Re[0], right.Im![0], left.Re[0], left.Im![0]);
            Assert.Equal(0.0, Math.IEEERemainder(tilt - (double)direction["tiltDeg"]!, 180.0), 0.1);
        }
    }

    [Fact]
    public void The_reference_holds_both_hands_and_both_sides_of_the_plate()
    {
        Assert.True(Directions.Count >= 20);
        Assert.Contains(Directions, direction => (string)direction!["sense"]! is "LEFT");
        Assert.Contains(Directions, direction => (double)direction!["thetaDeg"]! > 90.0);
    }

    private static PatternChannel Channel(JsonNode polar)
    {
        var (sin, cos) = Math.SinCos(double.DegreesToRadians((double)polar[1]!));
        return new([(double)polar[0]! * cos], [(double)polar[0]! * sin]);
    }
}
