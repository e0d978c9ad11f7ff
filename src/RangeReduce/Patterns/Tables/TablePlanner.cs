using System.Globalization;

namespace RangeReduce.Patterns.Tables;

/// <summary>Decides what a table holds and which column is what.</summary>
internal static class TablePlanner
{
    /// <summary>Plans the reading.</summary>
    /// <exception cref="Diagnostics.MeasurementDataException">The headings do not tell enough, or contradict each other.</exception>
    public static TablePlan Plan(TableContext context)
    {
        var headings = HeadingResolver.Resolve(context);
        if (headings.Length > context.Options.MaxColumns)
        {
            throw TableFaults.TooManyColumns(context.HeadingsPlace, headings.Length, context.Options.MaxColumns);
        }

        var hasAngle = Array.Exists(headings, heading => heading.IsAngle || heading is { IsAcross: true, AcrossKind: not HeadingKind.Frequency });
        var isSweep = !hasAngle && Array.Exists(headings, heading => heading.Kind == HeadingKind.Reflection) && Array.Exists(headings, heading => heading.Kind == HeadingKind.Frequency);
        var keys = KeyPlanner.Plan(context, headings);
        var values = ValuePlanner.Plan(context, headings, keys, isSweep ? HeadingKind.Reflection : HeadingKind.Channel);
        if (values.Count == 0)
        {
            throw TableFaults.NoSamples(context.HeadingsPlace, headings.Select(heading => heading.Text));
        }

        var isGain = !isSweep && !hasAngle && keys[TableKey.Frequency].Column >= 0 && values is [{ Part: ChannelPart.Level } only]
            && (only.Heading.Unit.Kind == UnitKind.DecibelIsotropic || string.Equals(only.Channel, "gain", StringComparison.Ordinal));
        var content = isSweep ? TableContent.Sweep : isGain ? TableContent.Gain : TableContent.Cuts;
        if (content == TableContent.Gain && Array.FindIndex(headings, heading => heading.Kind == HeadingKind.Uncertainty) is >= 0 and var uncertainty)
        {
            values.Add(new() { Column = uncertainty, Heading = headings[uncertainty], Channel = "uncertainty", Part = ChannelPart.Level });
        }

        if (content == TableContent.Cuts)
        {
            SpinningProbe(context, headings, values);
        }

        var meanings = headings.Select((heading, at) => Meaning(heading, at, keys, values)).ToArray();
        NoteSpare(context, headings, keys, values);
        return new() { Content = content, Keys = keys, Values = values, Headings = headings, Meanings = meanings, Reference = ReferenceOf(context, values, content) };
    }

    /// <summary>Calls the only channel <c>spinning</c> where the heading or the preamble tells of a spinning linear probe.</summary>
    private static void SpinningProbe(TableContext context, Heading[] headings, List<ValueColumn> values)
    {
        var told = context.Metadata("probe", "source", "measurement", "method")?.Contains("spinning", StringComparison.OrdinalIgnoreCase) == true
            || Array.Exists(headings, heading => heading.Kind == HeadingKind.Spin)
            || values.Exists(value => value.Channel.Contains("spinning", StringComparison.Ordinal));
        if (!told || values.Select(value => value.Channel).Distinct(StringComparer.Ordinal).Count() != 1)
        {
            return;
        }

        for (var at = 0; at < values.Count; at++)
        {
            values[at] = values[at] with { Channel = "spinning" };
        }

        context.Note("spinning-linear", "The samples were taken with a spinning linear probe: their ripple, not their level, tells the axial ratio.");

    }

    private static void NoteSpare(TableContext context, Heading[] headings, TableKey[] keys, List<ValueColumn> values)
    {
        var spare = Enumerable.Range(0, headings.Length).Where(at => headings[at].Text.Length > 0 && keys.All(key => key.Column != at) && values.TrueForAll(value => value.Column != at)).ToArray();
        if (spare.Length > 0)
        {
            context.Note("unused-columns", $"Columns that no figure needs were not used: {string.Join(", ", spare.Select(at => $"\"{headings[at].Text}\""))}.", context.HeadingPlace(spare[0]));
        }
    }

    private static LevelReference ReferenceOf(TableContext context, List<ValueColumn> values, TableContent content)
    {
        var levels = values.FindAll(value => value.Part == ChannelPart.Level);
        var isotropic = levels.FindAll(value => value.Heading.Unit.Kind == UnitKind.DecibelIsotropic);
        if (content != TableContent.Cuts || isotropic.Count == 0)
        {
            return LevelReference.Receiver;
        }

        var other = values.Find(value => value.Part is not (ChannelPart.Phase or ChannelPart.Level) || (value.Part == ChannelPart.Level && value.Heading.Unit.Kind != UnitKind.DecibelIsotropic));
        return other is null ? LevelReference.Isotropic : throw TableFaults.MixedUnits(context.HeadingPlace(other.Column), other.Heading.Text, isotropic[0].Heading.Text);
    }

    private static ColumnMeaning Meaning(Heading heading, int at, TableKey[] keys, List<ValueColumn> values)
    {
        if (Array.Find(keys, key => key.Column == at) is { } key)
        {
            var isFrequency = key.Kind == HeadingKind.Frequency;
            var name = key.Kind == HeadingKind.Angle ? "angle of the positioner" : key.Kind.ToString().ToLowerInvariant();
            return new(heading.Text, name, heading.Unit.Kind == UnitKind.None && !isFrequency ? "deg" : heading.Unit.Text);
        }

        if (values.Find(value => value.Column == at) is not { } column)
        {
            return new(heading.Text, "not used", heading.Unit.Text);
        }

        var part = column.Part switch
        {
            ChannelPart.Level => "level",
            ChannelPart.Amplitude => "linear amplitude",
            ChannelPart.Power => "linear power",
            ChannelPart.Phase => "phase",
            ChannelPart.Real => "real part",
            ChannelPart.Imaginary => "imaginary part",
            ChannelPart.ReturnLoss => "return loss",
            _ => "standing wave ratio",
        };
        var unit = column.Part == ChannelPart.Phase && heading.Unit.Kind == UnitKind.None ? "deg" : heading.Unit.Text;
        var across = column.AcrossSlot switch
        {
            < 0 => string.Empty,
            TableKey.Frequency => string.Create(CultureInfo.InvariantCulture, $" at {column.Across / 1e6:0.######} MHz"),
            _ => string.Create(CultureInfo.InvariantCulture, $" at {keys[column.AcrossSlot].Kind.ToString().ToLowerInvariant()} {column.Across:0.###} degrees"),
        };
        return new(heading.Text, $"{part} of {(heading.Kind == HeadingKind.Reflection ? "the port" : $"channel {column.Channel}")}{across}", unit, column.Channel);
    }
}
