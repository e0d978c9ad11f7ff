using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;
using RangeReduce.Runs;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 8: how the report came about.</summary>
internal static class MakingSection
{
    private static readonly (string Key, string Label)[] Fields =
    [
        ("title", "Title"), ("identification", "Identification of the report"), ("laboratory", "Laboratory"), ("location", "Place of the measurement"), ("customer", "Customer"),
        ("item", "Item measured"), ("item-received", "Date of receipt of the item"), ("method", "Method"), ("deviations", "Deviations from the method"),
        ("conditions", "Conditions, such as temperature and humidity"), ("decision-rule", "Decision rule"), ("issued-by", "Issued by"), ("issued-on", "Date of issue"),
    ];

    /// <summary>Makes the section.</summary>
    public static ReportSection Build(ReportContext context)
    {
        var run = context.Run;
        var blocks = new List<ReportBlock>
        {
            new HeadingBlock("statements", "Statements of the test report"),
            Statements(run),
            new HeadingBlock("conventions", "Conventions"),
            ConventionTable(run),
            new HeadingBlock("corrections", "Corrections"),
        };
        if (run.Corrections.Count == 0)
        {
            blocks.Add(new ParagraphBlock("No corrections were applied: the figures are those of the data as read."));
        }
        else
        {
            blocks.Add(new TableBlock(
                "In the order in which they were applied.",
                [new("No."), new("Correction"), new("What it did"), new("Inputs")],
                [.. run.Corrections.Select((correction, at) => new TableRow([NumberText.Fixed(at + 1, 0), correction.Name, correction.Text, string.Join(", ", correction.Inputs)]))]));
        }

        blocks.Add(new HeadingBlock("inputs", "Inputs"));
        blocks.Add(Inputs(run));
        blocks.Add(new HeadingBlock("glossary", "Quantities"));
        blocks.Add(Glossary.Table(context.Reduced.Table));
        blocks.Add(new HeadingBlock("cautions", "Cautions"));
        blocks.AddRange(Cautions().Select(text => new ParagraphBlock(text)));
        blocks.Add(new HeadingBlock("software", "Software"));
        blocks.Add(new ParagraphBlock($"Made by rangereduce {context.Options.Version}. The numbers of this report, with the inputs and the formula of each, are in results.json and figures.csv; the curves are in the folder traces."));
        return new("making", "How it was made", blocks);
    }

    // ISO/IEC 17025, 7.8.2 says what a report states; what the manifest does not give is said to be missing.
    private static TableBlock Statements(MeasurementRun run)
    {
        var given = run.Information.ReportFields;
        var rows = new List<TableRow>
        {
            Row("Run", run.Information.Name),
            Row("Date of the measurement", run.Information.Date),
            Row("Measured by", run.Information.Operator),
            Row("Chamber or range", run.Information.Chamber),
        };
        rows.AddRange(Fields.Select(field => Row(field.Label, given.TryGetValue(field.Key, out var value) ? value : null)));
        rows.AddRange(given.Where(pair => !Array.Exists(Fields, field => string.Equals(field.Key, pair.Key, StringComparison.Ordinal))).OrderBy(pair => pair.Key, StringComparer.Ordinal)
            .Select(pair => Row(Words.Capital(pair.Key.Replace('-', ' ')), pair.Value)));
        if (run.Information.Notes is { Length: > 0 } notes)
        {
            rows.Add(Row("Notes", notes));
        }

        return new("Asked for by ISO/IEC 17025, clause 7.8, as far as the manifest gives them.", [new("Statement"), new("As given")], rows);
    }

    private static TableBlock ConventionTable(MeasurementRun run)
    {
        var conventions = run.Conventions;
        return new(
            RichText.Empty,
            [new("Convention"), new("Used"), new("Taken from")],
            [
                new(["Time factor", Conventions.Time(conventions.Time), conventions.TimeFrom]),
                new(["Theta component", $"channel {Conventions.Channel(conventions.ThetaPort)}", conventions.PortsFrom]),
                new(["Phi component", $"channel {Conventions.Channel(conventions.PhiPort)}", conventions.PortsFrom]),
                new(["Hand", "of the wave that the antenna transmits, judged looking along propagation", "IEEE Std 145"]),
                new(["Circular, elliptical, linear", $"called circular up to an axial ratio of {UnitText.Join("3", "dB")}, close to linear above {UnitText.Join("20", "dB")}, elliptical between", "common practice"]),
                new(["Axis of the antenna", $"{NumberText.Trimmed(run.AxisDeg, 2)}° along the cuts", "run.toml or 0"]),
                new(["Range length", run.RangeLengthM is { } length ? UnitText.Join(NumberText.Trimmed(length, 3), "m") : RichText.Quiet("not given"), run.RangeLengthM is null ? NumberText.Missing : "run.toml"]),
                new(["Largest dimension of the antenna", run.LargestDimensionM is { } dimension ? UnitText.Join(NumberText.Trimmed(dimension, 4), "m") : RichText.Quiet("not given"), run.LargestDimensionM is null ? NumberText.Missing : "run.toml"]),
            ]);
    }

    private static TableBlock Inputs(MeasurementRun run) => new(
        "Every file of the measurement folder, with the checksum of its bytes.",
        [new("Id"), new("File"), new("Taken for"), new("Because of"), new("Bytes"), new("SHA-256")],
        [.. run.Inputs.Select(input => new TableRow([input.Id, RichText.Code(input.Path), Role(input), input.Reason, NumberText.Fixed(input.Bytes, 0), RichText.Code(Halves(input.Sha256))]))]);

    private static string Role(InputFile input)
    {
        var kind = input.Kind switch
        {
            InputKind.Manifest => "manifest",
            InputKind.Sweep => "sweep",
            InputKind.Cut => "cuts",
            InputKind.GainTable => "gain of the gain standard",
            InputKind.GainStandardCut => "levels of the gain standard",
            _ => "not read",
        };
        return string.Join(", ", new[] { kind, input.State, input.Source is { } source ? Words.Of(source) : null }.OfType<string>());
    }

    // A space in the middle lets the checksum break there and nowhere else.
    private static string Halves(string checksum) => checksum.Length == 64 ? $"{checksum[..32]} {checksum[32..]}" : checksum;

    private static TableRow Row(string label, string? value) => new([label, string.IsNullOrWhiteSpace(value) ? RichText.Quiet("not given") : value]);

    private static IEnumerable<string> Cautions() =>
    [
        "The figures hold for the item as measured, in the states and at the frequencies named, and for no other item.",
        "Between the measured angles and frequencies curves are interpolated; beyond them nothing is said.",
        "This report makes no statement on exposure of people to radio-frequency fields. Transmitting with the antenna is subject to the local codes on exposure limits, on use of the spectrum and on work at antenna sites; planning and supervision are for persons who are licensed or competent under those codes.",
    ];
}
