namespace RangeReduce.Reporting.Plots;

/// <summary>Ends and step of an axis at round numbers.</summary>
/// <param name="Minimum">Lower end.</param>
/// <param name="Maximum">Upper end.</param>
/// <param name="Step">Distance of the ticks.</param>
internal readonly record struct AxisScale(double Minimum, double Maximum, double Step)
{
    /// <summary>Gives the decimals that the ticks need.</summary>
    public int Decimals => Math.Max(0, (int)Math.Ceiling(-Math.Log10(Step) - 1e-9) + (HasQuarter ? 1 : 0));

    private bool HasQuarter => Math.Abs((Step / Math.Pow(10.0, Math.Floor(Math.Log10(Step) + 1e-9))) - 2.5) < 1e-6;

    /// <summary>Rounds a range outward to ticks.</summary>
    /// <param name="least">Least value; NaN where there is none.</param>
    /// <param name="most">Largest value.</param>
    /// <param name="ticks">About how many steps are wanted.</param>
    public static AxisScale Outward(double least, double most, int ticks)
    {
        var step = StepFor(least, most, ticks);
        if (double.IsNaN(step))
        {
            return new(0.0, 1.0, 0.5);
        }

        var (low, high) = (Math.Floor((least / step) + 1e-9) * step, Math.Ceiling((most / step) - 1e-9) * step);
        return high > low ? new(low, high, step) : new(low - step, high + step, step);
    }

    /// <summary>Keeps the ends of a range and sets ticks at round numbers inside.</summary>
    public static AxisScale Within(double least, double most, int ticks)
    {
        var step = StepFor(least, most, ticks);
        return double.IsNaN(step) || most <= least ? Outward(least, most, ticks) : new(least, most, step);
    }

    private static double StepFor(double least, double most, int ticks)
    {
        if (!double.IsFinite(least) || !double.IsFinite(most))
        {
            return double.NaN;
        }

        var span = most > least ? most - least : Math.Max(1.0, Math.Abs(most) * 0.1);
        var raw = span / ticks;
        var decade = Math.Pow(10.0, Math.Floor(Math.Log10(raw)));
        var factor = (raw / decade) switch
        {
            <= 1.4 => 1.0,
            <= 2.3 => 2.0,
            <= 3.5 => 2.5,
            <= 7.0 => 5.0,
            _ => 10.0,
        };
        return factor * decade;
    }
}
