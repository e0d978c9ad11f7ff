using System.Numerics;

using RangeReduce.Comparison;
using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reporting.Tests;

/// <summary>A reduced run out of closed forms: two circular states and a stowed one, measured and simulated, with all that a report must cope with.</summary>
internal static class SyntheticRun
{
    public static readonly ReportOptions Options = new() { Made = new DateTimeOffset(2026, 1, 31, 10, 0, 0, TimeSpan.Zero), Version = "0.1.0" };

    private static readonly string[] States = ["right", "left", "stowed"];

    public static ReducedRun Make()
    {
        var table = new FigureTable();
        foreach (var state in States)
        {
            foreach (var source in new[] { DataSource.Measured, DataSource.Simulated })
            {
                SyntheticMatch.Add(table, state, source);
                SyntheticPattern.Add(table, state, source);
            }
        }

        SyntheticComparison.Add(table);
        var run = Run();
        return new(run, table, Outcomes(table), Remarks());
    }

    public static MeasurementRun Run() => new()
    {
        Information = new RunInformation
        {
            Name = "Tide-gauge relay antenna, spring build",
            Folder = "sampledata/spring-build",
            Date = "2026-03-12",
            Chamber = "far-field chamber 2",
            ReportFields = new Dictionary<string, string>(StringComparer.Ordinal)
            {
                ["item"] = "crossed dipoles over a round plate, prototype 3",
                ["laboratory"] = "antenna laboratory of the harbour authority",
                ["method"] = "far field, gain comparison with a standard horn (IEEE Std 149)",
            },
        },
        Conventions = new PolarizationConventions { TimeFrom = "run.toml", PhiPort = "-V", PortsFrom = "run.toml" },
        States = [new("right", Hand.Right), new("left", Hand.Left), new("stowed")],
        RangeLengthM = 4.2,
        Inputs = [.. Inputs()],
        UncertaintyTerms = [new("gain-standard", 0.25, "dB"), new("reflectivity", -40.0, "dB"), new("alignment", 0.5, "deg")],
        Corrections =
        [
            new("gain-standard", "Levels of all cuts were turned into gain by comparison with the standard horn; the 3.01 dB between its linear wave and a circular port are taken into account.", ["i8", "i9"]),
            new("probe-leakage", "Cross-polar leakage of the probe was taken out of both components.", ["i1"]),
        ],
    };

    public static double FrequencyOf(string state, DataSource source) => (state switch { "right" => 1.612e9, "left" => 1.627e9, _ => 1.842e9 }) * (source == DataSource.Simulated ? 1.008 : 1.0);

    public static Uncertainty Known(double expanded, params (string Term, double Contribution)[] shares) =>
        new(expanded, 2.0, BudgetState.Partial) { Standard = expanded / 2.0, Shares = [.. shares.Select(share => new UncertaintyShare(share.Term, share.Contribution))] };

    public static double DecibelsOf(Complex field) => 20.0 * Math.Log10(Math.Max(1e-6, field.Magnitude));

    private static IEnumerable<InputFile> Inputs()
    {
        string[] paths = ["run.toml", "right/sweep.s1p", "right/cut_phi000.csv", "right/cut_phi045.csv", "left/sweep.s1p", "left/cuts.csv", "stowed/a_rather_long_name_of_a_file_as_people_write_them_2026-03-12.s1p", "horn/gain.csv", "horn/levels.csv", "notes.txt"];
        for (var at = 0; at < paths.Length; at++)
        {
            var checksum = Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(System.Text.Encoding.UTF8.GetBytes(paths[at])));
            var kind = at switch { 0 => InputKind.Manifest, 1 or 4 or 6 => InputKind.Sweep, 7 => InputKind.GainTable, 8 => InputKind.GainStandardCut, 9 => InputKind.Other, _ => InputKind.Cut };
            var state = Array.Find(States, known => paths[at].StartsWith(known, StringComparison.Ordinal));
            yield return new($"i{at + 1}", paths[at], checksum, 1234 * (at + 7), kind, state, state is null ? null : DataSource.Measured, at == 0 ? "its name" : "run.toml");
        }
    }

    private static List<RequirementOutcome> Outcomes(FigureTable table)
    {
        RequirementOutcome Outcome(int number, Quantity quantity, string text, RequirementVerdict verdict, double worst, double margin, string reason) =>
            new(new Requirement { Id = $"r{number}", Quantity = quantity }, text, verdict, [table.Figures[0].Id], margin, reason) { Worst = worst };
        return
        [
            Outcome(1, QuantityCatalogue.AxialRatio, "Axial ratio of state right on the axis at most 3 dB from 1.58 GHz to 1.64 GHz", RequirementVerdict.Met, 2.31, 0.69, "worst at 1.58 GHz"),
            Outcome(2, QuantityCatalogue.Gain, "Gain of state right, right-hand, on the axis at least 7 dBic from 1.58 GHz to 1.64 GHz", RequirementVerdict.Undecided, 7.12, 0.12, "the margin is smaller than the uncertainty of 0.51 dB"),
            Outcome(3, QuantityCatalogue.ReturnLoss, "Return loss of every state at least 10 dB from 1.60 GHz to 1.64 GHz", RequirementVerdict.NotMet, 2.4, -7.6, "worst in state stowed at 1.60 GHz"),
            Outcome(4, QuantityCatalogue.SwitchingContrast, "Switching contrast of the right hand between right and left at least 15 dB", RequirementVerdict.Met, 19.4, 4.4, "at 1.62 GHz"),
            Outcome(5, QuantityCatalogue.SidelobeLevel, "Sidelobe level of every state at most −10 dB", RequirementVerdict.Undecided, double.NaN, double.NaN, "state stowed has no sidelobe level: no main lobe rises above the noise"),
        ];
    }

    private static List<Remark> Remarks() =>
    [
        new(RemarkSeverity.Fault, "missing-channel", "The cut lacks the phi component; it was left out of every polarization figure.", new SourcePlace("left/cuts.csv", 181, 4), "left"),
        new(RemarkSeverity.Doubt, "peak-not-unique", "The maximum of the stowed state is not unique within its uncertainty, so that no direction is given.", State: "stowed"),
        new(RemarkSeverity.Doubt, "port-balance", "The two probe ports differ by 0.4 dB at the gain standard; the balance was corrected by its reading."),
        new(RemarkSeverity.Note, "not-read", "The file holds nothing that is read.", new SourcePlace("notes.txt")),
    ];
}
