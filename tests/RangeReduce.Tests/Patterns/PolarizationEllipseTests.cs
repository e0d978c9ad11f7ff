using System.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Tests.Patterns;

/// <summary>Source: IEEE Std 145 (hand along propagation, axial ratio, tilt by the right-hand rule) with exp(+jwt); values computed from the closed forms.</summary>
public sealed class PolarizationEllipseTests
{
    public static TheoryData<string> FieldIds => [.. PolarizationCases.Fields.Select(each => each.GetProperty("id").GetString()!)];

    [Theory]
    [MemberData(nameof(FieldIds))]
    public void A_field_of_known_ellipse_gives_its_axial_ratio_hand_and_tilt(string id)
    {
        var field = PolarizationCases.Field(id);
        var (right, left) = Split(field.ComplexOf("e_theta"), field.ComplexOf("e_phi"));
        Assert.Equal(0.0, (right - field.ComplexOf("e_r")).Magnitude, 2e-6);
        Assert.Equal(0.0, (left - field.ComplexOf("e_l")).Magnitude, 2e-6);

        var ratio = PolarizationEllipse.AxialRatioDb(right.Magnitude, left.Magnitude);
        if (field.NumberOf("axial_ratio_db") is { } ratioDb)
        {
            Assert.Equal(ratioDb, ratio, 1e-4);
        }
        else
        {
            Assert.Equal(double.PositiveInfinity, ratio);
        }

        if (field.NumberOf("tilt_deg") is { } tilt)
        {
            var found = PolarizationEllipse.TiltDeg(right.Real, right.Imaginary, left.Real, left.Imaginary);
            Assert.InRange(found, -90.0 + 1e-12, 90.0);
            Assert.Equal(0.0, Math.IEEERemainder(found - tilt, 180.0), 2e-3);
        }

        // At exactly 40 dB the rounding of the case decides between a hand and none.
        if (id is not "near-linear-40dB")
        {
            Assert.Equal(field.GetProperty("sense").GetString(), PolarizationEllipse.HandOf(right.Magnitude, left.Magnitude).Word());
        }
    }

    // IEEE Std 145: for an observer who looks along propagation a right-hand vector turns clockwise; theta-hat × phi-hat points along propagation,
    // so clockwise seen from behind is from theta-hat towards phi-hat.
    [Fact]
    public void A_vector_that_turns_from_theta_to_phi_while_it_goes_outward_is_right_hand()
    {
        Complex PhasorOf(Func<double, double> overTime) => (2.0 / 360.0) * Enumerable.Range(0, 360)
            .Select(degree => double.DegreesToRadians(degree))
            .Aggregate(Complex.Zero, (sum, phase) => sum + (overTime(phase) * Complex.Exp(-Complex.ImaginaryOne * phase)));

        var (right, left) = Split(PhasorOf(Math.Cos), PhasorOf(Math.Sin));
        Assert.Equal(Hand.Right, PolarizationEllipse.HandOf(right.Magnitude, left.Magnitude));
        Assert.Equal(0.0, left.Magnitude, 1e-12);

        (right, left) = Split(PhasorOf(Math.Cos), PhasorOf(phase => -Math.Sin(phase)));
        Assert.Equal(Hand.Left, PolarizationEllipse.HandOf(right.Magnitude, left.Magnitude));
        Assert.Equal(0.0, right.Magnitude, 1e-12);
    }

    // Closed form A = (X + 1)/(X − 1) of the amplitudes, printed in standard antenna texts as a table or chart: 20 dB is 1.743 dB, 15.34 dB is 3 dB.
    [Fact]
    public void The_table_of_axial_ratio_against_cross_polar_ratio_holds_both_ways()
    {
        Assert.Equal(42, PolarizationCases.CrossPolarTable.Count());
        Assert.All(PolarizationCases.CrossPolarTable, row =>
        {
            Assert.Equal(row.AxialRatioDb, PolarizationEllipse.AxialRatioDbOfCrossPolarDb(row.CrossDb), 2e-5 * Math.Max(1.0, row.AxialRatioDb));
            Assert.Equal(row.CrossDb, PolarizationEllipse.AxialRatioDbOfCrossPolarDb(row.AxialRatioDb), 2e-5 * Math.Max(1.0, row.CrossDb));
        });
    }

    [Fact]
    public void A_linear_wave_of_any_tilt_has_no_finite_axial_ratio_however_the_last_digits_fall()
    {
        for (var tilt = -89.0; tilt <= 90.0; tilt += 1.0)
        {
            var (sin, cos) = Math.SinCos(double.DegreesToRadians(tilt));
            var turned = Complex.FromPolarCoordinates(1.0, 0.37 * tilt);
            var (right, left) = Split(cos * turned, sin * turned);
            Assert.Equal(double.PositiveInfinity, PolarizationEllipse.AxialRatioDb(right.Magnitude, left.Magnitude));
            Assert.Equal(tilt, PolarizationEllipse.TiltDeg(right.Real, right.Imaginary, left.Real, left.Imaginary), 1e-9);
        }
    }

    [Fact]
    public void Nothing_and_a_missing_component_have_no_axial_ratio()
    {
        Assert.Equal(double.NaN, PolarizationEllipse.AxialRatioDb(0.0, 0.0));
        Assert.Equal(double.NaN, PolarizationEllipse.AxialRatioDb(double.NaN, 1.0));
        Assert.Equal(0.0, PolarizationEllipse.AxialRatioDb(0.0, 1.0));
    }

    private static (Complex Right, Complex Left) Split(Complex theta, Complex phi)
    {
        var (right, left) = CircularSplit.ToCircular(new([theta.Real], [theta.Imaginary]), new([phi.Real], [phi.Imaginary]));
        return (new(right.Re[0], right.Im![0]), new(left.Re[0], left.Im![0]));
    }
}
