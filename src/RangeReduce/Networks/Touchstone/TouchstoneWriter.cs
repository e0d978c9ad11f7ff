using System.Globalization;
using System.Text;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Writes scattering parameters as Touchstone: real and imaginary parts with the shortest digits that read back to the same bits, frequencies in hertz.</summary>
public static class TouchstoneWriter
{
    /// <summary>Writes version 1.</summary>
    /// <param name="sweep">The sweep; all ports must have the same reference.</param>
    /// <param name="target">Takes the text.</param>
    /// <exception cref="ArgumentException">The references differ: version 2.1 can hold that.</exception>
    public static void WriteVersion1(NetworkSweep sweep, TextWriter target)
    {
        ArgumentNullException.ThrowIfNull(sweep);
        ArgumentNullException.ThrowIfNull(target);
        if (sweep.ReferenceOhm.Distinct().Skip(1).Any())
        {
            throw new ArgumentException("Version 1 holds one reference impedance; write version 2.1 instead.", nameof(sweep));
        }

        target.Write($"# Hz S RI R {Text(sweep.ReferenceOhm[0])}\n");
        WriteRecords(sweep, target, columnFirst: true, pairsPerLine: 4);
    }

    /// <summary>Writes version 2.0 or 2.1.</summary>
    /// <param name="sweep">The sweep.</param>
    /// <param name="target">Takes the text.</param>
    /// <param name="version"><c>2.0</c> or <c>2.1</c>.</param>
    /// <exception cref="ArgumentException">The version is another one.</exception>
    public static void WriteVersion2(NetworkSweep sweep, TextWriter target, string version = "2.1")
    {
        ArgumentNullException.ThrowIfNull(sweep);
        ArgumentNullException.ThrowIfNull(target);
        if (version is not ("2.0" or "2.1"))
        {
            throw new ArgumentException("Only versions 2.0 and 2.1 are written.", nameof(version));
        }

        target.Write($"[Version] {version}\n# Hz S RI R {Text(sweep.ReferenceOhm[0])}\n[Number of Ports] {Text(sweep.Ports)}\n");
        if (sweep.Ports == 2)
        {
            target.Write("[Two-Port Data Order] 12_21\n");
        }

        target.Write($"[Number of Frequencies] {Text(sweep.Count)}\n[Reference] {string.Join(' ', sweep.ReferenceOhm.Select(ohm => Text(ohm)))}\n[Network Data]\n");
        WriteRecords(sweep, target, columnFirst: false, pairsPerLine: int.MaxValue);
        target.Write("[End]\n");
    }

    private static void WriteRecords(NetworkSweep sweep, TextWriter target, bool columnFirst, int pairsPerLine)
    {
        var line = new StringBuilder();
        var n = sweep.Ports;
        for (var f = 0; f < sweep.Count; f++)
        {
            line.Clear().Append(Text(sweep.FrequencyHz[f]));
            for (var row = 0; row < n; row++)
            {
                for (var column = 0; column < n; column++)
                {
                    // A two-port of version 1 is the one record that runs down the columns, all on one line.
                    var value = columnFirst && n == 2 ? sweep[f, column, row] : sweep[f, row, column];
                    if (n > 2 && (column > 0 ? column % pairsPerLine == 0 : row > 0))
                    {
                        line.Append('\n');
                    }

                    line.Append(' ').Append(Text(value.Real)).Append(' ').Append(Text(value.Imaginary));
                }
            }

            target.Write(line.Append('\n'));
        }
    }

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
