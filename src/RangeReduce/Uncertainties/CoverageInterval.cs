namespace RangeReduce.Uncertainties;

/// <summary>A 95 % coverage interval out of trials (JCGM 101, 7.7): ends at the 2.5 and 97.5 % places of the sorted values.</summary>
/// <param name="Low">Lower end.</param>
/// <param name="High">Upper end.</param>
/// <param name="Standard">Standard deviation of the trials.</param>
internal readonly record struct CoverageInterval(double Low, double High, double Standard)
{
    private const double Tail = 0.025;

    /// <summary>Takes the interval out of the trials; the array is sorted in place.</summary>
    /// <param name="trials">Values of the trials; NaN where a trial had none.</param>
    /// <returns>The interval; null where fewer than half of the trials had a value.</returns>
    public static CoverageInterval? Of(double[] trials)
    {
        Array.Sort(trials);

        // NaN sorts to the front.
        var missing = 0;
        while (missing < trials.Length && double.IsNaN(trials[missing]))
        {
            missing++;
        }

        var values = trials.AsSpan(missing);
        if (values.Length * 2 < trials.Length || values.Length < 2 || double.IsInfinity(values[0]) || double.IsInfinity(values[^1]))
        {
            return null;
        }

        var (sum, squares) = (0.0, 0.0);
        foreach (var value in values)
        {
            sum += value - values[0];
            squares += (value - values[0]) * (value - values[0]);
        }

        var variance = (squares - (sum * sum / values.Length)) / (values.Length - 1);
        return new(Quantile(values, Tail), Quantile(values, 1.0 - Tail), Math.Sqrt(Math.Max(0.0, variance)));
    }

    private static double Quantile(ReadOnlySpan<double> sorted, double probability)
    {
        var at = probability * (sorted.Length - 1);
        var index = Math.Min((int)at, sorted.Length - 2);
        return sorted[index] + ((at - index) * (sorted[index + 1] - sorted[index]));
    }
}
