namespace RangeReduce.SampleData;

/// <summary>Writes pattern cuts as tables in long form: one row for each frequency and angle.</summary>
internal static class CutTable
{
    private const int SimulatedStepDeg = 4;

    /// <summary>Writes the readings of one measured cut.</summary>
    public static void WriteMeasured(string path, IEnumerable<string> comments, double[] frequencyHz, int phiDeg, Probe probe, Jones[,] readings)
    {
        var text = new DataText().Lines(comments.Select(comment => "# " + comment))
            .Line($"Frequency [GHz],Phi [deg],Theta [deg],{probe.FirstName} [dB],{probe.FirstName} [deg],{probe.SecondName} [dB],{probe.SecondName} [deg]");
        for (var f = 0; f < frequencyHz.Length; f++)
        {
            for (var n = 0; n < SimulatedAntenna.AngleDeg.Length; n++)
            {
                text.Line($"{DataText.Fixed(frequencyHz[f] / 1e9, 2)},{phiDeg},{SimulatedAntenna.AngleDeg[n]},{DataText.LevelAndPhase(readings[f, n].First)},{DataText.LevelAndPhase(readings[f, n].Second)}");
            }
        }

        text.Save(path);
    }

    /// <summary>Writes one simulated cut as absolute gain with phase, on a coarser grid of angles.</summary>
    public static void WriteSimulated(string path, IEnumerable<string> comments, SimulatedAntenna antenna, int cut)
    {
        var text = new DataText().Lines(comments.Select(comment => "# " + comment))
            .Line($"Frequency [GHz],Theta [deg],E_theta [dBi],E_theta [deg],E_phi [dBi],E_phi [deg]");
        for (var f = 0; f < antenna.PatternHz.Length; f++)
        {
            for (var n = 0; n < SimulatedAntenna.AngleDeg.Length; n += SimulatedStepDeg / SimulatedAntenna.AngleStepDeg)
            {
                var field = antenna.Gain[f, cut, n];
                text.Line($"{DataText.Fixed(antenna.PatternHz[f] / 1e9, 2)},{SimulatedAntenna.AngleDeg[n]},{DataText.LevelAndPhase(field.First)},{DataText.LevelAndPhase(field.Second)}");
            }
        }

        text.Save(path);
    }
}
