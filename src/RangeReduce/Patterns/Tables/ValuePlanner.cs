namespace RangeReduce.Patterns.Tables;

/// <summary>Finds the columns of samples, pairs them to channels and checks that each channel is whole.</summary>
internal static class ValuePlanner
{
    /// <summary>Plans the columns of samples.</summary>
    /// <param name="context">The table.</param>
    /// <param name="headings">The resolved headings; those that turn out not to be needed are changed to <see cref="HeadingKind.Spare"/>.</param>
    /// <param name="keys">The keys.</param>
    /// <param name="kind">Channels of a pattern, or the reflection of a port.</param>
    /// <exception cref="Diagnostics.MeasurementDataException">A heading is not understood or a channel is not whole.</exception>
    public static List<ValueColumn> Plan(TableContext context, Heading[] headings, TableKey[] keys, HeadingKind kind)
    {
        var unknown = Enumerable.Range(0, headings.Length).Where(at => headings[at] is { Kind: HeadingKind.Unknown, IsAcross: false } && headings[at].Text.Length > 0).ToArray();
        var values = new List<ValueColumn>();
        for (var at = 0; at < headings.Length; at++)
        {
            var heading = headings[at];
            if (heading.Kind != kind && !heading.IsAcross)
            {
                continue;
            }

            if (heading.Part == ChannelPart.None)
            {
                throw TableFaults.LevelUnit(context.HeadingPlace(at), heading.Text);
            }

            if (heading.Part == ChannelPart.Amplitude && heading.Unit.Kind == UnitKind.None)
            {
                context.Note("linear-amplitude", $"The column \"{heading.Text}\" has no unit and was read as a linear amplitude.", context.HeadingPlace(at));
            }

            if (heading.Part == ChannelPart.Phase && heading.Unit.Kind == UnitKind.None)
            {
                context.Note("angle-unit", $"The column \"{heading.Text}\" has no unit and was read in degrees.", context.HeadingPlace(at));
            }

            values.Add(Column(context, heading, at, keys));
        }

        var unitless = Array.FindIndex(unknown, at => HeadingWords.IsChannel(headings[at].Channel));
        if (unitless >= 0)
        {
            throw TableFaults.LevelUnit(context.HeadingPlace(unknown[unitless]), headings[unknown[unitless]].Text);
        }

        if (unknown.Length > 0)
        {
            throw TableFaults.UnknownHeadings(context.HeadingPlace(unknown[0]), unknown.Select(at => headings[at].Text), headings.Where(heading => heading.IsKnown).Select(heading => heading.Text));
        }

        Name(context, values);
        return Whole(context, headings, values);
    }

    private static ValueColumn Column(TableContext context, Heading heading, int at, TableKey[] keys)
    {
        var column = new ValueColumn { Column = at, Heading = heading, Channel = heading.Channel, Part = heading.Part, Factor = heading.Unit.Kind == UnitKind.None ? 1.0 : heading.Unit.Factor };
        if (!heading.IsAcross)
        {
            return column;
        }

        if (heading.AcrossKind == HeadingKind.Frequency && heading.AcrossUnit.Kind != UnitKind.Frequency)
        {
            throw TableFaults.FrequencyUnit(context.HeadingPlace(at), heading.Text);
        }

        var slot = Array.FindIndex(keys, key => key.Kind == heading.AcrossKind && key.IsAcross);
        return slot >= 0 ? column with { AcrossSlot = slot, Across = heading.Across * heading.AcrossUnit.Factor } : throw TableFaults.MixedAcross(context.HeadingPlace(at), heading.Text);
    }

    /// <summary>Names channels whose headings give a part or unit only: after the only named channel, the preamble, the options, the file name.</summary>
    private static void Name(TableContext context, List<ValueColumn> values)
    {
        if (!values.Exists(value => value.Channel.Length == 0))
        {
            return;
        }

        var named = values.Select(value => value.Channel).Where(name => name.Length > 0).Distinct(StringComparer.Ordinal).ToArray();
        var told = context.Options.Channel ?? context.Metadata("channel", "component", "polarization", "polarisation", "pol", "probe polarization", "probe polarisation", "probe", "receive polarization");
        var name = told is null ? null : HeadingParser.Parse($"{told} [dB]").Channel;
        string? fromFile = null;
        if (named.Length == 0 && string.IsNullOrEmpty(name))
        {
            fromFile = NameHints.Channel(Path.GetFileName(context.File));
            context.Note("channel-name", fromFile is null ? "Nothing names the channel; it is called \"signal\"." : $"The channel was taken from the name of the file: {fromFile}.");
        }

        for (var at = 0; at < values.Count; at++)
        {
            if (values[at].Channel.Length > 0)
            {
                continue;
            }

            // A bare "phase" belongs to the column before it.
            var before = at > 0 && named.Length > 0 && values[at].Part is ChannelPart.Phase or ChannelPart.Imaginary ? values[at - 1].Channel : string.Empty;
            var channel = before.Length > 0 ? before : named.Length == 1 ? named[0] : named.Length > 1 ? throw TableFaults.NamelessChannel(context.HeadingPlace(values[at].Column), values[at].Heading.Text) : name is { Length: > 0 } ? name : fromFile ?? "signal";
            values[at] = values[at] with { Channel = channel };
        }
    }

    private static List<ValueColumn> Whole(TableContext context, Heading[] headings, List<ValueColumn> values)
    {
        var whole = new List<ValueColumn>();
        foreach (var group in values.GroupBy(value => (value.Channel, value.Across)))
        {
            var columns = group.ToList();
            foreach (var part in columns.GroupBy(column => column.Part).Where(part => part.Count() > 1))
            {
                var (first, second) = (part.First(), part.ElementAt(1));
                throw TableFaults.Twice(context.HeadingPlace(second.Column), second.Heading.Text, first.Heading.Text, "channel");
            }

            var real = columns.Find(column => column.Part == ChannelPart.Real);
            var imaginary = columns.Find(column => column.Part == ChannelPart.Imaginary);
            var phase = columns.Find(column => column.Part == ChannelPart.Phase);
            var size = columns.Find(column => column.Part is ChannelPart.Level) ?? columns.Find(column => column.Part is ChannelPart.Amplitude or ChannelPart.Power)
                ?? columns.Find(column => column.Part is ChannelPart.ReturnLoss) ?? columns.Find(column => column.Part is ChannelPart.StandingWaveRatio);
            if ((real is null) != (imaginary is null))
            {
                var single = real ?? imaginary!;
                throw TableFaults.HalfChannel(context.HeadingPlace(single.Column), single.Heading.Text, real is null ? "the real part" : "the imaginary part", headings.Select(heading => heading.Text));
            }

            if (real is null && size is null)
            {
                throw TableFaults.HalfChannel(context.HeadingPlace(phase!.Column), phase.Heading.Text, "the level", headings.Select(heading => heading.Text));
            }

            ValueColumn?[] used = real is not null ? [real, imaginary] : [size, phase];
            whole.AddRange(used.OfType<ValueColumn>());
            foreach (var column in columns.Where(column => !used.Contains(column)))
            {
                headings[column.Column] = column.Heading with { Kind = HeadingKind.Spare };
                context.Note("redundant-column", $"The column \"{column.Heading.Text}\" says again what other columns of the channel {column.Channel} say and was not used.", context.HeadingPlace(column.Column));
            }
        }

        return whole;
    }
}
