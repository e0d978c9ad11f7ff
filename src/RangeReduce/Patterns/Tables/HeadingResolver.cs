using System.Globalization;

namespace RangeReduce.Patterns.Tables;

/// <summary>Turns the heading texts into headings, with the help of laid-down meanings, the preamble and the neighbouring columns.</summary>
internal static class HeadingResolver
{
    /// <summary>Resolves all headings.</summary>
    /// <exception cref="Diagnostics.MeasurementDataException">A laid-down meaning is not understood.</exception>
    public static Heading[] Resolve(TableContext context)
    {
        var head = context.Head;
        var count = Math.Max(head.FieldCount, head.Headings.Count);
        var headings = new Heading[count];
        for (var at = 0; at < count; at++)
        {
            var text = at < head.Headings.Count ? head.Headings[at] : string.Empty;
            headings[at] = LaidDown(context, text, at) ?? HeadingParser.Parse(text);
        }

        Corner(headings);
        PhasesNamedLikeAngles(headings);
        BareNumbers(context, headings);
        UnitsOfPreamble(context, headings);
        return headings;
    }

    private static Heading? LaidDown(TableContext context, string text, int at)
    {
        var columns = context.Options.Columns;
        if (columns.Count == 0)
        {
            return null;
        }

        var number = (at + 1).ToString(CultureInfo.InvariantCulture);
        var meaning = columns.FirstOrDefault(entry => string.Equals(entry.Key.Trim(), HeadingParser.Plain(text), StringComparison.OrdinalIgnoreCase) || string.Equals(entry.Key.Trim(), text, StringComparison.OrdinalIgnoreCase)).Value
            ?? columns.GetValueOrDefault(number);
        if (meaning is null)
        {
            return null;
        }

        if (string.Equals(meaning.Trim(), "ignore", StringComparison.OrdinalIgnoreCase))
        {
            return new() { Text = text, Kind = HeadingKind.Spare };
        }

        var heading = HeadingParser.Parse(meaning);
        var original = HeadingParser.Parse(text);
        if (heading.Unit.Kind == UnitKind.None && original.Unit.Kind != UnitKind.None)
        {
            heading = HeadingParser.Parse($"{meaning} [{original.Unit.Text}]");
        }

        return heading.IsKnown ? heading with { Text = text.Length > 0 ? text : $"column {number}" } : throw TableFaults.Meaning(context.HeadingPlace(at), text, meaning);
    }

    /// <summary>Takes the corner of a wide table apart: <c>Theta [deg] \ Frequency [MHz]</c>.</summary>
    private static void Corner(Heading[] headings)
    {
        var corner = headings[0];
        if (corner.Kind != HeadingKind.Unknown || !Array.Exists(headings, heading => heading.IsAcross))
        {
            return;
        }

        foreach (var sign in (ReadOnlySpan<char>)['\\', '/', '|'])
        {
            var at = corner.Text.IndexOf(sign, StringComparison.Ordinal);
            if (at <= 0)
            {
                continue;
            }

            var (down, across) = (HeadingParser.Parse(corner.Text[..at]), HeadingParser.Parse(corner.Text[(at + 1)..]));
            if ((down.IsAngle && across.Kind == HeadingKind.Frequency) || (down.Kind == HeadingKind.Frequency && across.IsAngle))
            {
                headings[0] = down with { Text = corner.Text };
                for (var column = 1; column < headings.Length; column++)
                {
                    if (headings[column] is { IsAcross: true, AcrossKind: HeadingKind.Unknown } bare)
                    {
                        headings[column] = bare with { AcrossKind = across.Kind, AcrossUnit = across.Unit };
                    }
                }

                return;
            }
        }
    }

    /// <summary>Takes <c>Theta [deg]</c> after <c>Theta [dB]</c> for the phase of that channel where theta already is an angle column.</summary>
    private static void PhasesNamedLikeAngles(Heading[] headings)
    {
        for (var at = 1; at < headings.Length; at++)
        {
            var heading = headings[at];
            var level = headings[at - 1];
            if (heading.IsAngle && heading.Unit.Kind == UnitKind.Angle && level is { Kind: HeadingKind.Channel, Part: ChannelPart.Level or ChannelPart.Amplitude or ChannelPart.Power }
                && string.Equals(level.Channel, heading.Kind.ToString(), StringComparison.OrdinalIgnoreCase)
                && Array.Exists(headings[..at], earlier => earlier.Kind == heading.Kind))
            {
                headings[at] = heading with { Kind = HeadingKind.Channel, Part = ChannelPart.Phase, Channel = level.Channel };
            }
        }
    }

    /// <summary>Says what bare numbers in the headings are: frequencies over angles, angles over frequencies.</summary>
    private static void BareNumbers(TableContext context, Heading[] headings)
    {
        var bare = Enumerable.Range(0, headings.Length).Where(at => headings[at] is { IsAcross: true, AcrossKind: HeadingKind.Unknown }).ToArray();
        var named = Array.Exists(headings, heading => heading is { IsAcross: true } and not { AcrossKind: HeadingKind.Unknown });
        if (bare.Length == 0 || named)
        {
            return;
        }

        var angles = Array.Exists(headings, heading => heading.Kind == HeadingKind.Frequency);
        foreach (var at in bare)
        {
            headings[at] = headings[at] with { AcrossKind = angles ? HeadingKind.Angle : HeadingKind.Frequency };
        }

        if (angles)
        {
            context.Note("angles-across", "The numbers in the headings were taken for angles in degrees, because the first column holds frequencies.");
        }
    }

    /// <summary>Gives the units of the preamble to headings that have none.</summary>
    private static void UnitsOfPreamble(TableContext context, Heading[] headings)
    {
        var hasLevel = TryUnit(context.Metadata("unit", "units", "level unit", "level units", "data unit", "amplitude unit", "values"), out var level) && (level.IsDecibel || level.Kind is UnitKind.Amplitude or UnitKind.Power);
        var hasFrequency = TryUnit(context.Metadata("frequency unit", "frequency units", "freq unit", "frequency in"), out var frequency) && frequency.Kind == UnitKind.Frequency;
        var hasAngle = TryUnit(context.Metadata("angle unit", "angle units", "angles in"), out var angle) && angle.Kind == UnitKind.Angle;
        for (var at = 0; at < headings.Length; at++)
        {
            var heading = headings[at];
            if (heading is { IsAcross: true, AcrossKind: HeadingKind.Frequency, AcrossUnit.Kind: UnitKind.None } && hasFrequency)
            {
                heading = heading with { AcrossUnit = frequency };
            }

            if (heading.Unit.Kind == UnitKind.None)
            {
                heading = heading switch
                {
                    { Kind: HeadingKind.Frequency } when hasFrequency => heading with { Unit = frequency },
                    { IsAngle: true } when hasAngle => heading with { Unit = angle },
                    { Kind: HeadingKind.Unknown or HeadingKind.Channel or HeadingKind.Reflection, Part: ChannelPart.None or ChannelPart.Amplitude } when hasLevel && (heading.Text.Length > 0 || heading.IsAcross) =>
                        HeadingParser.Parse($"{(heading.IsAcross ? string.Empty : heading.Text)} [{level.Text}]") with { Text = heading.Text, Across = heading.Across, AcrossKind = heading.AcrossKind, AcrossUnit = heading.AcrossUnit },
                    _ => heading,
                };
            }

            headings[at] = heading;
        }
    }

    private static bool TryUnit(string? text, out HeadingUnit unit)
    {
        unit = HeadingUnit.None;
        return text is not null && HeadingUnit.TryParse(HeadingParser.Plain(text).AsSpan().Trim("[]()"), out unit);
    }
}
