using System.Diagnostics;
using System.Globalization;
using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>Runs the program nec2c on a deck and reads what it printed.</summary>
internal static class NecRun
{
    /// <summary>Runs a deck.</summary>
    /// <param name="deck">Text of the deck.</param>
    /// <returns>One entry a frequency, in the order of the FR cards.</returns>
    public static List<NecFrequency> Run(string deck)
    {
        var folder = Directory.CreateTempSubdirectory("dipole-pair-");
        try
        {
            var (input, output) = (Path.Combine(folder.FullName, "deck.nec"), Path.Combine(folder.FullName, "deck.out"));
            File.WriteAllText(input, deck);
            using var process = Process.Start(new ProcessStartInfo("nec2c", [$"-i{input}", $"-o{output}"])) ?? throw new InvalidOperationException("nec2c did not start.");
            process.WaitForExit();
            return process.ExitCode == 0 ? Parse(File.ReadAllLines(output)) : throw new InvalidOperationException("nec2c refused the deck.");
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    private static List<NecFrequency> Parse(string[] lines)
    {
        var found = new List<NecFrequency>();
        for (var i = 0; i < lines.Length; i++)
        {
            if (lines[i].Contains("FREQUENCY :", StringComparison.Ordinal))
            {
                var megahertz = Number(Words(lines[i].Split(':')[1])[0]);
                found.Add(new(Math.Round(megahertz * 1e6), default, 0.0, []));
            }
            else if (lines[i].Contains("ANTENNA INPUT PARAMETERS", StringComparison.Ordinal))
            {
                var words = Words(lines[i + 3]);
                found[^1] = found[^1] with { ImpedanceOhm = new(Number(words[6]), Number(words[7])), InputPowerW = Number(words[10]) };
            }
            else if (lines[i].Contains("RADIATION PATTERNS", StringComparison.Ordinal))
            {
                found[^1] = found[^1] with { Directions = [.. lines.Skip(i + 5).TakeWhile(IsRow).Select(Direction)] };
            }
        }

        return found;
    }

    // The table ends with an empty line or, after the last one, with the echo of the next card.
    private static bool IsRow(string line) => line.Trim().Length > 0 && !line.Contains("CARD", StringComparison.Ordinal);

    private static NecDirection Direction(string line)
    {
        var words = Words(line);
        var hasSense = words.Length == 12;
        var numbers = words.Where((_, index) => !hasSense || index != 7).Select(Number).ToArray();
        return new(numbers[0], numbers[1], numbers[2], numbers[3], numbers[4], numbers[5], numbers[6], hasSense ? words[7] : string.Empty, Phasor(numbers[7], numbers[8]), Phasor(numbers[9], numbers[10]));
    }

    private static Complex Phasor(double magnitude, double phaseDeg) => Complex.FromPolarCoordinates(magnitude, phaseDeg * Math.PI / 180.0);

    private static string[] Words(string line) => line.Split(' ', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries);

    private static double Number(string word) => double.Parse(word, NumberStyles.Float, CultureInfo.InvariantCulture);
}
