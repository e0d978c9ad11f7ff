using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Reporting.Model;
using RangeReduce.Runs;

namespace RangeReduce.Reporting.Tests;

public sealed class ReportModelTests
{
    private static readonly ReportModel Model = ReportModelBuilder.Build(SyntheticRun.Make(), SyntheticRun.Options);

    [Fact]
    public void Sections_follow_each_other_as_a_reviewer_reads() => Assert.Equal(
        ["verdict", "match", "pattern", "over-frequency", "states", "simulated", "uncertainty", "making"],
        Model.Sections.Select(section => section.Id), StringComparer.Ordinal);

    [Fact]
    public void First_sentence_says_hand_axial_ratio_gain_and_band()
    {
        var sentence = Blocks<ParagraphBlock>("verdict").First().Text.Plain;
        Assert.StartsWith("State right is right-hand circular on the axis at 1.60\u202FGHz: axial ratio 2.12\u00A0±\u00A00.38\u202FdB, gain 7.39\u00A0±\u00A00.51\u202FdBic; matched from 1.560 to 1.670\u202FGHz", sentence, StringComparison.Ordinal);
    }

    [Fact]
    public void State_of_the_wrong_hand_is_said_to_be_so()
    {
        var reduced = SyntheticRun.Make();
        var turned = reduced with { Run = reduced.Run with { States = [new("right", Hand.Left), new("left", Hand.Left), new("stowed")] } };
        var model = ReportModelBuilder.Build(turned, SyntheticRun.Options);
        Assert.Contains("though left was intended", model.Sections[0].Blocks.OfType<ParagraphBlock>().First().Text.Plain, StringComparison.Ordinal);
    }

    [Fact]
    public void Pattern_is_shown_at_the_cut_frequency_nearest_to_the_deepest_measured_resonance()
    {
        var texts = Blocks<ParagraphBlock>("pattern").Select(block => block.Text.Plain).ToList();
        Assert.StartsWith("Shown at 1.60\u202FGHz, the frequency of the cuts nearest to the deepest resonance at 1.610\u202FGHz", texts[0], StringComparison.Ordinal);
        Assert.StartsWith("Shown at 1.62\u202FGHz", texts[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Faults_come_before_doubts_and_doubts_before_notes()
    {
        var labels = Blocks<RemarkListBlock>("verdict").Single().Items.Select(item => item.Label);
        Assert.Equal(["fault", "doubt", "doubt", "note"], labels, StringComparer.Ordinal);
    }

    [Fact]
    public void Figure_without_number_is_a_dash_and_its_reason_stands_below()
    {
        var table = Blocks<TableBlock>("verdict").First();
        var row = table.Rows.First(known => known.Cells[0].Plain.StartsWith("Front-to-back ratio", StringComparison.Ordinal));
        Assert.StartsWith("\u2013", row.Cells[4].Plain, StringComparison.Ordinal);
        Assert.Contains(table.Notes, note => note.Plain.EndsWith("The cut has no main lobe above the noise floor.", StringComparison.Ordinal));
    }

    [Fact]
    public void Deviation_within_its_uncertainty_is_quiet_and_one_beyond_it_is_not()
    {
        var rows = Blocks<TableBlock>("simulated").First().Rows;
        TextTone Tone(string label) => rows.First(row => string.Equals(row.Cells[1].Plain, label, StringComparison.Ordinal)).Cells[5].Spans[0].Tone;
        Assert.Equal(TextTone.Quiet, Tone("Gain, right-hand, on the axis"));
        Assert.Equal(TextTone.Normal, Tone("Return loss, at the resonance"));
    }

    [Fact]
    public void Statement_that_the_manifest_does_not_give_is_printed_as_not_given()
    {
        var rows = Blocks<TableBlock>("making").First().Rows.ToDictionary(row => row.Cells[0].Plain, row => row.Cells[1].Plain, StringComparer.Ordinal);
        Assert.Equal("not given", rows["Customer"]);
        Assert.Equal("antenna laboratory of the harbour authority", rows["Laboratory"]);
    }

    [Fact]
    public void Every_input_is_listed_with_its_checksum()
    {
        var inputs = Blocks<TableBlock>("making").First(table => table.Columns[^1].Head.Plain is "SHA-256");
        Assert.Equal(SyntheticRun.Run().Inputs.Select(input => input.Sha256), inputs.Rows.Select(row => row.Cells[^1].Plain.Replace(" ", string.Empty, StringComparison.Ordinal)), StringComparer.Ordinal);
    }

    [Fact]
    public void Reduction_that_rounding_makes_whole_is_not_printed_as_all()
    {
        var table = Blocks<TableBlock>("states").First(known => known.Columns.Count == 7);
        Assert.DoesNotContain(table.Rows, row => row.Cells[6].Plain is "100.0");
        Assert.Contains(table.Rows, row => row.Cells[6].Plain is ">\u00A099.9");
    }

    [Fact]
    public void Run_without_sweeps_and_cuts_still_gives_a_report()
    {
        var run = new MeasurementRun { Information = new RunInformation { Name = "empty", Folder = "empty" } };
        var model = ReportModelBuilder.Build(new ReducedRun(run, new FigureTable(), [], [new Remark(RemarkSeverity.Fault, "nothing", "Nothing was readable.")]), SyntheticRun.Options);
        Assert.Equal(["verdict", "uncertainty", "making"], model.Sections.Select(section => section.Id), StringComparer.Ordinal);
        Assert.Empty(model.Plots);
        using var pdf = new MemoryStream();
        PdfReportWriter.Write(model, pdf);
        Assert.True(pdf.Length > 5000);
    }

    private static IEnumerable<T> Blocks<T>(string section)
        where T : ReportBlock => Model.Sections.First(known => string.Equals(known.Id, section, StringComparison.Ordinal)).Blocks.OfType<T>();
}
