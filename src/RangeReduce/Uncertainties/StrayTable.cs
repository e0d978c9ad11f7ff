namespace RangeReduce.Uncertainties;

/// <summary>The phase of a stray ray along a cut, for each number of turns that trials draw from.</summary>
/// <remarks>A stray ray comes and goes a few times while the antenna turns once; how often is not known, so trials draw it.</remarks>
internal sealed class StrayTable
{
    /// <summary>Most whole turns of the phase over the cut.</summary>
    public const int MostTurns = 12;

    private readonly double[][] _cos = new double[(2 * MostTurns) + 1][];
    private readonly double[][] _sin = new double[(2 * MostTurns) + 1][];

    /// <summary>Fills the table.</summary>
    /// <param name="angles">Number of angles of the cut.</param>
    public StrayTable(int angles)
    {
        for (var turns = -MostTurns; turns <= MostTurns; turns++)
        {
            var (cos, sin) = (new double[angles], new double[angles]);
            for (var i = 0; i < angles; i++)
            {
                (sin[i], cos[i]) = Math.SinCos(2.0 * Math.PI * turns * i / angles);
            }

            (_cos[turns + MostTurns], _sin[turns + MostTurns]) = (cos, sin);
        }
    }

    /// <summary>Gives cosine and sine of the phase along the cut.</summary>
    public (double[] Cos, double[] Sin) Of(int turns) => (_cos[turns + MostTurns], _sin[turns + MostTurns]);
}
