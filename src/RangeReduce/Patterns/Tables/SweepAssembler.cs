using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Networks;

namespace RangeReduce.Patterns.Tables;

/// <summary>Makes a reflection sweep, or the gain of a standard, out of the samples of a table without angles.</summary>
internal static class SweepAssembler
{
    /// <summary>Makes the sweep of one port.</summary>
    /// <exception cref="MeasurementDataException">The signs of the levels contradict each other, or nothing is left.</exception>
    public static NetworkSweep Sweep(TableContext context, TablePlan plan, SampleStore store)
    {
        var ports = plan.Values.Select(value => value.Channel).Distinct(StringComparer.Ordinal).ToArray();
        var used = plan.Values.Select((value, at) => (value, at)).Where(entry => string.Equals(entry.value.Channel, ports[0], StringComparison.Ordinal)).ToArray();
        if (ports.Length > 1)
        {
            context.Doubt("other-ports", $"Only {ports[0]} was used; a table with more than one port is better kept in a Touchstone file.");
        }

        var parts = used.Select(entry => (Part: Sign(context, entry.value, Column(store, entry.at, entry.value.Factor), out var values), values)).ToArray();
        var channel = SampleConversion.ToChannel(parts);
        var order = Order(context, store, row => !double.IsNaN(channel.Re[row]) && !double.IsNaN(channel.Im?[row] ?? 0.0));
        var re = Array.ConvertAll(order, row => channel.Re[row]);
        var im = Array.ConvertAll(order, row => channel.Im?[row] ?? 0.0);
        return new(Frequencies(store, order), 1, [Reference(context)], re, im) { HasPhase = channel.HasPhase };
    }

    /// <summary>Makes the gain table.</summary>
    public static GainTable Gain(TableContext context, TablePlan plan, SampleStore store)
    {
        var gain = Column(store, 0, 1.0);
        if (plan.Values[0].Heading.Unit.Kind != UnitKind.DecibelIsotropic)
        {
            context.Doubt("gain-unit", $"The column \"{plan.Values[0].Heading.Text}\" does not say over what; it was read as gain over an isotropic radiator (dBi).", context.HeadingPlace(plan.Values[0].Column));
        }

        var order = Order(context, store, row => !double.IsNaN(gain[row]));
        var uncertainty = plan.Values.Count > 1 ? Column(store, 1, 1.0) : null;
        return new(Frequencies(store, order), Array.ConvertAll(order, row => gain[row]), uncertainty is null ? null : Array.ConvertAll(order, row => uncertainty[row]));
    }

    private static double[] Column(SampleStore store, int column, double factor)
    {
        var values = new double[store.Rows];
        var at = 0;
        for (var block = 0; block < store.Samples.BlockCount; block++)
        {
            foreach (var value in store.Samples.Block(column, block))
            {
                values[at++] = value * factor;
            }
        }

        return values;
    }

    private static double[] Frequencies(SampleStore store, int[] order)
    {
        var frequency = RowFrequencies(store);
        return Array.ConvertAll(order, row => frequency[row]);
    }

    private static double[] RowFrequencies(SampleStore store)
    {
        var known = store.Keys[TableKey.Frequency].Values;
        return [.. store.Runs.SelectMany(run => Enumerable.Range(0, run.Count).Select(at => known[run.Start(TableKey.Frequency) + (at * run.Step(TableKey.Frequency))]))];
    }

    /// <summary>Gives the rows by rising frequency, without missing ones and without a second reading of a frequency.</summary>
    private static int[] Order(TableContext context, SampleStore store, Func<int, bool> isThere)
    {
        var frequency = RowFrequencies(store);
        var there = Enumerable.Range(0, frequency.Length).Where(isThere).ToArray();
        var order = there.OrderBy(row => frequency[row]).ThenBy(row => row).DistinctBy(row => frequency[row]).ToArray();
        if (order.Length == 0)
        {
            throw TableFaults.NoRows(context.HeadingsPlace);
        }

        if (order.Length < there.Length)
        {
            context.Doubt("repeated-frequencies", string.Create(CultureInfo.InvariantCulture, $"{there.Length - order.Length} rows repeat a frequency; the first reading of each counts."));
        }

        if (there.Zip(there.Skip(1)).Any(pair => frequency[pair.First] > frequency[pair.Second]))
        {
            context.Note("frequencies-sorted", "The frequencies are not in rising order in the file; they were sorted.");
        }

        return order;
    }

    /// <summary>Settles the sign: a return loss is positive, the level of S11 negative for a passive antenna (IEEE Std 145).</summary>
    private static ChannelPart Sign(TableContext context, ValueColumn column, double[] raw, out double[] values)
    {
        values = raw;
        if (!column.IsDecibel)
        {
            return column.Part;
        }

        var there = raw.Where(value => !double.IsNaN(value)).ToArray();
        var (low, high) = there.Length == 0 ? (0.0, 0.0) : (there.Min(), there.Max());
        if (low < -1.0 && high > 1.0)
        {
            throw TableFaults.ReflectionSign(context.HeadingPlace(column.Column), column.Heading.Text, low, high);
        }

        var told = column.Part;
        var seen = high > 1.0 ? ChannelPart.ReturnLoss : low < -1.0 ? ChannelPart.Level : told;
        if (seen != told)
        {
            var what = seen == ChannelPart.Level ? "is headed as a return loss but negative: it was read as the level of S11" : "is headed as the level of S11 but positive: it was read as return loss";
            context.Doubt("reflection-sign", $"The column \"{column.Heading.Text}\" {what}.", context.HeadingPlace(column.Column));
        }

        return seen;
    }

    private static double Reference(TableContext context)
    {
        var told = context.Metadata("reference impedance", "reference", "impedance", "z0", "system impedance", "port impedance", "reference impedance [ohm]", "reference impedance (ohm)", "z0 [ohm]", "z0 (ohm)");
        if (told is null)
        {
            context.Note("reference-impedance", "The table gives no reference impedance; 50 ohm was taken.");
            return 50.0;
        }

        return MetadataLine.TryQuantity(told, UnitKind.Ohm, new(UnitKind.Ohm, 1.0, "ohm"), out var ohm) && ohm > 0.0 ? ohm : throw TableFaults.ReferenceImpedance(context.File, told);
    }
}
