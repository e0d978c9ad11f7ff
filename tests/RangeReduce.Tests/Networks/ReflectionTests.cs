using System.Numerics;
using RangeReduce.Networks;

namespace RangeReduce.Tests.Networks;

/// <summary>Source: IEEE Std 145 definitions; the rows are the table printed in microwave handbooks, computed here from the closed forms to five digits.</summary>
public sealed class ReflectionTests
{
    [Theory]
    [InlineData(1.0, 0.89125, 17.3910, 6.8683)]
    [InlineData(3.0, 0.70795, 5.8480, 3.0206)]
    [InlineData(6.0, 0.50119, 3.0095, 1.2563)]
    [InlineData(9.5424, 0.33333, 2.0000, 0.5115)]
    [InlineData(10.0, 0.31623, 1.9250, 0.4576)]
    [InlineData(14.0, 0.19953, 1.4985, 0.1764)]
    [InlineData(20.0, 0.10000, 1.2222, 0.0436)]
    [InlineData(26.0, 0.05012, 1.1055, 0.0109)]
    [InlineData(30.0, 0.03162, 1.0653, 0.0043)]
    [InlineData(40.0, 0.01000, 1.0202, 0.0004)]
    public void Return_loss_standing_wave_ratio_and_mismatch_loss_agree_with_the_handbook_table(double returnLossDb, double magnitude, double vswr, double mismatchLossDb)
    {
        var found = Reflection.MagnitudeOfReturnLoss(returnLossDb);
        Assert.Equal(magnitude, found, 1e-5);
        Assert.Equal(returnLossDb, Reflection.ReturnLossDb(found), 1e-9);
        Assert.Equal(vswr, Reflection.Vswr(found), 1e-4);
        Assert.Equal(mismatchLossDb, Reflection.MismatchLossDb(found), 1e-4);
        Assert.Equal(found, Reflection.MagnitudeOfVswr(Reflection.Vswr(found)), 1e-12);
    }

    [Theory]
    [InlineData(1.05, 32.2557)]
    [InlineData(1.5, 13.9794)]
    [InlineData(2.0, 9.5424)]
    [InlineData(3.0, 6.0206)]
    [InlineData(5.82843, 3.0103)]
    [InlineData(10.0, 1.7430)]
    public void A_standing_wave_ratio_gives_its_return_loss(double vswr, double returnLossDb) =>
        Assert.Equal(returnLossDb, Reflection.ReturnLossDb(Reflection.MagnitudeOfVswr(vswr)), 1e-4);

    [Fact]
    public void A_perfect_match_a_total_reflection_and_a_reflection_above_one_have_their_limits()
    {
        Assert.Equal(double.PositiveInfinity, Reflection.ReturnLossDb(0.0));
        Assert.Equal(1.0, Reflection.Vswr(0.0));
        Assert.Equal("0", Reflection.MismatchLossDb(0.0).ToString(System.Globalization.CultureInfo.InvariantCulture));
        Assert.Equal("0", Reflection.ReturnLossDb(1.0).ToString(System.Globalization.CultureInfo.InvariantCulture));
        Assert.Equal(double.PositiveInfinity, Reflection.Vswr(1.0));
        Assert.Equal(double.PositiveInfinity, Reflection.MismatchLossDb(1.0));
        Assert.Equal(double.NaN, Reflection.Vswr(1.01));
        Assert.True(Reflection.ReturnLossDb(1.1) < 0.0);
    }

    // Z = Z0 (1 + Γ)/(1 − Γ): Γ = 0.4 + j0.2 in 50 ohm is 100 + j50 ohm.
    [Fact]
    public void A_reflection_coefficient_gives_its_impedance()
    {
        var impedance = Reflection.ImpedanceOhm(new Complex(0.4, 0.2), 50.0);
        Assert.Equal(100.0, impedance.Real, 1e-9);
        Assert.Equal(50.0, impedance.Imaginary, 1e-9);
    }
}
