using System.Globalization;
using System.Numerics;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>The order of differential, common and single-ended rows of a mixed-mode file, and the way back to single-ended parameters.</summary>
/// <remarks>Rows D (1, −1)/√2, C (1, 1)/√2 and S 1 form an orthogonal matrix M: S(mixed) = M S Mᵀ, so S = Mᵀ S(mixed) M.</remarks>
internal sealed class MixedModeOrder
{
    private readonly double[,] _m;

    private MixedModeOrder(double[,] m, IReadOnlyList<(int First, int Second)> pairs) => (_m, Pairs) = (m, pairs);

    /// <summary>Gets the ports of each pair, counted from 0.</summary>
    public IReadOnlyList<(int First, int Second)> Pairs { get; }

    /// <summary>Reads the descriptors.</summary>
    /// <param name="words">The descriptors, such as D1,2 or S3.</param>
    /// <param name="ports">Number of ports.</param>
    /// <param name="place">Where they stand.</param>
    /// <exception cref="MeasurementDataException">A descriptor is wrong, missing or given twice.</exception>
    public static MixedModeOrder Read(IReadOnlyList<string> words, int ports, SourcePlace place)
    {
        var m = new double[ports, ports];
        var pairs = new List<(int, int)>();
        if (words.Count != ports)
        {
            throw Wrong(string.Create(CultureInfo.InvariantCulture, $"{words.Count} descriptors"));
        }

        for (var row = 0; row < ports; row++)
        {
            var word = words[row].ToUpperInvariant();
            var numbers = word[1..].Split(',').Select(text => int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var port) && port >= 1 && port <= ports ? port - 1 : -1).ToArray();
            if (numbers.Contains(-1) || numbers.Length != (word[0] == 'S' ? 1 : 2))
            {
                throw Wrong($"'{words[row]}'");
            }

            switch (word[0])
            {
                case 'S':
                    m[row, numbers[0]] = 1.0;
                    break;
                case 'D' when numbers[0] != numbers[1]:
                    (m[row, numbers[0]], m[row, numbers[1]]) = (Math.Sqrt(0.5), -Math.Sqrt(0.5));
                    pairs.Add((numbers[0], numbers[1]));
                    break;
                case 'C' when numbers[0] != numbers[1]:
                    (m[row, numbers[0]], m[row, numbers[1]]) = (Math.Sqrt(0.5), Math.Sqrt(0.5));
                    break;
                default:
                    throw Wrong($"'{words[row]}'");
            }
        }

        // Every port must appear with full weight: a missing or doubled descriptor leaves a column that is not of length one.
        for (var column = 0; column < ports; column++)
        {
            var length = Enumerable.Range(0, ports).Sum(row => m[row, column] * m[row, column]);
            if (Math.Abs(length - 1.0) > 1e-9)
            {
                throw Wrong(string.Create(CultureInfo.InvariantCulture, $"port {column + 1} missing or given twice"));
            }
        }

        return new(m, pairs);

        MeasurementDataException Wrong(string found) => TouchstoneErrors.BadKeywordValue(place, found, string.Create(CultureInfo.InvariantCulture, $"{ports} descriptors D i,j and C i,j for each pair and S i for each other port"));
    }

    /// <summary>Turns one matrix in mixed modes into a single-ended one, in place.</summary>
    public void ToSingleEnded(Span<double> re, Span<double> im)
    {
        var n = _m.GetLength(0);
        var half = new Complex[n, n];
        for (var i = 0; i < n; i++)
        {
            for (var j = 0; j < n; j++)
            {
                for (var k = 0; k < n; k++)
                {
                    half[i, j] += _m[k, i] * new Complex(re[(k * n) + j], im[(k * n) + j]);
                }
            }
        }

        for (var i = 0; i < n; i++)
        {
            for (var j = 0; j < n; j++)
            {
                var sum = Complex.Zero;
                for (var k = 0; k < n; k++)
                {
                    sum += half[i, k] * _m[k, j];
                }

                (re[(i * n) + j], im[(i * n) + j]) = (sum.Real, sum.Imaginary);
            }
        }
    }
}
