using System.Globalization;
using System.Text;
using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Manifest;

/// <summary>Reads run.toml.</summary>
public static class ManifestReader
{
    /// <summary>Name of the manifest inside a measurement folder.</summary>
    public const string FileName = "run.toml";

    private const int MostBytes = 4 << 20;

    /// <summary>Reads a manifest.</summary>
    /// <param name="path">Path of the file.</param>
    /// <param name="displayPath">Path as messages name it.</param>
    /// <exception cref="MeasurementDataException">Something in it is wrong. The error is the first one in the order of the lines; all others are in <see cref="MeasurementDataException.Others"/>.</exception>
    /// <exception cref="IOException">The file cannot be read.</exception>
    /// <exception cref="UnauthorizedAccessException">The file may not be read.</exception>
    public static RunManifest Read(string path, string displayPath)
    {
        if (new FileInfo(path).Length > MostBytes)
        {
            throw new MeasurementDataException(new(displayPath), "manifest-too-large", "a manifest of more than 4 MiB", "a short text", "Keep measurement data in files of their own.");
        }

        try
        {
            return Parse(new UTF8Encoding(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true).GetString(File.ReadAllBytes(path)).TrimStart('\uFEFF'), displayPath);
        }
        catch (DecoderFallbackException)
        {
            throw new MeasurementDataException(new(displayPath), "manifest-encoding", "bytes that are not UTF-8", "a text in UTF-8, as TOML asks for", "Save the file as UTF-8.");
        }
    }

    /// <summary>Reads a manifest out of its text.</summary>
    /// <param name="text">The text.</param>
    /// <param name="displayPath">Path as messages name it.</param>
    /// <exception cref="MeasurementDataException">As for <see cref="Read"/>.</exception>
    public static RunManifest Parse(string text, string displayPath)
    {
        ArgumentNullException.ThrowIfNull(text);
        var errors = new List<MeasurementDataException>();
        var sections = ManifestTree.Parse(text, displayPath, errors);
        ManifestChecks.Tables(sections, errors);
        var manifest = Assemble(sections, displayPath, errors);
        ManifestChecks.Probe(manifest.Probe, sections, errors);
        ManifestChecks.States(manifest, sections, errors);
        return errors.Count == 0 ? manifest : throw Joined(errors);
    }

    private static RunManifest Assemble(List<ManifestSection> sections, string displayPath, List<MeasurementDataException> errors)
    {
        var (run, antenna, range, conventions) = (One("run"), One("antenna"), One("range"), One("conventions"));
        var manifest = new RunManifest
        {
            Path = displayPath,
            Name = run.Text("name"),
            Date = DateOf(run),
            Operator = run.Text("operator"),
            Chamber = run.Text("chamber"),
            Notes = run.Text("notes"),
            Antenna = run.Text("antenna"),
            Serial = run.Text("serial"),
            Tags = [.. run.Texts("tags").Select(tag => tag.Text)],
            Time = conventions.Word("time", TimeFactorText.Words),
            Probe = ProbeOf(One("probe")),
            AxisDeg = antenna.Value("axis", UnitDimension.Angle)?.Value,
            LargestDimensionM = Positive(antenna, "largest-dimension"),
            RangeLengthM = Positive(range, "length"),
            States = [.. Each("state").Select(StateOf).OfType<ManifestState>()],
            GainStandard = sections.Exists(section => section.Name is "gain-standard") ? GainStandardOf(One("gain-standard")) : null,
            UncertaintyTerms = [.. UncertaintyKeys.All.SelectMany(term => One("uncertainty").Value(term.Key, term.Value) is { } value ? new[] { new UncertaintyTerm(term.Key, value.Value, value.Unit) } : [])],
            ReportFields = ReportOf(sections, errors),
            Columns = [.. Each("columns").Select(ColumnOf).OfType<ManifestColumn>()],
            Requirements = [.. Each("requirement").Select((reader, index) => RequirementReader.Read(reader, index + 1)).OfType<Requirement>()],
        };
        foreach (var reader in new[] { run, antenna, range, conventions })
        {
            reader.Finish();
        }

        foreach (var entry in Entries("uncertainty").Where(entry => !UncertaintyKeys.All.ContainsKey(entry.Key)))
        {
            errors.Add(SectionReader.UnknownKey(entry, "uncertainty", [.. UncertaintyKeys.All.Keys]));
        }

        return manifest;

        // Dotted keys may build one table in several places; together they are one.
        SectionReader One(string name) =>
            new(new(name, IsArrayItem: false, sections.Find(section => Named(section, name))?.Place ?? new(displayPath), [.. Entries(name)]), errors);

        IEnumerable<ManifestEntry> Entries(string name) => sections.Where(section => Named(section, name)).SelectMany(section => section.Entries);

        IEnumerable<SectionReader> Each(string name) => sections.Where(section => Named(section, name) && section.IsArrayItem).Select(section => new SectionReader(section, errors));
    }

    private static bool Named(ManifestSection section, string name) => string.Equals(section.Name, name, StringComparison.Ordinal);

    private static string? DateOf(SectionReader run)
    {
        if (run.Typed("date") is not { } date || DateOnly.TryParseExact(date.Text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out _))
        {
            return run.Typed("date")?.Text;
        }

        run.Complain(new(date.Place, "bad-date", FoundText.Show(date.Text), "a day as YYYY-MM-DD", "Write it as 2026-03-14."));
        return null;
    }

    private static double? Positive(SectionReader reader, string key)
    {
        var value = reader.Value(key, UnitDimension.Length)?.Value;
        if (value is <= 0.0)
        {
            reader.Complain(new(reader.Entry(key)!.ValuePlace, "bad-value", "a length that is not above zero", "a length above zero", "Correct it or leave the key away."));
        }

        return value;
    }

    private static ManifestProbe ProbeOf(SectionReader reader)
    {
        var probe = new ManifestProbe(reader.Text("theta"), reader.Text("phi"), reader.Text("right"), reader.Text("left"));
        reader.Finish();
        return probe;
    }

    private static ManifestState? StateOf(SectionReader reader)
    {
        var name = reader.RequiredText("name", "right");
        var state = new ManifestState
        {
            Name = name ?? string.Empty,
            IntendedHand = reader.Word("intended-hand", HandText.Hands),
            KnownHand = reader.Word("known-hand", HandText.Hands),
            Sweeps = reader.Patterns("sweeps"),
            Cuts = reader.Patterns("cuts"),
            SimulatedSweeps = reader.Patterns("simulated-sweeps"),
            SimulatedCuts = reader.Patterns("simulated-cuts"),
            Line = reader.Place.Line,
        };
        reader.Finish();
        return name is null ? null : state;
    }

    private static ManifestGainStandard GainStandardOf(SectionReader reader)
    {
        var table = reader.Patterns("table");
        if (table.Count > 1)
        {
            reader.Complain(new(table[1].Place, "bad-value", "a second gain table", "one file", "A run has one gain standard; name its table only."));
        }

        var standard = new ManifestGainStandard(table.FirstOrDefault(), reader.Patterns("cuts"), reader.Patterns("sweeps"));
        reader.Finish();
        return standard;
    }

    private static ManifestColumn? ColumnOf(SectionReader reader)
    {
        var (heading, meaning) = (reader.RequiredText("heading", "E-Field H (dB)"), reader.RequiredText("meaning", "h level dB"));
        reader.Finish();
        return heading is null || meaning is null ? null : new(heading, meaning, reader.Place);
    }

    private static SortedDictionary<string, string> ReportOf(List<ManifestSection> sections, List<MeasurementDataException> errors)
    {
        var fields = new SortedDictionary<string, string>(StringComparer.Ordinal);
        foreach (var section in sections.Where(section => section.Name is "report"))
        {
            var reader = new SectionReader(section, errors);
            foreach (var entry in section.Entries)
            {
                if (reader.Text(entry.Key) is { } text)
                {
                    fields[entry.Key] = text;
                }
            }
        }

        return fields;
    }

    private static MeasurementDataException Joined(List<MeasurementDataException> errors)
    {
        var ordered = errors.DistinctBy(error => (error.Place, error.Code)).OrderBy(error => error.Place.Line).ThenBy(error => error.Place.Column).ToArray();
        var first = ordered[0];
        return new(first.Place, first.Code, first.Found, first.Expected, first.Advice) { Others = ordered[1..] };
    }
}
