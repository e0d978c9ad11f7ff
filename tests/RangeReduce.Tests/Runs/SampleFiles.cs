using System.Globalization;
using System.Text;

namespace RangeReduce.Tests.Runs;

/// <summary>Writes small files of the kinds that a measurement folder holds. The numbers are of no interest beyond being told apart by their seed.</summary>
internal static class SampleFiles
{
    public static readonly double[] FrequencyHz = [1.60e9, 1.62e9, 1.64e9];
    public static readonly double[] ThetaDeg = [-60, -30, 0, 30, 60];

    /// <summary>A one-port sweep by the Touchstone 1.1 specification.</summary>
    public static void Sweep(this ScratchFolder folder, string path, double seed = 0, string? extraRow = null)
    {
        var text = new StringBuilder("! reflection\n# HZ S RI R 50\n");
        foreach (var hertz in FrequencyHz)
        {
            text.Append(CultureInfo.InvariantCulture, $"{hertz:R} {0.1 + (seed / 100):R} {-0.2 - (seed / 100):R}\n");
        }

        folder.Write(path, text.Append(extraRow).ToString());
    }

    /// <summary>A long-form table of cuts: one row a frequency, phi and theta.</summary>
    /// <param name="folder">Where.</param>
    /// <param name="path">Path of the file.</param>
    /// <param name="channels">Channels, each as real and imaginary part.</param>
    /// <param name="phiDeg">Angles phi; with none the column is left away.</param>
    /// <param name="seed">Told apart by it.</param>
    public static void Cut(this ScratchFolder folder, string path, string[] channels, double[] phiDeg, double seed = 0)
    {
        var text = new StringBuilder("frequency [Hz],");
        text.Append(phiDeg.Length > 0 ? "phi [deg]," : string.Empty).Append("theta [deg]");
        foreach (var channel in channels)
        {
            text.Append(CultureInfo.InvariantCulture, $",{channel} re,{channel} im");
        }

        text.Append('\n');
        foreach (var phi in phiDeg.Length > 0 ? phiDeg : [double.NaN])
        {
            foreach (var hertz in FrequencyHz)
            {
                foreach (var theta in ThetaDeg)
                {
                    text.Append(CultureInfo.InvariantCulture, $"{hertz:R},");
                    _ = double.IsNaN(phi) ? text : text.Append(CultureInfo.InvariantCulture, $"{phi:R},");
                    text.Append(CultureInfo.InvariantCulture, $"{theta:R}");
                    for (var at = 0; at < channels.Length; at++)
                    {
                        text.Append(CultureInfo.InvariantCulture, $",{0.5 + at + seed + (theta / 1000):R},{0.25 - at + (phi is > 0 ? phi / 1000 : 0):R}");
                    }

                    text.Append('\n');
                }
            }
        }

        folder.Write(path, text.ToString());
    }

    /// <summary>A gain table of a standard.</summary>
    public static void GainTable(this ScratchFolder folder, string path, double seed = 0) =>
        folder.Write(path, string.Create(CultureInfo.InvariantCulture, $"frequency [GHz],gain [dBi]\n1.5,{10.1 + seed:R}\n1.6,{10.6 + seed:R}\n1.7,{11.0 + seed:R}\n"));

    /// <summary>A whole run without manifest: two states, each measured and simulated, and a gain standard.</summary>
    public static void WholeRun(this ScratchFolder folder)
    {
        folder.Sweep("right/s11.s1p", 1);
        folder.Cut("right/cut_phi0.csv", ["H", "V"], [0], 1);
        folder.Cut("right/cut_phi90.csv", ["H", "V"], [90], 2);
        folder.Sweep("left/s11.s1p", 2);
        folder.Cut("left/cuts.csv", ["H", "V"], [0, 45, 90], 3);
        folder.Sweep("model/right.s1p", 4);
        folder.Cut("model/right_cuts.csv", ["theta", "phi"], [0, 90], 4);
        folder.Sweep("model/left.s1p", 5);
        folder.GainTable("horn/gain.csv");
        folder.Cut("horn/levels.csv", ["H", "V"], [0], 9);
        folder.Write("README.txt", "Taken on a rainy day.\n");
    }
}
