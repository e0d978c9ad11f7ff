namespace RangeReduce.Networks.Touchstone;

/// <summary>Where the pairs of a record go in the matrix.</summary>
/// <param name="ports">Number of ports.</param>
/// <param name="format">Which elements are given.</param>
/// <param name="columnFirst">True where a two-port record runs 11 21 12 22, false for 11 12 21 22.</param>
internal sealed class MatrixLayout(int ports, MatrixFormat format, bool columnFirst)
{
    private readonly int[] _targets = Targets(ports, format, columnFirst);

    /// <summary>Gets the pairs of a record.</summary>
    public int Pairs => _targets.Length;

    /// <summary>Gets the numbers of a record, the frequency included.</summary>
    public int Numbers => 1 + (2 * _targets.Length);

    /// <summary>Spreads the pairs of a record over a row-major matrix; a triangle is mirrored without conjugation.</summary>
    /// <param name="pairs">Real and imaginary parts in turn.</param>
    /// <param name="re">Real parts of the matrix.</param>
    /// <param name="im">Imaginary parts of the matrix.</param>
    public void Spread(ReadOnlySpan<double> pairs, Span<double> re, Span<double> im)
    {
        for (var i = 0; i < _targets.Length; i++)
        {
            var target = _targets[i];
            (re[target], im[target]) = (pairs[2 * i], pairs[(2 * i) + 1]);
            if (format != MatrixFormat.Full)
            {
                var mirror = ((target % ports) * ports) + (target / ports);
                (re[mirror], im[mirror]) = (re[target], im[target]);
            }
        }
    }

    private static int[] Targets(int ports, MatrixFormat format, bool columnFirst)
    {
        if (ports == 2 && format == MatrixFormat.Full)
        {
            return columnFirst ? [0, 2, 1, 3] : [0, 1, 2, 3];
        }

        var targets = new List<int>();
        for (var row = 0; row < ports; row++)
        {
            var (first, last) = format switch
            {
                MatrixFormat.Lower => (0, row),
                MatrixFormat.Upper => (row, ports - 1),
                _ => (0, ports - 1),
            };
            for (var column = first; column <= last; column++)
            {
                targets.Add((row * ports) + column);
            }
        }

        return [.. targets];
    }
}
