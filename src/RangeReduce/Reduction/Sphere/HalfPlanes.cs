using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction.Sphere;

/// <summary>The half planes of constant phi, pole to pole, that theta cuts make up, and the mean power over them.</summary>
internal sealed class HalfPlanes
{
    private const double SameDeg = 0.5;
    private const double CoverDeg = 1e-3;
    private const int LeastForSphere = 8;
    private const int LargestGrid = 360;
    private static readonly double[] QuarterTurnsDeg = [0.0, 90.0, 180.0, 270.0];
    private readonly (ReducedCut Cut, double Sign)[] _halves;
    private readonly double[] _weights;

    private HalfPlanes((ReducedCut Cut, double Sign)[] halves, double[] weights, bool isSphere) => (_halves, _weights, IsSphere) = (halves, weights, isSphere);

    /// <summary>Gets whether there are enough half planes for a sphere; else they are two principal cuts.</summary>
    public bool IsSphere { get; }

    /// <summary>Gets the cuts that are used.</summary>
    public ReducedCut[] Cuts => [.. _halves.Select(half => half.Cut).Distinct()];

    /// <summary>Takes all half planes where they lie evenly around, else two whole cuts at right angles; null where there is neither.</summary>
    public static HalfPlanes? Of(IReadOnlyList<ReducedCut> cuts)
    {
        var all = new SortedDictionary<double, (ReducedCut Cut, double Sign)>();
        foreach (var cut in cuts.Where(cut => cut.HasTotal && cut.Cut.Axis == CutAxis.Theta && !double.IsNaN(cut.Cut.FixedDeg)))
        {
            foreach (var sign in new[] { 1.0, -1.0 })
            {
                var phi = ((cut.Cut.FixedDeg + (sign > 0.0 ? 0.0 : 180.0)) % 360.0 + 360.0) % 360.0;
                if (Covers(cut.Cut.AngleDeg, sign) && !all.Keys.Any(known => Math.Abs(Math.IEEERemainder(known - phi, 360.0)) < SameDeg))
                {
                    all.Add(phi, (cut, sign));
                }
            }
        }

        if (all.Count < 4)
        {
            return null;
        }

        var step = Math.Max(0.1, all.Values.Min(half => Step(half.Cut.Cut.AngleDeg)));
        var intervals = Math.Min(LargestGrid, 2 * (int)Math.Ceiling(90.0 / step - CoverDeg));
        var phis = all.Keys.ToArray();
        var gap = 360.0 / phis.Length;
        var even = phis.Select((phi, index) => Math.Abs(phi - phis[0] - (index * gap))).All(off => off < SameDeg);
        if (even && phis.Length >= LeastForSphere)
        {
            return new([.. all.Values], ClenshawCurtis.Weights(intervals), isSphere: true);
        }

        foreach (var first in phis)
        {
            var four = QuarterTurnsDeg
                .Select(turn => phis.Where(phi => Math.Abs(Math.IEEERemainder(phi - first - turn, 360.0)) < SameDeg).Cast<double?>().FirstOrDefault())
                .ToArray();
            if (four.All(phi => phi is not null))
            {
                return new([.. four.Select(phi => all[phi!.Value])], ClenshawCurtis.Weights(intervals), isSphere: false);
            }
        }

        return null;
    }

    /// <summary>Gives the mean of the total power over all directions; NaN where a sample is missing.</summary>
    /// <remarks>For two principal cuts this is the rule 1/D = (1/D_E + 1/D_H)/2, exact for fields of first azimuthal order.</remarks>
    public double MeanPower(int frequency)
    {
        var sum = 0.0;
        foreach (var (cut, sign) in _halves)
        {
            var slice = new CutSlice(cut, frequency);
            var angle = slice.AngleDeg;
            var power = Array.ConvertAll(slice.LevelDb(FieldComponent.Total), level => Math.Pow(10.0, level / 10.0));
            var curve = new TurnedSpan(angle, power);
            for (var k = 0; k < _weights.Length; k++)
            {
                sum += _weights[k] * At(curve, angle, sign * k * 180.0 / (_weights.Length - 1));
            }
        }

        return 0.5 * sum / _halves.Length;
    }

    private static double At(TurnedSpan curve, double[] angle, double thetaDeg)
    {
        var at = TurnedSpan.InTurn(angle, thetaDeg);
        var next = Array.BinarySearch(angle, at);
        next = next >= 0 ? next : ~next;
        foreach (var sample in (ReadOnlySpan<int>)[next, next - 1])
        {
            if (Math.Abs(curve.AngleDeg(sample) - at) < CoverDeg)
            {
                return curve.Y(sample);
            }
        }

        return curve.Between(next - 1, at);
    }

    private static bool Covers(double[] angle, double sign) =>
        TurnedSpan.ClosesTurn(angle) || (sign > 0.0 ? angle[0] <= CoverDeg && angle[^1] >= 180.0 - CoverDeg : angle[0] <= -180.0 + CoverDeg && angle[^1] >= -CoverDeg);

    private static double Step(double[] angle) => (angle[^1] - angle[0]) / (angle.Length - 1);
}
