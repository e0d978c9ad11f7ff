namespace RangeReduce.Comparison;

/// <summary>One difference measure of Feature Selective Validation: its values along the curves and what they amount to.</summary>
public sealed class FsvMeasure
{
    private const double Threshold = 0.85;
    private static readonly double[] UpperBounds = [0.1, 0.2, 0.4, 0.8, 1.6];

    internal FsvMeasure(double[] points)
    {
        Points = points;
        Total = points.Average();
        Histogram = HistogramOf(points);
        GradeNumber = BarsFor(Histogram);
        Spread = BarsFor([.. Histogram.OrderDescending()]);
    }

    /// <summary>Gets the value at each point of the common axis; 0 is equality.</summary>
    public double[] Points { get; }

    /// <summary>Gets the mean of the points.</summary>
    public double Total { get; }

    /// <summary>Gets the grade of the total.</summary>
    public FsvGrade TotalGrade => GradeOf(Total);

    /// <summary>Gets the share of points in each of the six grades, excellent first; the sum is 1.</summary>
    public double[] Histogram { get; }

    /// <summary>Gets the figure that the method calls Grade: the number of bars, counted from excellent, that hold 85 % of the points; 1 is best, 6 worst.</summary>
    public int GradeNumber { get; }

    /// <summary>Gets the figure that the method calls Spread: the number of bars, the fullest first, that hold 85 % of the points; 1 is a firm verdict.</summary>
    public int Spread { get; }

    /// <summary>Gives the grade of a value; a value on a boundary has the better grade.</summary>
    public static FsvGrade GradeOf(double value) => (FsvGrade)(1 + UpperBounds.Count(bound => value > bound));

    private static double[] HistogramOf(double[] points)
    {
        var bars = new double[UpperBounds.Length + 1];
        foreach (var value in points)
        {
            bars[(int)GradeOf(value) - 1]++;
        }

        for (var bar = 0; bar < bars.Length; bar++)
        {
            bars[bar] /= points.Length;
        }

        return bars;
    }

    private static int BarsFor(double[] bars)
    {
        var sum = 0.0;
        for (var bar = 0; bar < bars.Length; bar++)
        {
            sum += bars[bar];
            if (sum >= Threshold - 1e-12)
            {
                return bar + 1;
            }
        }

        return bars.Length;
    }
}
