using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>Writes one-port reflection sweeps by the Touchstone 1.1 specification, in each of its three number formats.</summary>
internal static class TouchstoneFile
{
    /// <summary>Writes a file.</summary>
    /// <param name="path">Where to.</param>
    /// <param name="format">RI, MA or DB.</param>
    /// <param name="comments">Comment lines.</param>
    /// <param name="frequencyHz">Frequencies.</param>
    /// <param name="reflection">Reflection coefficients at 50 ohm.</param>
    public static void Write(string path, string format, IEnumerable<string> comments, double[] frequencyHz, Complex[] reflection)
    {
        var text = new DataText().Lines(comments.Select(comment => "! " + comment)).Line($"# GHz S {format} R 50");
        for (var i = 0; i < frequencyHz.Length; i++)
        {
            var (value, gigahertz) = (reflection[i], DataText.Fixed(frequencyHz[i] / 1e9, 4));
            var (first, second) = format switch
            {
                "RI" => (DataText.Fixed(value.Real, 9), DataText.Fixed(value.Imaginary, 9)),
                "MA" => (DataText.Fixed(Complex.Abs(value), 7), DataText.Fixed(Phasor.PhaseDeg(value), 4)),
                "DB" => (DataText.Fixed(Phasor.LevelDb(value), 5), DataText.Fixed(Phasor.PhaseDeg(value), 4)),
                _ => throw new ArgumentOutOfRangeException(nameof(format)),
            };
            text.Line($"{gigahertz} {first} {second}");
        }

        text.Save(path);
    }
}
