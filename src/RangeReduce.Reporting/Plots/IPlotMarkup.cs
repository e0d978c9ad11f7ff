namespace RangeReduce.Reporting.Plots;

/// <summary>A drawing target that keeps what belongs to a curve together, so that a reader can hide it or read it.</summary>
internal interface IPlotMarkup
{
    /// <summary>Starts what belongs to a curve.</summary>
    /// <param name="name">Name of the curve; null in a legend.</param>
    /// <param name="state">Configuration state; null for none.</param>
    void BeginCurve(string? name, string? state);

    /// <summary>Ends what belongs to a curve.</summary>
    void EndCurve();
}
