using RangeReduce.Numerics;

namespace RangeReduce.Reduction;

/// <summary>A curve along a cut that is joined at its seam where the cut is a closed turn; no copy is made.</summary>
/// <remarks>
/// Beamwidths and lobes do not care where the positioner started: a beam across ±180 degrees is as whole as one across 0.
/// Samples are addressed by any integer: beyond the ends a closed turn goes round (its angles then pass 180 or −180), an open cut has no samples (NaN).
/// </remarks>
public readonly ref struct TurnedSpan
{
    /// <summary>The most in dB by which <see cref="PeakOfLevel"/> stands above its sample: a vertex farther up is made up, as beside a null. No beam that is sampled well rises so far between two samples.</summary>
    public const double LargestRefinementDb = 1.0;

    private const double FullTurnDeg = 360.0;

    // A direction given at both ends of a turn differs from 360 degrees by no more than the digits of the file.
    private const double SameDirectionDeg = 1e-6;

    private readonly ReadOnlySpan<double> _angleDeg;
    private readonly ReadOnlySpan<double> _y;

    /// <summary>Looks at a curve.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="y">Ordinates, as many; NaN marks a missing one.</param>
    public TurnedSpan(ReadOnlySpan<double> angleDeg, ReadOnlySpan<double> y)
    {
        _angleDeg = angleDeg;
        _y = y;
        IsClosed = ClosesTurn(angleDeg);

        // A direction that comes again after a whole turn is the same direction: it counts once.
        Count = angleDeg.Length;
        while (IsClosed && angleDeg[Count - 1] - angleDeg[0] > FullTurnDeg - SameDirectionDeg)
        {
            Count--;
        }
    }

    /// <summary>Gets whether the cut is a closed turn.</summary>
    public bool IsClosed { get; }

    /// <summary>Gets the number of directions.</summary>
    public int Count { get; }

    /// <summary>Gives an angle in degrees; NaN beyond the ends of an open cut.</summary>
    public double AngleDeg(int index)
    {
        if ((uint)index < (uint)Count)
        {
            return _angleDeg[index];
        }

        if (!IsClosed)
        {
            return double.NaN;
        }

        var wraps = (int)Math.Floor((double)index / Count);
        return _angleDeg[index - (wraps * Count)] + (wraps * FullTurnDeg);
    }

    /// <summary>Gives an ordinate; NaN where it is missing and beyond the ends of an open cut.</summary>
    public double Y(int index)
    {
        if ((uint)index < (uint)Count)
        {
            return _y[index];
        }

        return IsClosed ? _y[((index % Count) + Count) % Count] : double.NaN;
    }

    /// <summary>Interpolates between a sample and the next one, by a cubic where their neighbours are there.</summary>
    public double Between(int segment, double atDeg)
    {
        Span<double> x = stackalloc double[4];
        Span<double> y = stackalloc double[4];
        var (first, count) = Gather(segment, x, y);
        return LocalCubicKernel.Evaluate(x.Slice(first, count), y.Slice(first, count), atDeg);
    }

    /// <summary>Finds where the interpolated curve passes a level between a sample and the next one, which lie on either side of it.</summary>
    public double Crossing(int segment, double level)
    {
        Span<double> x = stackalloc double[4];
        Span<double> y = stackalloc double[4];
        var (first, count) = Gather(segment, x, y);
        return LocalCubicKernel.Crossing(x.Slice(first, count), y.Slice(first, count), 1 - first, level);
    }

    /// <summary>Refines a maximum of a level in dB by the parabola through its sample and the two beside it.</summary>
    /// <returns>Angle in degrees and level of the vertex; those of the sample where a neighbour is missing or so far down that the three are no top of a beam.</returns>
    public (double AngleDeg, double LevelDb) PeakOfLevel(int index)
    {
        ReadOnlySpan<double> x = [AngleDeg(index - 1), AngleDeg(index), AngleDeg(index + 1)];
        ReadOnlySpan<double> y = [Y(index - 1), Y(index), Y(index + 1)];
        var vertex = ParabolicPeak.Refine(x, y);
        return vertex.Y - y[1] <= LargestRefinementDb ? vertex : (x[1], y[1]);
    }

    /// <summary>Walks from a sample to either side until the curve first leaves its bound.</summary>
    /// <param name="from">Index of the sample to start at.</param>
    /// <param name="step">+1 towards growing angles, −1 towards falling ones.</param>
    /// <param name="bound">The bound.</param>
    /// <param name="isUpper">True where the curve leaves by rising above the bound, false where it leaves by falling below it.</param>
    /// <returns>The angle of the edge in degrees; NaN where the data end, a sample is missing, or the turn is complete before.</returns>
    public double EdgeDeg(int from, int step, double bound, bool isUpper)
    {
        for (var walked = 0; walked < Count; walked++)
        {
            var index = from + (walked * step);
            var next = Y(index + step);
            if (double.IsNaN(next))
            {
                return double.NaN;
            }

            if (isUpper ? next > bound : next < bound)
            {
                return Crossing(step > 0 ? index : index - 1, bound);
            }
        }

        return double.NaN;
    }

    /// <summary>Tells whether the angles make a closed turn, the repeated direction given or left out.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    public static bool ClosesTurn(ReadOnlySpan<double> angleDeg)
    {
        if (angleDeg.Length < 3)
        {
            return false;
        }

        // The gap over the seam may not be wider than the steps beside it: a hole elsewhere in the data does not excuse a hole there.
        var gap = FullTurnDeg - (angleDeg[^1] - angleDeg[0]);
        return gap <= Math.Max(angleDeg[1] - angleDeg[0], angleDeg[^1] - angleDeg[^2]) + SameDirectionDeg;
    }

    /// <summary>Gives a direction by the count of the angles: a closed turn knows it under one angle only, from its first one up to 360 degrees further.</summary>
    /// <param name="angleDeg">Angles of the cut in degrees, strictly rising.</param>
    /// <param name="directionDeg">The direction in degrees, which may be whole turns off.</param>
    /// <returns>The same direction in degrees; as it is where the cut is open.</returns>
    public static double InTurn(ReadOnlySpan<double> angleDeg, double directionDeg) => ClosesTurn(angleDeg)
        ? directionDeg - (FullTurnDeg * Math.Floor((directionDeg - angleDeg[0] + SameDirectionDeg) / FullTurnDeg))
        : directionDeg;

    /// <summary>Collects the samples around a segment; infinite ones (exact nulls) count as missing neighbours.</summary>
    private (int First, int Count) Gather(int segment, Span<double> x, Span<double> y)
    {
        for (var i = 0; i < 4; i++)
        {
            (x[i], y[i]) = (AngleDeg(segment - 1 + i), Y(segment - 1 + i));
        }

        var first = double.IsFinite(y[0]) ? 0 : 1;
        var last = double.IsFinite(y[3]) ? 3 : 2;

        // An exact null has a level of −∞: the finite neighbour stands for it, so that an edge lies next to the null and not nowhere.
        y[1] = double.IsNegativeInfinity(y[1]) ? Math.Min(y[2], 0.0) - NullDepthDb : y[1];
        y[2] = double.IsNegativeInfinity(y[2]) ? Math.Min(y[1], 0.0) - NullDepthDb : y[2];
        return (first, last - first + 1);
    }

    // How far under its neighbour an exact null is put for interpolation.
    private const double NullDepthDb = 100.0;
}
