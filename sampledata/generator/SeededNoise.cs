using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>Gaussian noise that is the same on every machine: the SplitMix64 generator (Steele, Lea and Flood 2014), started from the name of the file it goes into.</summary>
internal sealed class SeededNoise
{
    private const ulong Master = 0x7469646567617567;
    private ulong _state;

    /// <summary>Starts the noise of one file.</summary>
    /// <param name="name">Name of the file below the sample data folder, with forward slashes.</param>
    public SeededNoise(string name)
    {
        // FNV-1a over the characters, so that no file depends on the order in which files are written.
        var hash = 14695981039346656037UL;
        foreach (var character in name)
        {
            hash = unchecked((hash ^ character) * 1099511628211UL);
        }

        _state = Master ^ hash;
    }

    /// <summary>Gives a complex Gaussian number.</summary>
    /// <param name="rms">Root mean square of its magnitude.</param>
    public Complex Next(double rms)
    {
        var radius = rms * Math.Sqrt(-Math.Log(Uniform()));
        return Complex.FromPolarCoordinates(radius, 2.0 * Math.PI * Uniform());
    }

    // In (0, 1]: the logarithm above never sees a zero.
    private double Uniform()
    {
        unchecked
        {
            _state += 0x9E3779B97F4A7C15UL;
            var z = _state;
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EBUL;
            z ^= z >> 31;
            return ((z >> 11) + 1) * (1.0 / (1UL << 53));
        }
    }
}
