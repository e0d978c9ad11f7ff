using System.Numerics;
using RangeReduce.Networks;
using RangeReduce.Networks.Touchstone;

namespace RangeReduce.Tests.Networks.Touchstone;

public sealed class RenormalizationTests
{
    // Z = 100 + 50j ohm: Γ = (Z − Z0)/(Z + Z0) is 0.4 + 0.2j at 50 ohm and 0.2075 + 0.2264j at 75 ohm (computed from the definition).
    [Fact]
    public void A_known_impedance_keeps_its_value_at_another_reference()
    {
        var sweep = new NetworkSweep([1e9], 1, [50.0], [0.4], [0.2]);
        var turned = Renormalization.To(sweep, [75.0]);
        var expected = (new Complex(100.0, 50.0) - 75.0) / (new Complex(100.0, 50.0) + 75.0);
        Assert.Equal(expected.Real, turned[0, 0, 0].Real, 1e-12);
        Assert.Equal(expected.Imaginary, turned[0, 0, 0].Imaginary, 1e-12);
        Assert.Equal(100.0, Reflection.ImpedanceOhm(turned[0, 0, 0], 75.0).Real, 1e-9);
    }

    [Fact]
    public void A_two_port_by_way_of_its_impedance_matrix_agrees()
    {
        Complex[] impedance = [new(80.0, 20.0), new(30.0, -10.0), new(30.0, -10.0), new(40.0, 5.0)];
        var at50 = ParameterConversion.ToScattering(ParameterKind.Z, impedance, [50.0, 50.0])!;
        var at25And100 = ParameterConversion.ToScattering(ParameterKind.Z, impedance, [25.0, 100.0])!;
        var sweep = new NetworkSweep([1e9], 2, [50.0, 50.0], [.. at50.Select(s => s.Real)], [.. at50.Select(s => s.Imaginary)]);
        var turned = Renormalization.To(sweep, [25.0, 100.0]);
        for (var i = 0; i < 4; i++)
        {
            Assert.Equal(at25And100[i].Real, turned[0, i / 2, i % 2].Real, 1e-12);
            Assert.Equal(at25And100[i].Imaginary, turned[0, i / 2, i % 2].Imaginary, 1e-12);
        }
    }

    [Fact]
    public void A_lone_series_element_has_scattering_parameters_though_its_admittance_matrix_has_no_inverse()
    {
        // Series 50 ohm between two ports of 50 ohm: S11 = Z/(Z + 2 Z0) = 1/3, S21 = 2/3 (textbook).
        Complex[] admittance = [0.02, -0.02, -0.02, 0.02];
        var s = ParameterConversion.ToScattering(ParameterKind.Y, admittance, [50.0, 50.0])!;
        Assert.Equal(1.0 / 3.0, s[0].Real, 1e-12);
        Assert.Equal(2.0 / 3.0, s[2].Real, 1e-12);
    }
}
