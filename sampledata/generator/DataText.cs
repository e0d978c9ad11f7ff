using System.Globalization;
using System.Numerics;
using System.Text;

namespace RangeReduce.SampleData;

/// <summary>A text file of the sample data: UTF-8 without mark, line feeds, decimal points.</summary>
internal sealed class DataText
{
    // Lowest level that is written: a field that is exactly zero has no decibels.
    private const double LowestDb = -200.0;
    private readonly StringBuilder _text = new();

    /// <summary>Adds a line.</summary>
    public DataText Line(FormattableString line)
    {
        _text.Append(line.ToString(CultureInfo.InvariantCulture)).Append('\n');
        return this;
    }

    /// <summary>Adds lines as they are.</summary>
    public DataText Lines(params IEnumerable<string> lines)
    {
        foreach (var line in lines)
        {
            _text.Append(line).Append('\n');
        }

        return this;
    }

    /// <summary>Gives level and phase as two columns: three decimals of a decibel, two of a degree.</summary>
    public static string LevelAndPhase(Complex value)
    {
        var level = Math.Max(Phasor.LevelDb(value), LowestDb);
        var phase = level > LowestDb ? Phasor.PhaseDeg(value) : 0.0;
        return $"{Fixed(level, 3)},{Fixed(phase, 2)}";
    }

    /// <summary>Prints a number with fixed decimals and without a minus before zero.</summary>
    public static string Fixed(double value, int decimals) =>
        (Math.Round(value, decimals) + 0.0).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    /// <summary>Writes the file, with the folders above it.</summary>
    public void Save(string path)
    {
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        File.WriteAllText(path, _text.ToString(), new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
    }
}
