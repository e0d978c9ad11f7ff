namespace RangeReduce.SampleData;

/// <summary>Writes the data of one lab run: sweeps, cuts, gain standard, simulated counterpart, truth.</summary>
/// <param name="root">The sample data folder.</param>
/// <param name="run">Name of the run.</param>
/// <param name="date">Date of the run as the files state it.</param>
internal sealed class RunFolderWriter(string root, string run, string date)
{
    // The three number formats of Touchstone 1.1 all occur.
    private static readonly string[] SweepFormats = ["RI", "MA", "DB"];

    /// <summary>Writes everything that is computed.</summary>
    /// <param name="asBuilt">The antenna in the chamber, by state.</param>
    /// <param name="design">The simulated antenna, by state.</param>
    /// <param name="circularState">The state that is measured with the dual-circular probe too; null for none.</param>
    public void Write(SimulatedAntenna[] asBuilt, SimulatedAntenna[] design, string? circularState)
    {
        for (var i = 0; i < Scenario.States.Length; i++)
        {
            var state = Scenario.States[i];
            WriteSweep(state, SweepFormats[i], asBuilt[i]);
            WriteCuts(state, "cut", Probe.Linear, asBuilt[i]);
            WriteModel(state, design[i]);
            if (string.Equals(state, circularState, StringComparison.Ordinal))
            {
                WriteCuts(state, "circular", Probe.Circular, asBuilt[i]);
            }
        }

        WriteGainTable();
        WriteStandard("horn_h", 0.0, Probe.Linear, asBuilt[0].PatternHz);
        WriteStandard("horn_v", 90.0, Probe.Linear, asBuilt[0].PatternHz);
        if (circularState is not null)
        {
            WriteStandard("horn_circular_roll000", 0.0, Probe.Circular, asBuilt[0].PatternHz);
            WriteStandard("horn_circular_roll090", 90.0, Probe.Circular, asBuilt[0].PatternHz);
        }

        TruthFile.Write(PathOf("truth.json"), asBuilt, design);
    }

    private void WriteSweep(string state, string format, SimulatedAntenna antenna)
    {
        var name = $"{state}/s11.s1p";
        string[] comments = ["Reflection sweep, tide-gauge relay antenna, state " + state, "Date: " + date, "One-port calibration, port extended to the feed; loss of the pigtail left in"];
        TouchstoneFile.Write(PathOf(name), format, comments, antenna.SweepHz, ReflectionBench.Measure(antenna, NoiseOf(name)));
    }

    private void WriteCuts(string state, string kind, Probe probe, SimulatedAntenna antenna)
    {
        for (var cut = 0; cut < SimulatedAntenna.CutPhiDeg.Length; cut++)
        {
            var phi = SimulatedAntenna.CutPhiDeg[cut];
            var name = $"{state}/{kind}_phi{phi:000}.csv";
            var ports = probe.IsCircular ? "right-hand and left-hand" : "H along theta, V along phi";
            string[] comments = ["Antenna: tide-gauge relay antenna", "State: " + state, "Date: " + date, $"Probe: dual port, {ports}", "Levels: receiver, exp(+jwt)"];
            CutTable.WriteMeasured(PathOf(name), comments, antenna.PatternHz, phi, probe, ChamberModel.Measure(antenna, cut, probe, NoiseOf(name)));
        }
    }

    private void WriteModel(string state, SimulatedAntenna antenna)
    {
        string[] common = ["Simulation: NEC-2, design geometry, state " + state, $"Deck: decks/design-{state}.nec"];
        TouchstoneFile.Write(PathOf($"model/{state}.s1p"), "RI", common, antenna.SweepHz, antenna.Reflection);
        for (var cut = 0; cut < SimulatedAntenna.CutPhiDeg.Length; cut++)
        {
            var phi = SimulatedAntenna.CutPhiDeg[cut];
            string[] comments = [.. common, $"Phi: {phi} deg", "Levels: gain over the power accepted, exp(+jwt)"];
            CutTable.WriteSimulated(PathOf($"model/{state}_phi{phi:000}.csv"), comments, antenna, cut);
        }
    }

    private void WriteGainTable()
    {
        var text = new DataText().Lines("# Gain standard: linearly polarized horn, realized gain", "Frequency [GHz],Gain [dBi]");
        foreach (var hertz in GainStandardHorn.TableHz)
        {
            text.Line($"{DataText.Fixed(hertz / 1e9, 3)},{DataText.Fixed(GainStandardHorn.TableGainDbi(hertz), 3)}");
        }

        text.Save(PathOf("horn/gain.csv"));
    }

    private void WriteStandard(string file, double rollDeg, Probe probe, double[] frequencyHz)
    {
        var (name, along) = ($"horn/{file}.csv", rollDeg > 0.0 ? "phi" : "theta");
        var text = new DataText().Lines("# Gain standard on the axis, its field along " + along, "# Date: " + date, "# Levels: receiver, exp(+jwt)")
            .Line($"Frequency [GHz],Theta [deg],{probe.FirstName} [dB],{probe.FirstName} [deg],{probe.SecondName} [dB],{probe.SecondName} [deg]");
        var noise = NoiseOf(name);
        foreach (var hertz in frequencyHz)
        {
            var reading = ChamberModel.MeasureStandard(hertz, rollDeg, probe, noise);
            text.Line($"{DataText.Fixed(hertz / 1e9, 2)},0,{DataText.LevelAndPhase(reading.First)},{DataText.LevelAndPhase(reading.Second)}");
        }

        text.Save(PathOf(name));
    }

    private SeededNoise NoiseOf(string name) => new($"{run}/{name}");

    private string PathOf(string name) => Path.Combine(root, run, name);
}
