using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Cuts;

/// <summary>The figures of a polarization ellipse given by the amplitudes of its circular components.</summary>
internal static class EllipseFigures
{
    /// <summary>How the axial ratio is made.</summary>
    public const string AxialRatioFormula = "20 lg ((|R| + |L|)/||R| − |L||), R = (θ + jφ)/√2, L = (θ − jφ)/√2, exp(+jωt) (IEEE Std 145)";

    /// <summary>How the tilt is made.</summary>
    public const string TiltFormula = "(arg R − arg L)/2, from theta towards phi";

    private const string HandFormula = "the larger of |R| and |L|; linear where the axial ratio exceeds 40 dB (common practice)";

    /// <summary>Gives axial ratio, hand and cross-polar ratio, as far as they exist.</summary>
    /// <param name="right">Amplitude of the right-hand component.</param>
    /// <param name="left">Amplitude of the left-hand component.</param>
    /// <param name="intended">Hand that is meant; the cross-polar ratio then takes it as the co-polar one.</param>
    /// <param name="make">Makes a figure with all other keys from quantity, value and formula.</param>
    public static IEnumerable<Figure> Of(double right, double left, Hand? intended, Func<Quantity, double, string, Figure> make)
    {
        var ratio = PolarizationEllipse.AxialRatioDb(right, left);
        if (double.IsNaN(ratio))
        {
            yield break;
        }

        yield return double.IsFinite(ratio)
            ? make(QuantityCatalogue.AxialRatio, ratio, AxialRatioFormula)
            : make(QuantityCatalogue.AxialRatio, double.NaN, AxialRatioFormula) with { Why = "the wave is linear: the minor axis is zero" };

        var hand = PolarizationEllipse.HandOf(right, left);
        yield return make(QuantityCatalogue.Hand, double.NaN, HandFormula) with { Hand = hand };

        // The intended hand is co-polar even when the other one is stronger: then the ratio is negative and says so.
        var co = intended is Hand.Right or Hand.Left ? intended.Value : right >= left ? Hand.Right : Hand.Left;
        var (wanted, unwanted) = co == Hand.Right ? (right, left) : (left, right);
        var cross = 20.0 * Math.Log10(wanted / unwanted);
        yield return make(QuantityCatalogue.CrossPolarRatio, double.IsFinite(cross) ? cross : double.NaN, "20 lg of co-polar over cross-polar amplitude in the same direction") with
        {
            Component = co == Hand.Right ? FieldComponent.Right : FieldComponent.Left,
            Why = double.IsFinite(cross) ? null : "one of the two hands is zero",
        };
    }
}
