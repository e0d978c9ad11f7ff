using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Assembly;

/// <summary>Puts the gain standard together out of its table and its readings.</summary>
internal static class GainStandardAssembler
{
    /// <summary>Gives the standard; null, with a remark where parts of one are there, without a gain table.</summary>
    public static GainStandard? Assemble(IEnumerable<FileReading> readings, IReadOnlyList<StateCut> levels, IReadOnlyList<StateSweep> sweeps, List<Remark> remarks)
    {
        var tables = readings.Where(reading => reading.Content?.GainTable is not null).ToArray();
        if (tables.Length == 0)
        {
            if (levels.Count > 0)
            {
                remarks.Add(new(RemarkSeverity.Doubt, "gain-standard-without-table", "There are levels of a gain standard but no table of its gain, so gain cannot be determined."));
            }

            return null;
        }

        foreach (var other in tables[1..])
        {
            remarks.Add(new(RemarkSeverity.Doubt, "second-gain-table", $"The file holds a second gain table; {tables[0].File.Input.Path} is used.", new(other.File.Input.Path)));
        }

        if (levels.Count == 0)
        {
            remarks.Add(new(RemarkSeverity.Doubt, "gain-standard-without-levels", "There is a gain table but no levels of the standard through the same receiver, so gain cannot be determined.", new(tables[0].File.Input.Path)));
        }

        var (frequencyHz, gainDbi) = tables[0].Content!.GainTable!.Value;
        return new(tables[0].File.Input.Id, frequencyHz, gainDbi, levels) { Sweeps = sweeps };
    }
}
