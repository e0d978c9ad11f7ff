using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction;

/// <summary>What every reducer needs: the run, and where to put figures, traces and remarks.</summary>
/// <param name="run">The run as corrected.</param>
public sealed class ReductionContext(MeasurementRun run)
{
    private readonly string[] _corrections = [.. run.Corrections.Select(correction => correction.Name)];

    /// <summary>Gets the run.</summary>
    public MeasurementRun Run { get; } = run;

    /// <summary>Gets the table that is being filled.</summary>
    public FigureTable Table { get; } = new();

    /// <summary>Gets the remarks.</summary>
    public RemarkCollector Remarks { get; } = new();

    /// <summary>Makes the origin of a figure out of sweeps, which no correction touches yet.</summary>
    public static FigureOrigin OriginOfSweep(string inputId, string formula) => new([inputId], [], formula);

    /// <summary>Makes the origin of a figure out of cuts.</summary>
    public FigureOrigin OriginOfCut(IReadOnlyList<string> inputIds, string formula) => new(inputIds, _corrections, formula);

    /// <summary>Gives the place of an input file for a remark.</summary>
    public SourcePlace? PlaceOf(string inputId) => Run.Inputs.FirstOrDefault(input => string.Equals(input.Id, inputId, StringComparison.Ordinal)) is { } input
        ? new SourcePlace(input.Path)
        : null;
}
