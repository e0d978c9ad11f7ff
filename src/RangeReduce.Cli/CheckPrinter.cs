using System.Globalization;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;
using RangeReduce.Runs.Description;

namespace RangeReduce.Cli;

/// <summary>Prints what a measurement folder holds, as text.</summary>
internal static class CheckPrinter
{
    /// <summary>Prints the description.</summary>
    /// <param name="terminal">Where to print.</param>
    /// <param name="description">What was found.</param>
    /// <param name="columns">Whether each table is printed column by column.</param>
    public static void Print(Terminal terminal, RunDescription description, bool columns)
    {
        var output = terminal.Output;
        output.WriteLine($"{description.Information.Name}: {Count(description.Files.Count, "file")}, {Count(description.States.Count, "state")}, {(description.HasManifest ? "by run.toml" : "understood from names and content (no run.toml)")}");
        output.WriteLine();
        PrintFiles(output, description);
        output.WriteLine();
        PrintStates(output, description);
        output.WriteLine();
        output.WriteLine("Conventions");
        foreach (var convention in description.Conventions)
        {
            output.WriteLine($"  {convention.Name}: {convention.Value} ({convention.From})");
        }

        if (columns)
        {
            PrintColumns(output, description);
        }

        PrintList(output, "Missing", description.Missing);
        if (description.Remarks.Count > 0)
        {
            output.WriteLine();
            output.WriteLine("Remarks");
            var console = terminal.OutputConsole();
            foreach (var remark in description.Remarks)
            {
                output.Write("  ");
                RemarkPrinter.PrintLine(console, remark);
            }
        }
    }

    private static void PrintFiles(TextWriter output, RunDescription description)
    {
        var table = new PlainTable("file", "is", "state", "source", "because of", "holds");
        foreach (var file in description.Files)
        {
            table.Add(file.Input.Path, KindWord(file), file.Input.State ?? "-", file.Input.Source?.Word() ?? "-", file.Input.Reason, Holds(file));
        }

        table.Write(output);
    }

    private static void PrintStates(TextWriter output, RunDescription description)
    {
        var table = new PlainTable("state", "intended hand", "measured", "simulated");
        foreach (var state in description.States)
        {
            table.Add(
                state.State.Name,
                state.State.KnownHand is { } known ? $"{known.Word()} (known)" : state.State.IntendedHand?.Word() ?? "not stated",
                $"{Count(state.MeasuredSweeps, "sweep")}, {Count(state.MeasuredCuts, "cut")}",
                $"{Count(state.SimulatedSweeps, "sweep")}, {Count(state.SimulatedCuts, "cut")}");
        }

        table.Write(output);
    }

    private static void PrintColumns(TextWriter output, RunDescription description)
    {
        foreach (var file in description.Files.Where(file => file.Columns.Count > 0))
        {
            output.WriteLine();
            output.WriteLine($"Columns of {file.Input.Path}");
            foreach (var column in file.Columns)
            {
                output.WriteLine($"  {column.Heading}: {column.Meaning}");
            }
        }
    }

    private static string KindWord(FileDescription file) => file.Use switch
    {
        FileUse.Faulty => "faulty",
        FileUse.Copy => "a copy",
        FileUse.Repeat => "a repeat",
        FileUse.NotRead when file.Input.Kind == InputKind.Other => "not data",
        FileUse.NotRead => "not read",
        _ => file.Input.Kind switch
        {
            InputKind.Manifest => "manifest",
            InputKind.Sweep => "sweep",
            InputKind.Cut => "cuts",
            InputKind.GainTable => "gain of the standard",
            InputKind.GainStandardCut => "levels of the standard",
            _ => "not data",
        },
    };

    private static string Holds(FileDescription file)
    {
        if (file.Sweep is { } sweep)
        {
            var reference = string.Join(", ", sweep.ReferenceOhm.Distinct().Select(ohm => ohm.ToString("0.##", CultureInfo.InvariantCulture)));
            return string.Create(CultureInfo.InvariantCulture, $"{Count(sweep.Points, "point")}, {Ghz(sweep.LowHz)} to {Ghz(sweep.HighHz)} GHz, {Count(sweep.Ports, "port")}, {reference} ohm{(sweep.HasPhase ? string.Empty : ", no phase")}");
        }

        if (file.GainTable is { } gain)
        {
            return string.Create(CultureInfo.InvariantCulture, $"{Count(gain.Points, "point")}, {Ghz(gain.LowHz)} to {Ghz(gain.HighHz)} GHz, {gain.LowDbi:0.00} to {gain.HighDbi:0.00} dBi");
        }

        return file.Cuts.Count == 0 ? string.Empty : file.Cuts.Count == 1 ? Holds(file.Cuts[0]) : $"{file.Cuts.Count} cuts, the first: {Holds(file.Cuts[0])}";
    }

    private static string Holds(CutDescription cut)
    {
        var along = cut.Axis == CutAxis.Theta ? "theta" : "phi";
        var fixedAt = cut.FixedDeg is { } deg ? string.Create(CultureInfo.InvariantCulture, $"{(cut.Axis == CutAxis.Theta ? "phi" : "theta")} = {deg:0.##} deg, ") : string.Empty;
        var frequencies = cut.LowHz is { } low && cut.HighHz is { } high ? $"{Count(cut.FrequencyCount, "frequency", "frequencies")} {Ghz(low)} to {Ghz(high)} GHz, " : string.Empty;
        var channels = string.Join(", ", cut.Channels.Select(channel => $"{channel.Channel} as {(channel.IsTurned ? "minus " : string.Empty)}{channel.Component.Word() ?? "nothing"}{(channel.HasPhase ? string.Empty : " (level only)")}"));
        var angles = cut.AngleCount == 1
            ? string.Create(CultureInfo.InvariantCulture, $"{along} {cut.LowDeg:0.##} deg")
            : string.Create(CultureInfo.InvariantCulture, $"{along} {cut.LowDeg:0.##} to {cut.HighDeg:0.##} deg ({cut.AngleCount})");
        return $"{fixedAt}{angles}, {frequencies}{channels}";
    }

    private static void PrintList(TextWriter output, string heading, IReadOnlyList<string> sentences)
    {
        if (sentences.Count == 0)
        {
            return;
        }

        output.WriteLine();
        output.WriteLine(heading);
        foreach (var sentence in sentences)
        {
            output.WriteLine($"  {sentence}");
        }
    }

    private static string Count(int count, string one, string? many = null) => string.Create(CultureInfo.InvariantCulture, $"{count} {(count == 1 ? one : many ?? one + "s")}");

    private static string Ghz(double hertz) => (hertz / 1e9).ToString("0.####", CultureInfo.InvariantCulture);
}
