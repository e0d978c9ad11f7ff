using System.Globalization;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>The words of every fault that a table can have.</summary>
internal static class TableFaults
{
    public static MeasurementDataException Utf32(string file) =>
        new(new(file), "encoding", "text in UTF-32", "UTF-8, UTF-16 or Latin-1", "Save the file as UTF-8.");

    public static MeasurementDataException Binary(string file, int offset) =>
        new(new(file, 1), "not-text", Invariant($"a zero byte at offset {offset}"), "a text table", "The file is binary or was not written to its end; export it as text again.");

    public static MeasurementDataException LineTooLong(SourcePlace place, int most, string detail) =>
        new(place, "line-too-long", Shown(detail, 120), Invariant($"lines of at most {most} bytes"), "Check that the file is a text table with line ends.");

    public static MeasurementDataException TooManyColumns(SourcePlace place, int found, int most) =>
        new(place, "too-many-columns", Invariant($"{found} columns"), Invariant($"at most {most}"), "Split the table, or raise the limit in the options of the reader.");

    public static MeasurementDataException TooManySamples(SourcePlace place, long most) =>
        new(place, "too-many-samples", "one more row", Invariant($"at most {most} samples in a table"), "Split the table, or raise the limit in the options of the reader.");

    public static MeasurementDataException Empty(string file) =>
        new(new(file), "empty-file", "an empty file", "a table with headings and rows of numbers", "Export the measurement again.");

    public static MeasurementDataException NoTable(string file) =>
        new(new(file), "no-table", "no rows of numbers under a line of headings", "a line of headings such as \"Frequency [GHz],Theta [deg],H [dB],H [deg]\" and rows of numbers below it", "Check the separators and the decimal sign: a decimal comma needs semicolon, tab or blanks between the fields.");

    public static MeasurementDataException NoHeadings(SourcePlace place, int fields) =>
        new(place, "no-headings", Invariant($"{fields} numbers without a line of {fields} headings above them"), "one heading a column, with its unit", "Add a line of headings, or lay the columns down by number in run.toml. A decimal comma needs semicolon, tab or blanks between the fields.");

    public static MeasurementDataException NoRows(SourcePlace place) =>
        new(place, "no-rows", "headings without any sample below them", "rows of numbers", "The file may have been cut off; export it again.");

    public static MeasurementDataException Meaning(SourcePlace place, string heading, string meaning) =>
        new(place, "bad-meaning", $"the meaning {Shown(meaning)} for the column {Shown(heading)}", "a meaning such as \"frequency [GHz]\", \"theta [deg]\", \"h re\" or \"ignore\"", "Correct it in run.toml.");

    public static MeasurementDataException FrequencyUnit(SourcePlace place, string heading) =>
        new(place, "no-unit", $"the frequency heading {Shown(heading)} without a unit", "a unit such as [MHz], or a line \"frequency unit: MHz\" over the headings", "Write the unit into the heading; it is not guessed.");

    public static MeasurementDataException FrequencyInPreamble(string file, string value) =>
        new(new(file), "bad-frequency", $"the frequency {Shown(value)} over the headings", "a number with a unit, such as \"frequency: 1.62 GHz\"", "Write one frequency with its unit; it is not guessed.");

    public static MeasurementDataException TooManyAngles(SourcePlace place, IEnumerable<string> headings) =>
        new(place, "too-many-angles", $"the angle columns {List(headings)}", "theta and phi, azimuth and roll, azimuth and elevation, or one of them", "Say in run.toml which columns to ignore.");

    public static MeasurementDataException Twice(SourcePlace place, string heading, string earlier, string meaning) =>
        new(place, "duplicate-column", $"the heading {Shown(heading)}, which means the same {meaning} as {Shown(earlier)}", "each meaning once", "Rename one of the columns, or say in run.toml which to ignore.");

    public static MeasurementDataException LevelUnit(SourcePlace place, string heading) =>
        new(place, "no-unit", $"the heading {Shown(heading)}, which names a channel but neither unit nor part", "dB, dBi, deg, re, im or linear in the heading, or a line \"unit: dB\" over the headings", "Write the unit into the heading; it is not guessed.");

    public static MeasurementDataException UnknownHeadings(SourcePlace place, IEnumerable<string> unknown, IEnumerable<string> known) =>
        new(place, "unknown-heading", $"headings that say nothing to this program: {List(unknown)} (understood: {List(known)})", "names with units, such as \"Freq [MHz]\", \"Theta [deg]\", \"H [dB]\", \"E_theta re\"", "Rename them, or say in run.toml what they are or that they are to be ignored.");

    public static MeasurementDataException NoSamples(SourcePlace place, IEnumerable<string> headings) =>
        new(place, "no-channel", $"no column of samples among {List(headings)}", "at least one channel, such as \"H [dB]\"", "Add the levels, or say in run.toml what the columns are.");

    public static MeasurementDataException NamelessChannel(SourcePlace place, string heading) =>
        new(place, "no-channel", $"the heading {Shown(heading)}, which names no channel beside others that do", "a channel in the heading, such as \"H phase [deg]\"", "Name the channel in the heading.");

    public static MeasurementDataException HalfChannel(SourcePlace place, string heading, string missing, IEnumerable<string> headings) =>
        new(place, "missing-channel", $"the column {Shown(heading)} without {missing} of the same channel among {List(headings)}", $"{missing} beside it", "Export the missing column too, or say in run.toml that this one is to be ignored.");

    public static MeasurementDataException MixedAcross(SourcePlace place, string heading) =>
        new(place, "mixed-headings", $"the heading {Shown(heading)} among headings that count something else", "frequencies only, or angles only, across the headings", "Split the table, or say in run.toml what the column is.");

    public static MeasurementDataException MixedUnits(SourcePlace place, string heading, string isotropic) =>
        new(place, "mixed-units", $"the column {Shown(heading)} beside {Shown(isotropic)}", "either all channels in dBi or none", "Bring all channels to one unit.");

    public static MeasurementDataException KeyOutOfRange(SourcePlace place, ReadOnlySpan<byte> cell, TableContext context, TableKey key) =>
        new(place, key.Kind == HeadingKind.Frequency ? "bad-frequency" : "bad-angle", Shown(CellText.Decode(CellText.Trimmed(cell))), key.Kind == HeadingKind.Frequency ? "a frequency above zero" : "an angle within two turns (-720 to 720 degrees)", $"Correct the cell or leave the row out; the column is \"{(key.Column < context.Head.Headings.Count ? context.Head.Headings[key.Column] : string.Empty)}\".");

    public static MeasurementDataException BadNumber(SourcePlace place, ReadOnlySpan<byte> cell, string heading, Dialect dialect)
    {
        var text = CellText.Decode(CellText.Trimmed(cell));
        var advice = text.AsSpan().IndexOfAny(',', '.') >= 0 && text.AsSpan().IndexOfAnyExcept(TextSigns.Number) < 0
            ? $"The table was read with the decimal sign '{dialect.Decimal}' and {dialect.Words} between the fields."
            : "Correct the cell, or leave it blank where the sample is missing.";
        return new(place, "bad-number", text.Length == 0 ? "a blank cell" : Shown(text), $"a number for \"{Shown(heading, 60).Trim('"')}\"", advice);
    }

    public static MeasurementDataException SampleOutOfRange(SourcePlace place, ReadOnlySpan<byte> cell, string heading, ChannelPart part)
    {
        var expected = part switch
        {
            ChannelPart.Amplitude or ChannelPart.Power => "a linear value of zero or more",
            ChannelPart.StandingWaveRatio => "a standing wave ratio of 1 or more",
            _ => "a level within 999 dB",
        };
        return new(place, "bad-level", Shown(CellText.Decode(CellText.Trimmed(cell))), $"{expected} for \"{Shown(heading, 60).Trim('"')}\"", "Check the unit in the heading; levels in decibels need [dB].");
    }

    public static MeasurementDataException AmbiguousFiller(SourcePlace place, double value, double largest, string heading) =>
        new(place, "ambiguous-filler", Invariant($"{value:R} in a column that reaches {largest:R}"), $"values of \"{Shown(heading, 60).Trim('"')}\" that cannot be mistaken for a filler", "Leave missing samples blank.");

    public static MeasurementDataException FieldCount(SourcePlace place, int found, int expected, IEnumerable<string> headings) =>
        new(place, found < expected ? "short-row" : "long-row", Invariant($"{found} fields"), Invariant($"{expected}, as there are headings ({List(headings)})"), "The row may have been cut off, or a decimal comma may have been taken for a separator.");

    public static MeasurementDataException BlockValue(SourcePlace place, string content, HeadingKind kind) =>
        new(place, "bad-block-value", Shown(content), kind == HeadingKind.Frequency ? "a frequency with its unit" : "an angle", "Correct the comment: it sets the value for the rows below it.");

    public static MeasurementDataException Sparse(SourcePlace place, int rows, int cuts, int frequencies, int angles) =>
        new(place, "no-grid", Invariant($"{rows} rows over {cuts} cuts, {frequencies} frequencies and {angles} angles that form no grid"), "the same frequencies at the same angles, with few gaps", "Check which column holds the angle and which the samples, or split the table.");

    public static MeasurementDataException ReflectionSign(SourcePlace place, string heading, double low, double high) =>
        new(place, "reflection-sign", Invariant($"values from {low:0.##} to {high:0.##} dB under {Shown(heading)}"), "either a return loss (positive) or a level of S11 (negative)", "Check the calibration and the sign of the export; the sign is not guessed.");

    public static MeasurementDataException ReferenceImpedance(string file, string value) =>
        new(new(file), "bad-reference", $"the reference impedance {Shown(value)}", "a number of ohm, such as \"reference impedance: 75 ohm\"", "Correct the line over the headings.");

    /// <summary>Shortens a text, escapes its control characters and puts it in quotes.</summary>
    internal static string Shown(string text, int most = 40)
    {
        var shown = text.Length > most ? string.Concat(text.AsSpan(0, most), "...") : text;
        return $"\"{string.Concat(shown.Select(sign => char.IsControl(sign) || char.IsSurrogate(sign) ? string.Create(CultureInfo.InvariantCulture, $"\\u{(int)sign:x4}") : sign.ToString()))}\"";
    }

    private static string List(IEnumerable<string> texts)
    {
        var all = texts.Where(text => text.Length > 0).ToArray();
        var list = string.Join(", ", all.Take(12).Select(text => Shown(text)));
        return all.Length == 0 ? "none" : all.Length > 12 ? Invariant($"{list} and {all.Length - 12} more") : list;
    }

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
