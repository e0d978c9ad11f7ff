using System.Globalization;
using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes the traces as tables: one file a sweep, one a cut, one for what a state does on the axis over frequency.</summary>
/// <remarks>The headings are the ones that the cut-table reader understands, so that a trace can be read back as data.</remarks>
public static class TraceCsvWriter
{
    /// <summary>Writes all traces into a folder that exists.</summary>
    /// <returns>The names of the files, in order.</returns>
    public static IReadOnlyList<string> Write(FigureTable table, string folder)
    {
        ArgumentNullException.ThrowIfNull(table);
        var files = new List<string>();
        var names = new HashSet<string>(StringComparer.OrdinalIgnoreCase);
        foreach (var group in table.Traces.GroupBy(trace => (trace.State, trace.Source, trace.Axis, trace.At, trace.PhiDeg, trace.ThetaDeg, trace.Method)))
        {
            var plain = NameOf(group.First());
            var name = plain;
            for (var copy = 2; !names.Add(name); copy++)
            {
                name = string.Create(CultureInfo.InvariantCulture, $"{plain}-{copy}");
            }

            using var target = new FileStream(Path.Combine(folder, name + ".csv"), FileMode.CreateNew);
            WriteTable([.. group], target);
            files.Add(name + ".csv");
        }

        return files;
    }

    private static void WriteTable(Trace[] traces, Stream target)
    {
        using var writer = CsvText.Open(target);
        var along = traces[0].Axis == TraceAxis.Angle;
        var columns = traces.Select(trace => (trace.Quantity, trace.Component)).Distinct().ToArray();
        writer.WriteField("frequency (Hz)");
        if (along)
        {
            writer.WriteField(traces[0].ThetaDeg is null ? "theta (deg)" : "phi (deg)");
        }

        foreach (var (quantity, component) in columns)
        {
            writer.WriteField($"{component.Word()} {quantity.Name} ({quantity.Unit})".TrimStart());
        }

        writer.EndRecord();

        // Traces over different abscissae stand below each other.
        foreach (var block in traces.GroupBy(trace => (trace.FrequencyHz, trace.X.Length, First: trace.X[0], Last: trace.X[^1])))
        {
            var curves = Array.ConvertAll(columns, column => block.FirstOrDefault(trace => trace.Quantity == column.Quantity && trace.Component == column.Component)?.Y);
            var x = block.First().X;
            for (var i = 0; i < x.Length; i++)
            {
                writer.WriteField(Number(along ? block.Key.FrequencyHz!.Value : x[i]));
                if (along)
                {
                    writer.WriteField(Number(x[i]));
                }

                foreach (var curve in curves)
                {
                    writer.WriteField(curve is null || !double.IsFinite(curve[i]) ? string.Empty : curve[i].ToString("0.######", CultureInfo.InvariantCulture));
                }

                writer.EndRecord();
            }
        }
    }

    private static string NameOf(Trace trace)
    {
        var kind = trace.Axis == TraceAxis.Angle
            ? trace.ThetaDeg is { } theta ? string.Create(CultureInfo.InvariantCulture, $"cut-theta{theta:0.##}") : trace.PhiDeg is { } phi ? string.Create(CultureInfo.InvariantCulture, $"cut-phi{phi:0.##}") : "cut"
            : trace.At == FigurePlace.Axis ? "axis" : "sweep";
        var method = trace.Method is null ? string.Empty : "-" + trace.Method;
        return FileNames.Safe($"{trace.State}-{trace.Source?.Word()}-{kind}{method}");
    }

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
