using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace RangeReduce.SampleData;

/// <summary>Writes a handful of directions of the designed antenna with the field and with everything that NEC-2 itself says about its polarization, as a witness for tests.</summary>
internal static class NecReferenceFile
{
    private static readonly JsonSerializerOptions Layout = new() { WriteIndented = false, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes the file.</summary>
    public static void Write(string path)
    {
        string[] title = ["Crossed dipoles over a round plate, design, state right", "Single directions at 1.62 GHz"];
        var states = new[] { "right", "left" };
        var text = new DataText().Line($"{{").Lines(
            "  \"about\": \"Far field of two crossed dipoles over a round plate, as printed by NEC-2 (G. J. Burke and A. J. Poggio, Numerical Electromagnetics Code, 1981, public domain; C translation nec2c 1.3).\",",
            "  \"made\": \"Design geometry of the sample data, states right and left, 1.62 GHz, 1 V peak at the feed; written by sampledata/generator.\",",
            "  \"conventions\": \"exp(+jwt). E is the far field times distance (volts, degrees). gainDb: partial gains of theta and phi and their sum over the accepted power. axialRatio is NEC-2's: minor over major. tiltDeg is NEC-2's: major axis from theta-hat towards phi-hat, -90 to 90. sense is NEC-2's: RIGHT where E_phi lags E_theta by 90 degrees, as in IEEE Std 145.\",",
            "  \"directions\": [");
        var rows = new List<string>();
        for (var state = 0; state < states.Length; state++)
        {
            var directions = NecRun.Run(DipolePairDeck.Write(title, Scenario.Design[state], "FR 0 1 0 0 1620 0", "RP 0 10 6 1000 0 0 20 45"))[0].Directions;
            rows.AddRange(directions.Where(IsWanted).Select(direction => "    " + RowOf(states[state], direction).ToJsonString(Layout)));
        }

        text.Lines(rows.Select((row, index) => index < rows.Count - 1 ? row + "," : row)).Lines("  ]", "}").Save(path);
    }

    // Both hemispheres in three cuts, and two directions across the axis from one of them.
    private static bool IsWanted(NecDirection direction) =>
        (direction.PhiDeg is 0.0 or 45.0 or 90.0 && direction.ThetaDeg is 0.0 or 20.0 or 40.0 or 80.0 or 100.0 or 140.0) || (direction is { PhiDeg: 225.0, ThetaDeg: 40.0 or 100.0 });

    private static JsonObject RowOf(string state, NecDirection direction) => new()
    {
        ["state"] = state,
        ["thetaDeg"] = direction.ThetaDeg,
        ["phiDeg"] = direction.PhiDeg,
        ["eTheta"] = new JsonArray(Printed(direction.ETheta.Magnitude, 8), Printed(Phasor.PhaseDeg(direction.ETheta), 2)),
        ["ePhi"] = new JsonArray(Printed(direction.EPhi.Magnitude, 8), Printed(Phasor.PhaseDeg(direction.EPhi), 2)),
        ["gainDb"] = new JsonArray(Printed(direction.GainThetaDb, 2), Printed(direction.GainPhiDb, 2), Printed(direction.GainTotalDb, 2)),
        ["axialRatio"] = direction.AxialRatio,
        ["tiltDeg"] = direction.TiltDeg,
        ["sense"] = direction.Sense,
    };

    private static JsonValue Printed(double value, int decimals) => JsonValue.Create(Math.Round(value, decimals) + 0.0);
}
