using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace RangeReduce.Patterns.Tables;

/// <summary>Understands a heading in natural wording: name, part, unit, and the frequency or angle of a column of the wide form.</summary>
internal static partial class HeadingParser
{
    /// <summary>Parses one heading; what is not understood comes back as <see cref="HeadingKind.Unknown"/>.</summary>
    public static Heading Parse(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        var heading = new Heading { Text = text.Trim() };
        var plain = Plain(text);
        plain = TakeAcross(plain, ref heading);
        var (words, unit) = Words(plain);
        return Understand(heading with { Unit = unit }, words);
    }

    /// <summary>Brings quotes, comment marks, Greek letters and the many degree signs to one form.</summary>
    public static string Plain(string text)
    {
        var plain = new StringBuilder(text.Trim().TrimStart('#', '!', '%').Trim().Trim('"', '\'').Trim());
        return plain.Replace("\u00C2\u00B0", "\u00B0").Replace('\u00BA', '\u00B0').Replace('\u02DA', '\u00B0').Replace('\u2218', '\u00B0')
            .Replace("[\u00F8]", "[\u00B0]").Replace("(\u00F8)", "(\u00B0)").Replace("[\u00A1]", "[\u00B0]").Replace("(\u00A1)", "(\u00B0)")
            .Replace("\u03B8", " theta ").Replace("\u03D1", " theta ").Replace("\u0398", " theta ").Replace("\u03C6", " phi ").Replace("\u03D5", " phi ").Replace("\u03A6", " phi ")
            .ToString();
    }

    private static string TakeAcross(string plain, ref Heading heading)
    {
        if (double.TryParse(plain, NumberStyles.Float, CultureInfo.InvariantCulture, out var bare) && double.IsFinite(bare))
        {
            heading = heading with { Across = bare };
            return string.Empty;
        }

        if (FrequencyInside().Match(plain) is { Success: true } frequency && TryNumber(frequency.Groups["value"].Value, out var value))
        {
            _ = HeadingUnit.TryParse(frequency.Groups["unit"].ValueSpan, out var unit);
            heading = heading with { Across = value, AcrossKind = HeadingKind.Frequency, AcrossUnit = unit };
            return plain.Remove(frequency.Index, frequency.Length);
        }

        if (AngleInside().Match(plain) is { Success: true } angle && TryNumber(angle.Groups["value"].Value, out value))
        {
            var kind = HeadingWords.Named(angle.Groups["name"].Value.ToLowerInvariant());
            heading = heading with { Across = value, AcrossKind = kind, AcrossUnit = Degrees };
            return plain.Remove(angle.Index, angle.Length);
        }

        if (DegreesAlone().Match(plain) is { Success: true } degrees && TryNumber(degrees.Groups["value"].Value, out value))
        {
            heading = heading with { Across = value, AcrossKind = HeadingKind.Angle, AcrossUnit = Degrees };
            return plain.Remove(degrees.Index, degrees.Length);
        }

        return plain;
    }

    private static HeadingUnit Degrees => new(UnitKind.Angle, 1.0, "deg");

    private static bool TryNumber(string text, out double value) =>
        double.TryParse(text.Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value);

    /// <summary>Takes the unit off and gives the words that are left, in lower case.</summary>
    private static (List<string> Words, HeadingUnit Unit) Words(string plain)
    {
        var unit = HeadingUnit.None;
        var rest = plain;
        var brackets = Brackets().Matches(plain);
        for (var at = brackets.Count - 1; at >= 0; at--)
        {
            if (HeadingUnit.TryParse(brackets[at].Groups["inside"].ValueSpan, out unit))
            {
                rest = plain.Remove(brackets[at].Index, brackets[at].Length);
                break;
            }
        }

        if (rest.Contains('|', StringComparison.Ordinal))
        {
            rest += " mag";
        }

        var slash = rest.LastIndexOf('/');
        if (unit.Kind == UnitKind.None && slash > 0 && HeadingUnit.TryParse(rest.AsSpan(slash + 1), out unit))
        {
            rest = rest[..slash];
        }

        var words = Word().Matches(rest).Select(match => match.Value.ToLowerInvariant()).SelectMany(Parted).ToList();
        for (var at = words.Count - 1; unit.Kind == UnitKind.None && at >= 0; at--)
        {
            if (HeadingUnit.TryParseBare(words[at], out unit))
            {
                words.RemoveAt(at);
            }
        }

        return (words, unit);
    }

    /// <summary>Parts a word that is a known name run together with its unit: <c>freqMHz</c>, <c>thetaDeg</c>.</summary>
    private static IEnumerable<string> Parted(string word)
    {
        foreach (var unit in (ReadOnlySpan<string>)["ghz", "mhz", "khz", "hz", "deg", "rad", "dbi", "db"])
        {
            if (word.Length > unit.Length && word.EndsWith(unit, StringComparison.Ordinal) && IsName(word[..^unit.Length]))
            {
                return [word[..^unit.Length], unit];
            }
        }

        return [word];
    }

    private static bool IsName(string word) => HeadingWords.Named(word) != HeadingKind.Unknown || HeadingWords.IsScattering(word) || HeadingWords.PartOf(word) != ChannelPart.None;

    private static Heading Understand(Heading heading, List<string> words)
    {
        var joined = string.Concat(words);
        var kind = KeyKind(words, heading.Unit);
        if (kind != HeadingKind.Unknown)
        {
            return heading with { Kind = kind };
        }

        if (HeadingWords.IsSpare(joined) || (words.Count > 0 && words.Count <= 3 && (HeadingWords.IsSpare(words[0]) || HeadingWords.IsSpare(words[^1])) && heading.Unit.Kind == UnitKind.None))
        {
            return heading with { Kind = HeadingKind.Spare };
        }

        if (words.Contains("uncertainty", StringComparer.Ordinal))
        {
            return heading with { Kind = HeadingKind.Uncertainty };
        }

        var part = PartOf(words, heading.Unit, out var names);
        var reflection = HeadingWords.ReflectionOf(string.Concat(names)) ?? (names is [var one] && HeadingWords.IsScattering(one) && one[1] == one[2] ? ChannelPart.None : null);
        if (reflection is { } special)
        {
            return heading with { Kind = HeadingKind.Reflection, Part = special == ChannelPart.None ? part : special, Channel = names is [['s', ..] scattering] ? scattering : "s11" };
        }

        var known = part != ChannelPart.None || heading.IsAcross;
        return heading with { Kind = known ? HeadingKind.Channel : HeadingKind.Unknown, Part = part, Channel = names.Count == 0 ? string.Empty : HeadingWords.ChannelName(names) };
    }

    /// <summary>Finds whether the words name the frequency or an angle and nothing else.</summary>
    private static HeadingKind KeyKind(List<string> words, HeadingUnit unit)
    {
        if (words.Count == 0 || unit.Kind is not (UnitKind.None or UnitKind.Angle or UnitKind.Frequency))
        {
            return HeadingKind.Unknown;
        }

        var kinds = words.Where(word => !HeadingWords.IsNoise(word) || HeadingWords.Named(word) != HeadingKind.Unknown).Select(HeadingWords.Named).Distinct().ToList();
        if (kinds.Count > 1)
        {
            kinds.Remove(HeadingKind.Angle);
        }

        // "E_theta [deg]" is the phase of a field, "probe angle" that of a spinning probe; a plain "theta axis" is the positioner.
        var isField = words[0] is "e" or "gain" or "realized" or "realised";
        if (kinds is not [var kind] || kind == HeadingKind.Unknown || isField)
        {
            return HeadingKind.Unknown;
        }

        kind = kind == HeadingKind.Angle && words.Any(word => word is "probe" or "pol" or "polarization" or "polarisation") ? HeadingKind.Spin : kind;
        var isFrequency = kind == HeadingKind.Frequency;
        return unit.Kind == UnitKind.None || isFrequency == (unit.Kind == UnitKind.Frequency) ? kind : HeadingKind.Unknown;
    }

    private static ChannelPart PartOf(List<string> words, HeadingUnit unit, out List<string> names)
    {
        var said = words.Select(HeadingWords.PartOf).FirstOrDefault(part => part != ChannelPart.None);
        names = words.Where(word => HeadingWords.PartOf(word) == ChannelPart.None).ToList();
        return (unit.Kind, said) switch
        {
            (UnitKind.Angle, ChannelPart.None or ChannelPart.Phase) => ChannelPart.Phase,
            (UnitKind.Decibel or UnitKind.DecibelIsotropic, ChannelPart.None or ChannelPart.Amplitude) => ChannelPart.Level,
            (UnitKind.Amplitude, ChannelPart.None) => ChannelPart.Amplitude,
            (UnitKind.Power, ChannelPart.None or ChannelPart.Amplitude) => ChannelPart.Power,
            (UnitKind.None or UnitKind.Amplitude, _) => said,
            _ => ChannelPart.None,
        };
    }

    [GeneratedRegex(@"(?:(?:freq(?:uency)?|f)\s*=\s*)?(?<![\w.])(?<value>\d+(?:[.,]\d+)?(?:[eE][+-]?\d+)?)[\s_]*[\[\(]?(?<unit>[kKmMgGtT]?[hH][zZ])[\]\)]?(?![\w])", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex FrequencyInside();

    [GeneratedRegex(@"\b(?<name>theta|phi|az|el|azimuth|elevation|roll)\s*=\s*(?<value>[+-]?\d+(?:[.,]\d+)?)\s*(?:deg|\u00B0)?", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase, 1000)]
    private static partial Regex AngleInside();

    [GeneratedRegex(@"^(?<value>[+-]?\d+(?:[.,]\d+)?)\s*(?:deg|\u00B0)", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase, 1000)]
    private static partial Regex DegreesAlone();

    [GeneratedRegex(@"\[(?<inside>[^\[\]]*)\]|\((?<inside>[^\(\)]*)\)|\{(?<inside>[^\{\}]*)\}", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Brackets();

    [GeneratedRegex(@"[\p{L}\p{Nd}\u00B0]+", RegexOptions.None, 1000)]
    private static partial Regex Word();
}
