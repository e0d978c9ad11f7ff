using System.Globalization;

using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Sections;

namespace RangeReduce.Reporting;

/// <summary>Builds the report of a reduced run: chooses what is shown and turns every number into text.</summary>
public static class ReportModelBuilder
{
    /// <summary>Builds the report.</summary>
    /// <param name="reduced">The run and its results.</param>
    /// <param name="options">Paper, date and version.</param>
    /// <returns>The report. The same arguments give the same report.</returns>
    public static ReportModel Build(ReducedRun reduced, ReportOptions options)
    {
        ArgumentNullException.ThrowIfNull(reduced);
        ArgumentNullException.ThrowIfNull(options);
        var context = new ReportContext(reduced, options);
        var names = new FileNames(context.States);
        ReportSection?[] sections =
        [
            VerdictSection.Build(context),
            MatchSection.Build(context),
            PatternSection.Build(context, names),
            OverFrequencySection.Build(context),
            StateComparisonSection.Build(context),
            SimulationSection.Build(context, names),
            UncertaintySection.Build(context),
            MakingSection.Build(context),
        ];
        var information = reduced.Run.Information;
        var made = options.Made.ToString("yyyy-MM-dd HH:mm zzz", CultureInfo.InvariantCulture);
        return new ReportModel
        {
            Title = information.Name,
            Subtitle = string.Join(" · ", new[] { Field(reduced, "item"), Field(reduced, "laboratory"), information.Chamber, information.Date is { } date ? $"measured {date}" : null }.OfType<string>()),
            Options = options,
            MadeText = $"Antenna measurement report, made {made} by rangereduce {options.Version}",
            States = context.States,
            Sections = [.. sections.OfType<ReportSection>()],
        };
    }

    private static string? Field(ReducedRun reduced, string key) => reduced.Run.Information.ReportFields.TryGetValue(key, out var value) && value.Length > 0 ? value : null;
}
