using System.Runtime.CompilerServices;

namespace RangeReduce.Uncertainties;

/// <summary>A seeded source of random numbers that is cheap enough for a noise sample at each angle of each trial.</summary>
/// <remarks>xoshiro256** (Blackman and Vigna) seeded by SplitMix64, the recommendation of its authors; the same seed gives the same numbers on every machine.</remarks>
internal struct TrialRandom
{
    private const int TableBits = 12;

    // Normal deviates at the middles of 4096 equally likely slices; scaled so that the variance is 1 in spite of the missing far tails.
    private static readonly double[] Normals = MakeNormals();

    private ulong _s0;
    private ulong _s1;
    private ulong _s2;
    private ulong _s3;
    private ulong _pool;
    private int _left;

    public TrialRandom(ulong seed)
    {
        _s0 = SplitMix(ref seed);
        _s1 = SplitMix(ref seed);
        _s2 = SplitMix(ref seed);
        _s3 = SplitMix(ref seed);
        (_pool, _left) = (0UL, 0);
    }

    /// <summary>Gives a number from 0 up to but not 1.</summary>
    public double Uniform() => (Next() >> 11) * (1.0 / (1UL << 53));

    /// <summary>Gives a number between minus and plus the limit.</summary>
    public double Rectangular(double limit) => ((2.0 * Uniform()) - 1.0) * limit;

    /// <summary>Gives a standard normal deviate (polar method of Box and Muller).</summary>
    public double Normal() => Math.Sqrt(-2.0 * Math.Log(1.0 - Uniform())) * Math.Cos(2.0 * Math.PI * Uniform());

    /// <summary>Gives a standard normal deviate out of a table of 4096: five of them out of one draw, for noise.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public double TableNormal()
    {
        if (_left == 0)
        {
            (_pool, _left) = (Next(), 64 / TableBits);
        }

        var index = (int)(_pool & ((1UL << TableBits) - 1));
        _pool >>= TableBits;
        _left--;
        return Normals[index];
    }

    private static double[] MakeNormals()
    {
        const int Count = 1 << TableBits;
        var table = new double[Count];
        var squares = 0.0;
        for (var i = 0; i < Count; i++)
        {
            table[i] = NormalQuantile((i + 0.5) / Count);
            squares += table[i] * table[i];
        }

        var scale = Math.Sqrt(Count / squares);
        return Array.ConvertAll(table, value => value * scale);
    }

    private static double NormalQuantile(double probability) => MathNet.Numerics.Distributions.Normal.InvCDF(0.0, 1.0, probability);

    private static ulong SplitMix(ref ulong state)
    {
        var z = state += 0x9E3779B97F4A7C15UL;
        z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL;
        z = (z ^ (z >> 27)) * 0x94D049BB133111EBUL;
        return z ^ (z >> 31);
    }

    private ulong Next()
    {
        var result = ulong.RotateLeft(_s1 * 5, 7) * 9;
        var t = _s1 << 17;
        _s2 ^= _s0;
        _s3 ^= _s1;
        _s1 ^= _s2;
        _s0 ^= _s3;
        _s2 ^= t;
        _s3 = ulong.RotateLeft(_s3, 45);
        return result;
    }
}
