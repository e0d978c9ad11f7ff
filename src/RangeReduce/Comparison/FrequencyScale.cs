using RangeReduce.Diagnostics;

namespace RangeReduce.Comparison;

/// <summary>The factor on frequency that lays a simulated curve best on the measured one, and what is left after it.</summary>
public sealed record FrequencyScale
{
    /// <summary>What <see cref="Low"/> and <see cref="High"/> are.</summary>
    public const string IntervalMeaning = "95 % interval from the curvature of the sum of squares and the residuals, whose correlation along frequency is allowed for; "
        + "it covers the fit only, not the accuracy of the frequencies";

    /// <summary>Gets the factor s: measured(f) is near simulated(f / s), so above 1 the measured antenna resonates higher.</summary>
    public required double Factor { get; init; }

    /// <summary>Gets the lower end of the interval; NaN where there is none (see <see cref="IntervalMeaning"/>).</summary>
    public required double Low { get; init; }

    /// <summary>Gets the upper end of the interval; NaN where there is none.</summary>
    public required double High { get; init; }

    /// <summary>Gets the root mean square difference at the factor 1, over all common points, in the unit of the curves.</summary>
    public required double RmsBefore { get; init; }

    /// <summary>Gets the root mean square difference at <see cref="Factor"/>, over the points that both curves then cover, in the unit of the curves.</summary>
    public required double RmsAfter { get; init; }

    /// <summary>Gets the number of measured points behind <see cref="RmsAfter"/>.</summary>
    public required int Count { get; init; }

    /// <summary>Gets the number of independent points that the residuals amount to.</summary>
    public required double EffectiveCount { get; init; }

    /// <summary>Gets what makes the factor doubtful; empty where nothing does.</summary>
    public IReadOnlyList<Remark> Remarks { get; init; } = [];
}
