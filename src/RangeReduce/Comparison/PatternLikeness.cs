using System.Numerics;

namespace RangeReduce.Comparison;

/// <summary>How alike two cuts on one angle axis are (common practice; the kinds differ in value, so each is named).</summary>
public sealed record PatternLikeness
{
    /// <summary>Gets sum(w a b) / sqrt(sum(w a^2) sum(w b^2)) of the linear amplitudes; not centred, so near 1 for any two beams.</summary>
    public required double AmplitudeCorrelation { get; init; }

    /// <summary>Gets the centred (Pearson) correlation of the linear amplitudes; NaN where a cut is constant.</summary>
    public required double PearsonAmplitude { get; init; }

    /// <summary>Gets the centred (Pearson) correlation of the levels in decibels; NaN where a cut is constant.</summary>
    public required double PearsonDb { get; init; }

    /// <summary>Gets the root mean square difference of the levels in decibels above the floor; NaN where no point is above it.</summary>
    public required double RmsDb { get; init; }

    /// <summary>Gets the largest absolute difference in decibels above the floor; NaN where no point is above it.</summary>
    public required double LargestDb { get; init; }

    /// <summary>Gets the angle of the largest difference in degrees; NaN where no point is above the floor.</summary>
    public required double LargestAtDeg { get; init; }

    /// <summary>Gets the number of points above the floor.</summary>
    public required int CountAboveFloor { get; init; }

    /// <summary>Compares two cuts.</summary>
    /// <remarks>A point counts for the difference where the larger of the two levels is at or above the floor, so that a lobe of one side only still
    /// counts; a level below the noise floor is taken as the noise floor, since there the receiver tells no more.</remarks>
    /// <param name="angleDeg">Angles of both cuts in degrees; theta where the weight is the solid angle.</param>
    /// <param name="firstDb">Levels of the first cut in decibels, as many.</param>
    /// <param name="secondDb">Levels of the second cut in decibels on the same scale, as many.</param>
    /// <param name="floorDb">The floor in decibels on the scale of the cuts, so relative to the peak where they are normalized to it; negative infinity for all points.</param>
    /// <param name="noiseFloorDb">The measured noise floor in decibels on the scale of the cuts; null where it is not known.</param>
    /// <param name="weight">How the points count.</param>
    /// <exception cref="ArgumentException">The lengths differ or are zero, or a level is NaN.</exception>
    public static PatternLikeness Compare(
        ReadOnlySpan<double> angleDeg,
        ReadOnlySpan<double> firstDb,
        ReadOnlySpan<double> secondDb,
        double floorDb,
        double? noiseFloorDb = null,
        PatternWeight weight = PatternWeight.Equal)
    {
        if (angleDeg.Length == 0 || firstDb.Length != angleDeg.Length || secondDb.Length != angleDeg.Length)
        {
            throw new ArgumentException("Two cuts on one axis with at least one point are needed.", nameof(firstDb));
        }

        var (amplitude, level, difference) = (default(WeightedMoments), default(WeightedMoments), default(DifferenceSum));
        var peakDb = double.NegativeInfinity;
        for (var n = 0; n < angleDeg.Length; n++)
        {
            if (double.IsNaN(firstDb[n]) || double.IsNaN(secondDb[n]))
            {
                throw new ArgumentException("A cut has a level that is not a number.", nameof(firstDb));
            }

            peakDb = Math.Max(peakDb, Math.Max(firstDb[n], secondDb[n]));
        }

        var noiseDb = noiseFloorDb ?? double.NegativeInfinity;
        for (var n = 0; n < angleDeg.Length; n++)
        {
            var w = weight == PatternWeight.SolidAngle ? Math.Abs(Math.Sin(angleDeg[n] * Math.PI / 180.0)) : 1.0;
            var (a, b) = (firstDb[n], secondDb[n]);
            amplitude.Add(w, Math.Pow(10.0, (a - peakDb) / 20.0), Math.Pow(10.0, (b - peakDb) / 20.0));
            level.Add(w, a, b);
            if (Math.Max(a, b) >= floorDb)
            {
                difference.Add(w, Math.Max(a, noiseDb) - Math.Max(b, noiseDb), angleDeg[n]);
            }
        }

        return new PatternLikeness
        {
            AmplitudeCorrelation = amplitude.Uncentred,
            PearsonAmplitude = amplitude.Centred,
            PearsonDb = level.Centred,
            RmsDb = difference.Rms,
            LargestDb = difference.Count > 0 ? difference.Largest : double.NaN,
            LargestAtDeg = difference.Count > 0 ? difference.LargestAt : double.NaN,
            CountAboveFloor = difference.Count,
        };
    }

    /// <summary>Gives |sum(w a b*)| / sqrt(sum(w |a|^2) sum(w |b|^2)) of complex amplitudes: the likeness in amplitude and phase, a common phase left out.</summary>
    /// <param name="first">Complex amplitudes of the first cut.</param>
    /// <param name="second">Complex amplitudes of the second cut, as many.</param>
    /// <param name="weights">Weights of the points, as many, not negative.</param>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public static double ComplexCorrelation(ReadOnlySpan<Complex> first, ReadOnlySpan<Complex> second, ReadOnlySpan<double> weights)
    {
        if (first.Length != second.Length || weights.Length != first.Length)
        {
            throw new ArgumentException("The cuts and the weights must have equal lengths.", nameof(second));
        }

        var (product, a, b) = (Complex.Zero, 0.0, 0.0);
        for (var n = 0; n < first.Length; n++)
        {
            product += weights[n] * first[n] * Complex.Conjugate(second[n]);
            a += weights[n] * ((first[n].Real * first[n].Real) + (first[n].Imaginary * first[n].Imaginary));
            b += weights[n] * ((second[n].Real * second[n].Real) + (second[n].Imaginary * second[n].Imaginary));
        }

        return product.Magnitude / Math.Sqrt(a * b);
    }

    /// <summary>Gives the level of the error signal that makes one level out of the other, 20 log10|10^(p/20) - 10^(q/20)|, which stays steady in nulls.</summary>
    /// <param name="firstDb">First level in decibels relative to the peak.</param>
    /// <param name="secondDb">Second level in decibels relative to the peak.</param>
    /// <returns>Decibels relative to the peak; negative infinity for equal levels.</returns>
    public static double EquivalentErrorLevelDb(double firstDb, double secondDb) =>
        20.0 * Math.Log10(Math.Abs(Math.Pow(10.0, firstDb / 20.0) - Math.Pow(10.0, secondDb / 20.0)));

    private struct WeightedMoments
    {
        private double _w;
        private double _a;
        private double _b;
        private double _aa;
        private double _bb;
        private double _ab;

        internal readonly double Uncentred => _ab / Math.Sqrt(_aa * _bb);

        internal readonly double Centred => ((_w * _ab) - (_a * _b)) / Math.Sqrt(((_w * _aa) - (_a * _a)) * ((_w * _bb) - (_b * _b)));

        internal void Add(double w, double a, double b)
        {
            (_w, _a, _b) = (_w + w, _a + (w * a), _b + (w * b));
            (_aa, _bb, _ab) = (_aa + (w * a * a), _bb + (w * b * b), _ab + (w * a * b));
        }
    }

    private struct DifferenceSum
    {
        private double _w;
        private double _squares;

        internal int Count { get; private set; }

        internal double Largest { get; private set; }

        internal double LargestAt { get; private set; }

        internal readonly double Rms => _w > 0.0 ? Math.Sqrt(_squares / _w) : double.NaN;

        internal void Add(double w, double difference, double angle)
        {
            // Equal levels of minus infinity give no number; they are equal.
            difference = double.IsNaN(difference) ? 0.0 : Math.Abs(difference);
            (_w, _squares) = (_w + w, _squares + (w * difference * difference));
            if (Count++ == 0 || difference > Largest)
            {
                (Largest, LargestAt) = (difference, angle);
            }
        }
    }
}
