using System.Globalization;
using RangeReduce.Diagnostics;
using Tomlyn.Syntax;

namespace RangeReduce.Runs.Manifest;

/// <summary>Takes typed values out of one section. The keys that were asked for are the known ones; <see cref="Finish"/> complains about all others.</summary>
/// <remarks>A wrong value is noted and read as if absent, so that all errors of a manifest come out in one go.</remarks>
internal sealed class SectionReader(ManifestSection section, List<MeasurementDataException> errors)
{
    private readonly List<string> _known = [];

    /// <summary>Gets where the section begins.</summary>
    public SourcePlace Place => section.Place;

    /// <summary>Gives the entry of a key; null where the key is absent.</summary>
    public ManifestEntry? Entry(string key)
    {
        _known.Add(key);
        return section.Entries.Find(entry => string.Equals(entry.Key, key, StringComparison.Ordinal));
    }

    /// <summary>Gives a text.</summary>
    public string? Text(string key) => Entry(key) is { } entry ? TextOf(entry.Value, entry.ValuePlace, "a text in quotes") : null;

    /// <summary>Gives a text that must not be blank and a complaint where the key is absent.</summary>
    public string? RequiredText(string key, string example)
    {
        var entry = Entry(key);
        if (entry is null)
        {
            errors.Add(new(section.Place, "missing-key", $"a table [{section.Name}] without {key}", $"the key {key}", $"Add a line such as {key} = \"{example}\"."));
            return null;
        }

        var text = TextOf(entry.Value, entry.ValuePlace, "a text in quotes");
        if (text is not null && string.IsNullOrWhiteSpace(text))
        {
            errors.Add(new(entry.ValuePlace, "bad-value", "an empty text", "a text with something in it", $"Write a line such as {key} = \"{example}\"."));
            return null;
        }

        return text;
    }

    /// <summary>Gives one of several words.</summary>
    public T? Word<T>(string key, IReadOnlyDictionary<string, T> words)
        where T : struct
    {
        if (Entry(key) is not { } entry || TextOf(entry.Value, entry.ValuePlace, FoundText.AnyOf(words.Keys)) is not { } text)
        {
            return null;
        }

        if (words.TryGetValue(text, out var value))
        {
            return value;
        }

        errors.Add(new(entry.ValuePlace, "bad-value", FoundText.Show(text), FoundText.AnyOf(words.Keys), $"The nearest is \"{NearestName.Of(text, words.Keys)}\"."));
        return null;
    }

    /// <summary>Gives a number with unit, in the base unit of its kind; a plain number is taken where a plain number makes sense.</summary>
    public UnitValue? Value(string key, params UnitDimension[] allowed) =>
        Entry(key) is { } entry && NumberText(entry, allowed) is { } text ? Try(() => UnitText.Parse(text, entry.ValuePlace, allowed)) : null;

    /// <summary>Gives a range with unit.</summary>
    public (double Low, double High)? Range(string key, params UnitDimension[] allowed) =>
        Entry(key) is { } entry && TextOf(entry.Value, entry.ValuePlace, "a range in quotes, such as \"1.58 GHz .. 1.64 GHz\"") is { } text ? Try(() => UnitText.ParseRange(text, entry.ValuePlace, allowed)) : null;

    /// <summary>Gives a list of texts with their places; a single text counts as a list of one.</summary>
    public List<(string Text, SourcePlace Place)> Texts(string key)
    {
        var texts = new List<(string Text, SourcePlace Place)>();
        var entry = Entry(key);
        var values = entry?.Value is ArraySyntax array ? array.Items.Select(item => item.Value!) : entry is null ? [] : [entry.Value];
        foreach (var value in values)
        {
            var place = new SourcePlace(section.Place.File, value.Span.Start.Line + 1, value.Span.Start.Column + 1);
            if (TextOf(value, place, "a text in quotes, or several in brackets") is { } text)
            {
                texts.Add((text, place));
            }
        }

        return texts;
    }

    /// <summary>Gives a list of path patterns.</summary>
    public List<GlobPattern> Patterns(string key)
    {
        var patterns = new List<GlobPattern>();
        foreach (var (text, place) in Texts(key))
        {
            try
            {
                patterns.Add(GlobPattern.Parse(text, place));
            }
            catch (MeasurementDataException error)
            {
                errors.Add(error);
            }
        }

        return patterns;
    }

    /// <summary>Gives a text, or a date or number as it was typed.</summary>
    public (string Text, SourcePlace Place)? Typed(string key) => Entry(key) switch
    {
        null => null,
        { Value: DateTimeValueSyntax date } entry => (date.Token?.Text ?? string.Empty, entry.ValuePlace),
        { } entry => TextOf(entry.Value, entry.ValuePlace, "a text in quotes") is { } text ? (text, entry.ValuePlace) : null,
    };

    /// <summary>Notes an error.</summary>
    public void Complain(MeasurementDataException error) => errors.Add(error);

    /// <summary>Complains about every key that nobody asked for.</summary>
    public void Finish()
    {
        foreach (var entry in section.Entries.Where(entry => !_known.Contains(entry.Key, StringComparer.Ordinal)))
        {
            errors.Add(UnknownKey(entry, section.Name, _known));
        }
    }

    /// <summary>Makes the error about a key that is not known, naming the nearest one that is.</summary>
    public static MeasurementDataException UnknownKey(ManifestEntry entry, string table, IReadOnlyCollection<string> known) =>
        new(entry.KeyPlace, "unknown-key", $"the unknown key {FoundText.Show(entry.Key)} in [{table}]", $"one of {string.Join(", ", known)}", $"The nearest known key is \"{NearestName.Of(entry.Key, known)}\".");

    private string? NumberText(ManifestEntry entry, UnitDimension[] allowed) => entry.Value switch
    {
        IntegerValueSyntax or FloatValueSyntax => Plain(entry.Value),
        _ => TextOf(entry.Value, entry.ValuePlace, UnitText.Expected(allowed) + ", in quotes"),
    };

    private T? Try<T>(Func<T> read)
        where T : struct
    {
        try
        {
            return read();
        }
        catch (MeasurementDataException error)
        {
            errors.Add(error);
            return null;
        }
    }

    private string? TextOf(ValueSyntax value, SourcePlace place, string expected)
    {
        if (value is StringValueSyntax text)
        {
            return text.Value ?? string.Empty;
        }

        errors.Add(new(place, "bad-value", $"{KindOf(value)} {FoundText.Show(value.ToString()?.Trim() ?? string.Empty)}", expected, "Put the value in quotes or correct it."));
        return null;
    }

    private static string Plain(ValueSyntax value) => value switch
    {
        IntegerValueSyntax whole => whole.Value.ToString(CultureInfo.InvariantCulture),
        FloatValueSyntax real => real.Value.ToString("R", CultureInfo.InvariantCulture),
        _ => string.Empty,
    };

    private static string KindOf(ValueSyntax value) => value switch
    {
        IntegerValueSyntax or FloatValueSyntax => "the number",
        BooleanValueSyntax => "the truth value",
        DateTimeValueSyntax => "the date",
        ArraySyntax => "the list",
        InlineTableSyntax => "the table",
        _ => "the value",
    };
}
