using System.Text;
using System.Text.Json.Nodes;
using RangeReduce.Diagnostics;
using RangeReduce.Networks.Touchstone;

namespace RangeReduce.Tests.Networks.Touchstone;

/// <summary>
/// Worked examples of the Touchstone rules (IBIS Open Forum, Touchstone File Format Specification, revisions 1.1, 2.0 and 2.1). All texts are invented;
/// expected values were computed in closed form from declared matrices. Each example says whether its rule stands in the specification, is from memory, or is our choice.
/// </summary>
public sealed class TouchstoneExampleTests
{
    private static readonly Dictionary<string, JsonNode> Examples = JsonNode.Parse(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Data", "touchstone-examples.json")))!["examples"]!
        .AsArray().ToDictionary(example => (string)example!["name"]!, example => example!, StringComparer.Ordinal);

    public static TheoryData<string> Read => [.. Examples.Where(example => example.Value["expected"] is not null).Select(example => example.Key)];

    public static TheoryData<string> Refused => [.. Examples.Where(example => example.Value["expected_error"] is not null).Select(example => example.Key)];

    [Fact]
    public void There_are_examples_of_both_kinds()
    {
        Assert.True(Read.Count >= 60);
        Assert.True(Refused.Count >= 25);
    }

    [Theory]
    [MemberData(nameof(Read))]
    public void A_file_by_the_rules_gives_its_matrices(string name)
    {
        var example = Examples[name];
        var expected = example["expected"]!;
        var file = Parse(example);
        var sweep = file.Sweep;

        Assert.Equal(expected["frequencies_hz"]!.AsArray().Select(hertz => (double)hertz!), sweep.FrequencyHz);
        Assert.Equal((int)expected["ports"]!, sweep.Ports);
        Assert.Equal(expected["z0"]!.AsArray().Select(ohm => (double)ohm!), sweep.ReferenceOhm);
        var matrices = expected["s"]!.AsArray();
        for (var f = 0; f < sweep.Count; f++)
        {
            var pairs = matrices[f]!.AsArray();
            for (var i = 0; i < pairs.Count; i++)
            {
                var value = sweep[f, i / sweep.Ports, i % sweep.Ports];
                Assert.Equal((double)pairs[i]![0]!, value.Real, 1e-9);
                Assert.Equal((double)pairs[i]![1]!, value.Imaginary, 1e-9);
            }
        }

        var noise = expected["noise"]?.AsArray() ?? [];
        Assert.Equal(noise.Count, file.Noise.Count);
        for (var i = 0; i < noise.Count; i++)
        {
            Assert.Equal((double)noise[i]!["frequency_hz"]!, file.Noise[i].FrequencyHz);
            Assert.Equal((double)noise[i]!["minimum_noise_figure_db"]!, file.Noise[i].MinimumNoiseFigureDb, 1e-9);
            Assert.Equal((double)noise[i]!["source_reflection"]![0]!, file.Noise[i].SourceReflection.Real, 1e-9);
            Assert.Equal((double)noise[i]!["source_reflection"]![1]!, file.Noise[i].SourceReflection.Imaginary, 1e-9);
            Assert.Equal((double)noise[i]!["noise_resistance_ohm"]!, file.Noise[i].NoiseResistanceOhm, 1e-9);
        }

        var warnings = (expected["warnings"]?.AsArray() ?? []).Select(code => (string)code!).Order(StringComparer.Ordinal);
        Assert.Equal(warnings, file.Remarks.Select(remark => remark.Code).Order(StringComparer.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Refused))]
    public void A_file_against_the_rules_is_refused_where_the_fault_stands(string name)
    {
        var example = Examples[name];
        var error = Assert.Throws<MeasurementDataException>(() => Parse(example));
        Assert.Equal((string)example["expected_error"]!, error.Code);
        if ((int?)example["expected_line"] is { } line)
        {
            Assert.Equal(line, error.Place.Line);
        }
    }

    private static TouchstoneFile Parse(JsonNode example) => TouchstoneReader.Parse(Encoding.UTF8.GetBytes((string)example["text"]!), (string)example["file_name"]!);
}
