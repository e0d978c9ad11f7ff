using CsCheck;
using RangeReduce.Patterns;

namespace RangeReduce.Tests.Patterns;

public sealed class CircularSplitTests
{
    private static readonly Gen<PatternChannel[]> TwoChannels = Gen.Double[-1e3, 1e3].Array[24].Select(values => new[]
    {
        new PatternChannel(values[..6], values[6..12]),
        new PatternChannel(values[12..18], values[18..]),
    });

    [Fact]
    public void The_split_keeps_the_power_and_comes_back() => TwoChannels.Sample(pair =>
    {
        var (right, left) = CircularSplit.ToCircular(pair[0], pair[1]);
        var (theta, phi) = CircularSplit.ToLinear(right, left);
        for (var i = 0; i < 6; i++)
        {
            var power = pair[0].Power(i) + pair[1].Power(i);
            Assert.Equal(power, right.Power(i) + left.Power(i), 1e-9 * (1.0 + power));
            Assert.Equal(pair[0].Re[i], theta.Re[i], 1e-9);
            Assert.Equal(pair[0].Im![i], theta.Im![i], 1e-9);
            Assert.Equal(pair[1].Re[i], phi.Re[i], 1e-9);
            Assert.Equal(pair[1].Im![i], phi.Im![i], 1e-9);
        }
    }, seed: "000000000015");

    [Fact]
    public void Conjugated_phases_flip_the_hand_and_keep_the_axial_ratio() => TwoChannels.Sample(pair =>
    {
        var (right, left) = CircularSplit.ToCircular(pair[0], pair[1]);
        var (mirroredRight, mirroredLeft) = CircularSplit.ToCircular(Conjugate(pair[0]), Conjugate(pair[1]));
        for (var i = 0; i < 6; i++)
        {
            Assert.Equal(right.Power(i), mirroredLeft.Power(i), 1e-9 * (1.0 + right.Power(i)));
            Assert.Equal(left.Power(i), mirroredRight.Power(i), 1e-9 * (1.0 + left.Power(i)));
        }
    }, seed: "000000000016");

    // IEEE Std 145: a turn of the antenna about its axis turns theta and phi there, the phase of right one way and of left the other, and no amplitude.
    [Fact]
    public void Rotation_about_boresight_changes_neither_axial_ratio_nor_hand_and_turns_the_tilt() => Gen.Select(TwoChannels, Gen.Double[-180.0, 180.0]).Sample((pair, turnDeg) =>
    {
        var (sin, cos) = Math.SinCos(double.DegreesToRadians(turnDeg));
        var theta = Mix(pair[0], cos, pair[1], -sin);
        var phi = Mix(pair[0], sin, pair[1], cos);
        var (right, left) = CircularSplit.ToCircular(pair[0], pair[1]);
        var (turnedRight, turnedLeft) = CircularSplit.ToCircular(theta, phi);
        for (var i = 0; i < 6; i++)
        {
            Assert.Equal(right.Power(i), turnedRight.Power(i), 1e-9 * (1.0 + right.Power(i)));
            Assert.Equal(left.Power(i), turnedLeft.Power(i), 1e-9 * (1.0 + left.Power(i)));
            var tilt = PolarizationEllipse.TiltDeg(right.Re[i], right.Im![i], left.Re[i], left.Im![i]);
            var turnedTilt = PolarizationEllipse.TiltDeg(turnedRight.Re[i], turnedRight.Im![i], turnedLeft.Re[i], turnedLeft.Im![i]);
            if (right.Power(i) > 1.0 && left.Power(i) > 1.0)
            {
                Assert.Equal(0.0, Math.IEEERemainder(turnedTilt - tilt - turnDeg, 180.0), 1e-6);
            }
        }
    }, seed: "000000000017");

    private static PatternChannel Conjugate(PatternChannel channel) => new(channel.Re, [.. channel.Im!.Select(value => -value)]);

    private static PatternChannel Mix(PatternChannel one, double share, PatternChannel other, double otherShare) => new(
        [.. one.Re.Zip(other.Re, (a, b) => (share * a) + (otherShare * b))],
        [.. one.Im!.Zip(other.Im!, (a, b) => (share * a) + (otherShare * b))]);
}
