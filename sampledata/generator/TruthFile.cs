using System.Numerics;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace RangeReduce.SampleData;

/// <summary>Writes down what was put into a run, so that a reader can see whether it came back.</summary>
internal static class TruthFile
{
    private static readonly JsonSerializerOptions Layout = new() { WriteIndented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes truth.json.</summary>
    /// <param name="path">Where to.</param>
    /// <param name="asBuilt">The antenna in the chamber, by state.</param>
    /// <param name="design">The simulated antenna, by state.</param>
    public static void Write(string path, SimulatedAntenna[] asBuilt, SimulatedAntenna[] design)
    {
        var root = new JsonObject
        {
            ["about"] = "What was put into this run. asBuilt is the antenna that stood in the chamber, free of the errors of the chamber; design is the simulated counterpart.",
            ["conventions"] = "exp(+jwt); hand by IEEE Std 145; tilt from theta-hat towards phi-hat of the cut at phi 0; realized partial gains on the axis, 50 ohm; axial ratio major over minor",
            ["asBuilt"] = StatesOf(asBuilt),
            ["design"] = StatesOf(design),
            ["chamber"] = Chamber(),
        };
        new DataText().Lines(root.ToJsonString(Layout)).Save(path);
    }

    private static JsonObject StatesOf(SimulatedAntenna[] antennas)
    {
        var states = new JsonObject();
        for (var i = 0; i < antennas.Length; i++)
        {
            states[Scenario.States[i]] = StateOf(antennas[i]);
        }

        return states;
    }

    private static JsonObject StateOf(SimulatedAntenna antenna)
    {
        var sweep = SweepTruth.Of(antenna.SweepHz, antenna.Reflection);
        var axis = new JsonArray();
        for (var f = 0; f < antenna.PatternHz.Length; f++)
        {
            axis.Add(OnAxis(antenna, f));
        }

        return new()
        {
            ["resonanceHz"] = Round(sweep.ResonanceHz, 0),
            ["returnLossDb"] = Round(sweep.ReturnLossDb, 4),
            ["band10DbLowHz"] = Round(sweep.BandLowHz, 0),
            ["band10DbHighHz"] = Round(sweep.BandHighHz, 0),
            ["onAxis"] = axis,
        };
    }

    private static JsonObject OnAxis(SimulatedAntenna antenna, int f)
    {
        var field = antenna.Realized[f, 0, SimulatedAntenna.AxisIndex];
        var (right, left) = (Complex.Abs(field.Right), Complex.Abs(field.Left));
        var axialRatioDb = 20.0 * Math.Log10((right + left) / Math.Abs(right - left));
        var tilt = (field.Right.Phase - field.Left.Phase) * 90.0 / Math.PI;
        return new()
        {
            ["frequencyHz"] = antenna.PatternHz[f],
            ["realizedGainRightDbi"] = Round(Phasor.LevelDb(field.Right), 3),
            ["realizedGainLeftDbi"] = Round(Phasor.LevelDb(field.Left), 3),
            ["realizedGainTotalDbi"] = Round(10.0 * Math.Log10(field.Power), 3),
            ["axialRatioDb"] = Round(axialRatioDb, 3),
            ["tiltDeg"] = Round(tilt > 90.0 ? tilt - 180.0 : tilt <= -90.0 ? tilt + 180.0 : tilt, 2),
            ["hand"] = axialRatioDb > 40.0 ? "linear" : right > left ? "right" : "left",
        };
    }

    private static JsonObject Chamber() => new()
    {
        ["receiverScaleDb"] = ChamberModel.ReceiverScaleDb,
        ["receiverSlopeDbPer100MHz"] = ChamberModel.ReceiverSlopeDb,
        ["electricalPathM"] = ChamberModel.PathM,
        ["noiseLevelDb"] = ChamberModel.NoiseLevelDb,
        ["strayDb"] = ChamberModel.StrayDb,
        ["feedLineLossDb"] = ChamberModel.FeedLineLossDb,
        ["driftDb"] = ChamberModel.DriftDb,
        ["driftDeg"] = ChamberModel.DriftDeg,
        ["linearProbe"] = ProbeOf(Probe.Linear),
        ["circularProbe"] = ProbeOf(Probe.Circular),
        ["gainTableErrorDb"] = GainStandardHorn.TableErrorDb,
        ["pigtailLossDb"] = ReflectionBench.PigtailLossDb,
        ["sweepRippleDb"] = ReflectionBench.RippleDb,
        ["sweepNoiseDb"] = ReflectionBench.NoiseDb,
    };

    private static JsonObject ProbeOf(Probe probe) => new()
    {
        ["balanceDb"] = Round(Phasor.LevelDb(probe.Balance), 3),
        ["balanceDeg"] = Round(Phasor.PhaseDeg(probe.Balance), 3),
        ["leakageDb"] = Round(Phasor.LevelDb(probe.LeakIntoFirst), 3),
    };

    private static JsonValue? Round(double value, int decimals) => double.IsFinite(value) ? JsonValue.Create(Math.Round(value, decimals) + 0.0) : null;
}
