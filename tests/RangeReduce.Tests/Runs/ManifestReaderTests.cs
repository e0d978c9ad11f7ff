using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Tests.Runs;

public sealed class ManifestReaderTests
{
    private const string Whole = """
        [run]
        name = "Spring build"
        date = 2026-03-14
        operator = "Night shift"
        chamber = "Small chamber"
        notes = "first light"
        antenna = "relay antenna"
        serial = "0007"
        tags = ["crossed dipoles", "prototype"]

        [conventions]
        time = "exp(-iwt)"

        [probe]
        theta = "-V"
        phi = "H"

        [antenna]
        axis = "5 deg"
        largest-dimension = "310 mm"

        [range]
        length = "4.2 m"

        [[state]]
        name = "right"
        intended-hand = "right"
        known-hand = "right"
        sweeps = ["right/*.s1p"]
        cuts = ["right/cut_*.csv"]
        simulated-sweeps = "model/right.s1p"
        simulated-cuts = ["model/right_*.csv"]

        [[state]]
        name = "left"

        [gain-standard]
        table = "horn/gain.csv"
        cuts = ["horn/*.csv"]

        [uncertainty]
        gain-standard = "0.25 dB"
        reflectivity = "-40 dB"
        distance = "5 mm"

        [report]
        laboratory = "Harbour laboratory"
        accent = "#123456"

        [[columns]]
        heading = "E-Field H (dB)"
        meaning = "h level dB"

        [[requirement]]
        quantity = "axial-ratio"
        state = "right"
        band = "1.58 GHz .. 1.64 GHz"
        cone = "30 deg"
        at-most = "3 dB"

        [[requirement]]
        quantity = "hand"
        state = "left"
        equals = "left"

        [[requirement]]
        quantity = "vswr"
        at-most = 1.5

        [[requirement]]
        quantity = "gain"
        component = "right"
        between = "4 dBi .. 7 dBi"
        """;

    [Fact]
    public void Every_table_of_the_contract_is_read_with_its_units()
    {
        var manifest = ManifestReader.Parse(Whole, "run.toml");
        Assert.Equal(("Spring build", "2026-03-14", "0007"), (manifest.Name, manifest.Date, manifest.Serial));
        Assert.Equal("crossed dipoles, prototype", string.Join(", ", manifest.Tags));
        Assert.Equal(TimeFactor.MinusI, manifest.Time);
        Assert.Equal(new ManifestProbe("-V", "H"), manifest.Probe);
        Assert.Equal((5.0, 0.31, 4.2), (manifest.AxisDeg, manifest.LargestDimensionM, manifest.RangeLengthM));
        Assert.Equal("right, left", string.Join(", ", manifest.States.Select(state => state.Name)));
        Assert.Equal((Hand.Right, Hand.Right), (manifest.States[0].IntendedHand, manifest.States[0].KnownHand));
        Assert.Equal("model/right.s1p", Assert.Single(manifest.States[0].SimulatedSweeps).Text);
        Assert.Equal("horn/gain.csv", manifest.GainStandard?.Table?.Text);
        Assert.Equal([new("gain-standard", 0.25, "dB"), new("reflectivity", -40.0, "dB"), new UncertaintyTerm("distance", 0.005, "m")], manifest.UncertaintyTerms);
        Assert.Equal("Harbour laboratory", manifest.ReportFields["laboratory"]);
        Assert.Equal("h level dB", Assert.Single(manifest.Columns).Meaning);
    }

    [Fact]
    public void Requirements_become_a_filter_and_a_bound_in_the_unit_of_the_quantity()
    {
        var requirements = ManifestReader.Parse(Whole, "run.toml").Requirements;
        Assert.Equal("r1, r2, r3, r4", string.Join(", ", requirements.Select(requirement => requirement.Id)));
        Assert.Equal((QuantityCatalogue.AxialRatio, "right", 3.0, 30.0), (requirements[0].Quantity, requirements[0].State, requirements[0].AtMost, requirements[0].ConeDeg));
        Assert.Equal((1.58e9, 1.64e9), (requirements[0].BandLowHz, requirements[0].BandHighHz));
        Assert.Equal(Hand.Left, requirements[1].EqualTo);
        Assert.Equal(1.5, requirements[2].AtMost);
        Assert.Equal((4.0, 7.0, FieldComponent.Right), (requirements[3].AtLeast, requirements[3].AtMost, requirements[3].Component));
        Assert.Equal(Whole.Split('\n').TakeWhile(line => line is not "[[requirement]]").Count() + 1, requirements[0].Line);
    }

    [Theory]
    [InlineData("[run]\n  nmae = \"x\"", 2, 3, "unknown-key", "\"name\"")]
    [InlineData("[rnu]\nname = \"x\"", 1, 1, "unknown-table", "[run]")]
    [InlineData("[[stat]]\nname = \"x\"", 1, 1, "unknown-table", "[[state]]")]
    [InlineData("name = \"x\"", 1, 1, "key-without-table", "")]
    [InlineData("[uncertainty]\nreflectivty = \"-40 dB\"", 2, 1, "unknown-key", "\"reflectivity\"")]
    [InlineData("[[state]]\nname = \"a\"\nsweep = [\"a\"]", 3, 1, "unknown-key", "\"sweeps\"")]
    [InlineData("[[requirement]]\nquantity = \"axialratio\"\nat-most = \"3 dB\"", 2, 12, "unknown-quantity", "\"axial-ratio\"")]
    [InlineData("[[state]]\nname = \"right\"\n[[requirement]]\nquantity = \"gain\"\nstate = \"rigth\"\nat-least = \"3 dBi\"", 5, 9, "unknown-state", "\"right\"")]
    [InlineData("[[state]]\nname = \"a\"\nintended-hand = \"rechts\"", 3, 17, "bad-value", "\"right\"")]
    [InlineData("[conventions]\ntime = \"exp(-jw)\"", 2, 8, "bad-value", "exp(-jwt)")]
    public void An_unknown_name_is_an_error_that_names_the_nearest_known_one(string text, int line, int column, string code, string nearest)
    {
        var error = Assert.Throws<MeasurementDataException>(() => ManifestReader.Parse(text, "run.toml"));
        Assert.Equal(new SourcePlace("run.toml", line, column), error.Place);
        Assert.Equal(code, error.Code);
        Assert.Contains(nearest, error.Advice, StringComparison.Ordinal);
        Assert.Empty(error.Others);
    }

    [Theory]
    [InlineData("[range]\nlength = 4.2", 2, 10, "bad-unit")]
    [InlineData("[range]\nlength = \"4.2 GHz\"", 2, 10, "bad-unit")]
    [InlineData("[range]\nlength = \"-4.2 m\"", 2, 10, "bad-value")]
    [InlineData("[run]\nname = 5", 2, 8, "bad-value")]
    [InlineData("[run]\ndate = \"14.3.2026\"", 2, 8, "bad-date")]
    [InlineData("[run]\nname = \"x\"\nname = \"y\"", 3, 1, "manifest-syntax")]
    [InlineData("[run\nname = \"x\"", 1, 5, "manifest-syntax")]
    [InlineData("[[state]]\nsweeps = [\"a.s1p\"]", 1, 1, "missing-key")]
    [InlineData("[state]\nname = \"a\"", 1, 1, "bad-table")]
    [InlineData("[[state]]\nname = \"a\"\n[[state]]\nname = \"A\"", 3, 0, "duplicate-state")]
    [InlineData("[[state]]\nname = \"a\"\nsweeps = [\"b.s1p\", \"../x.s1p\"]", 3, 20, "bad-pattern")]
    [InlineData("[probe]\ntheta = \"V\"", 2, 1, "missing-key")]
    [InlineData("[probe]\ntheta = \"H\"\nphi = \"-h\"", 2, 1, "bad-value")]
    [InlineData("[probe]\ntheta = \"-\"\nphi = \"V\"", 2, 1, "bad-value")]
    [InlineData("[[requirement]]\nquantity = \"gain\"", 1, 1, "bad-requirement")]
    [InlineData("[[requirement]]\nquantity = \"hand\"\nat-most = \"3 dB\"", 1, 1, "bad-requirement")]
    [InlineData("[[requirement]]\nquantity = \"gain\"\nat-most = \"3 dB\"", 3, 11, "bad-unit")]
    [InlineData("[[requirement]]\nquantity = \"gain\"\nat-most = \"3 dBi\"\nat-least = \"4 dBi\"", 1, 1, "bad-requirement")]
    [InlineData("[[requirement]]\nquantity = \"gain\"\nat-most = \"3 dBi\"\nbetween = \"1 dBi .. 4 dBi\"", 1, 1, "bad-requirement")]
    public void A_wrong_value_is_an_error_at_its_line_and_column(string text, int line, int column, string code)
    {
        var error = Assert.Throws<MeasurementDataException>(() => ManifestReader.Parse(text, "run.toml"));
        Assert.Equal((new SourcePlace("run.toml", line, column), code), (error.Place, error.Code));
    }

    [Fact]
    public void All_errors_of_a_manifest_come_out_in_one_go_in_the_order_of_the_lines()
    {
        const string Text = """
            [run]
            nmae = "x"
            [range]
            length = "4.2"
            [[state]]
            name = "a"
            sweeps = ["/etc/*"]
            [uncertainty]
            noise = "3 dB"
            """;
        var error = Assert.Throws<MeasurementDataException>(() => ManifestReader.Parse(Text, "run.toml"));
        Assert.Equal([2, 4, 7, 9], error.Others.Prepend(error).Select(each => each.Place.Line));
    }

    [Theory]
    [InlineData("run = { name = \"x\" }\nstate = [{ name = \"a\" }, { name = \"b\" }]")]
    [InlineData("run.name = \"x\"\n[[state]]\nname = \"a\"\n[[state]]\nname = \"b\"")]
    [InlineData("\"run\".\"name\" = 'x'\n[[state]]\n\"name\" = \"a\"\n[[\"state\"]]\nname = \"b\"")]
    public void The_ways_that_TOML_has_of_writing_a_table_mean_the_same(string text)
    {
        var manifest = ManifestReader.Parse(text, "run.toml");
        Assert.Equal("x", manifest.Name);
        Assert.Equal("a, b", string.Join(", ", manifest.States.Select(state => state.Name)));
    }

    [Fact]
    public void Text_that_is_not_UTF8_is_refused_and_a_byte_order_mark_is_not()
    {
        using var folder = new ScratchFolder();
        folder.Write("bad.toml", [0x5B, 0xFF, 0xFE]);
        folder.Write("mark.toml", [0xEF, 0xBB, 0xBF, .. "[run]\nname = \"x\""u8]);
        Assert.Equal("manifest-encoding", Assert.Throws<MeasurementDataException>(() => ManifestReader.Read(folder.At("bad.toml"), "bad.toml")).Code);
        Assert.Equal("x", ManifestReader.Read(folder.At("mark.toml"), "mark.toml").Name);
    }
}
