using System.Globalization;
using System.Text;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>The texts of all errors of the Touchstone reader, so that tone and terms agree.</summary>
internal static class TouchstoneErrors
{
    private const int LongestQuote = 40;
    private const string Cut = "The file looks cut off: export or copy it again.";

    public static MeasurementDataException MissingOptionLine(SourcePlace place, string found) =>
        new(place, "missing-option-line", found, "an option line such as '# GHz S RI R 50' before any data", "Without it nobody knows the frequency unit: add the line, or export the file again.");

    public static MeasurementDataException UnknownOption(SourcePlace place, string found) =>
        new(place, "unknown-option", found, "Hz, kHz, MHz or GHz; S, Y, Z, G or H; MA, DB or RI; R and a number", "Correct the option line.");

    public static MeasurementDataException RepeatedOption(SourcePlace place, string found) =>
        new(place, "repeated-option", found, "one unit, one kind, one format and one R on the option line", "Delete the one that does not hold.");

    public static MeasurementDataException RepeatedKeyword(SourcePlace place, string found) =>
        new(place, "repeated-keyword", found, "each keyword once", "Delete the one that does not hold.");

    public static MeasurementDataException KeywordAmongData(SourcePlace place, string found) =>
        new(place, "keyword-among-data", found, "numbers, [Noise Data] once, or [End]", "Move the keyword before [Network Data].");

    public static MeasurementDataException BadReference(SourcePlace place, string found) =>
        new(place, "bad-reference", found, "a positive resistance in ohm behind R", "Correct the option line.");

    public static MeasurementDataException ReferenceCount(SourcePlace place, int found, int ports) =>
        new(place, "reference-count", string.Create(CultureInfo.InvariantCulture, $"{found} reference impedances"), string.Create(CultureInfo.InvariantCulture, $"one for all ports or {ports}, one a port"), "Correct the references.");

    public static MeasurementDataException FrequencyNotIncreasing(SourcePlace place, double found, double before, int lineBefore) =>
        new(place, "frequency-not-increasing", string.Create(CultureInfo.InvariantCulture, $"{found:R} Hz after {before:R} Hz (line {lineBefore})"), "strictly rising frequencies", "If two sweeps were pasted together, split the file; if a frequency was taken twice, keep one.");

    public static MeasurementDataException IncompleteRecord(SourcePlace place, int found, string expected) =>
        new(place, "incomplete-record", string.Create(CultureInfo.InvariantCulture, $"a record of {found} numbers"), expected, Cut);

    public static MeasurementDataException PortCount(SourcePlace place, int byExtension, int found) =>
        new(place, "port-count", string.Create(CultureInfo.InvariantCulture, $"a record of {found} numbers"), string.Create(CultureInfo.InvariantCulture, $"{1 + (2 * byExtension * byExtension)} as the ending .s{byExtension}p says"), "Neither is believed: rename the file to the number of ports that it holds, or export it again.");

    public static MeasurementDataException DecimalComma(SourcePlace place, string found) =>
        new(place, "decimal-comma", found, "a decimal point", "The program that wrote the file used a decimal comma: change its locale and export again, or replace the commas.");

    public static MeasurementDataException BadNumber(SourcePlace place, string found) =>
        new(place, "bad-number", found, "a number", "Correct it, or export the file again.");

    public static MeasurementDataException NoData(SourcePlace place) =>
        new(place, "no-data", "the end of the file", "at least one frequency with its parameters", Cut);

    public static MeasurementDataException BadFrequency(SourcePlace place, string found) =>
        new(place, "bad-frequency", found, "a frequency of zero or more", "Correct it.");

    public static MeasurementDataException MissingKeyword(SourcePlace place, string code, string keyword, string found) =>
        new(place, code, found, $"{keyword} before it", "Version 2 files need this keyword: add it, or export the file again.");

    public static MeasurementDataException BadKeywordValue(SourcePlace place, string found, string expected) =>
        new(place, "bad-keyword-value", found, expected, "Correct the value.");

    public static MeasurementDataException MissingEnd(SourcePlace place) =>
        new(place, "missing-end", "the end of the file", "[End]", Cut);

    public static MeasurementDataException FrequencyCount(SourcePlace place, string keyword, long declared, long found) =>
        new(place, "frequency-count", string.Create(CultureInfo.InvariantCulture, $"{found} frequencies"), string.Create(CultureInfo.InvariantCulture, $"{declared} as {keyword} says"), Cut);

    public static MeasurementDataException UnknownVersion(SourcePlace place, string found) =>
        new(place, "unknown-version", found, "version 2.0 or 2.1 (files of version 1 have no [Version])", "Export the file in one of these versions.");

    public static MeasurementDataException VersionNotFirst(SourcePlace place, string found) =>
        new(place, "version-not-first", found, "[Version] before everything but comments", "Move or add the line [Version] 2.0, or remove the keywords.");

    public static MeasurementDataException NoiseNeedsTwoPorts(SourcePlace place) =>
        new(place, "noise-needs-two-ports", "noise data", "two ports", "Only a two-port can have them: remove them or correct the number of ports.");

    public static MeasurementDataException UnknownKeyword(SourcePlace place, string found) =>
        new(place, "unknown-keyword", found, "numbers, or [End]", "Remove the line.");

    public static MeasurementDataException NotText(SourcePlace place) =>
        new(place, "not-text", "a zero byte", "text", "The file is binary or damaged: export it again.");

    public static MeasurementDataException NonAsciiData(SourcePlace place, string found) =>
        new(place, "bad-number", found, "a number in plain ASCII", "Retype the line, or export the file again.");

    public static MeasurementDataException TooMuch(SourcePlace place, string found, string limit) =>
        new(place, "too-large", found, limit, "Split the file, or raise the limit where the reader is called.");

    public static MeasurementDataException UnequalReferences(SourcePlace place, ParameterKind kind) =>
        new(place, "unequal-references", $"{kind} parameters with unequal references", "equal references", "How version 1 normalises these is not laid down: export scattering parameters, or version 2.");

    public static MeasurementDataException NotConvertible(SourcePlace place, ParameterKind kind) =>
        new(place, "not-convertible", $"{kind} parameters that have no scattering parameters", "a network with scattering parameters", "Export scattering parameters.");

    /// <summary>Quotes what was found: shortened, control characters escaped.</summary>
    public static string Quote(ReadOnlySpan<byte> bytes)
    {
        var text = Encoding.Latin1.GetString(bytes[..Math.Min(bytes.Length, LongestQuote)]);
        var quoted = new StringBuilder("'");
        foreach (var letter in text)
        {
            _ = char.IsControl(letter) ? quoted.Append(CultureInfo.InvariantCulture, $"\\x{(int)letter:x2}") : quoted.Append(letter);
        }

        return quoted.Append(bytes.Length > LongestQuote ? "…'" : "'").ToString();
    }
}
