using RangeReduce.Quantities;

namespace RangeReduce.Uncertainties;

/// <summary>Turns the trials of one number into the uncertainty of a figure.</summary>
internal static class TrialResult
{
    // An interval whose middle lies within this share of its half width from the value is printed as plus/minus.
    private const double Lopsided = 0.1;

    /// <summary>Makes the uncertainty of a figure whose interval is known.</summary>
    /// <param name="value">Value of the figure.</param>
    /// <param name="low">Lower end.</param>
    /// <param name="high">Upper end; may be infinite.</param>
    /// <param name="standard">Standard uncertainty.</param>
    /// <param name="budget">How complete the budget is.</param>
    /// <param name="shares">Share of each term.</param>
    public static Uncertainty Make(double value, double low, double high, double standard, BudgetState budget, IReadOnlyList<UncertaintyShare> shares)
    {
        if (!double.IsFinite(high))
        {
            return new(double.NaN, double.NaN, budget) { Low = low, Shares = shares };
        }

        var half = 0.5 * (high - low);
        var uncertainty = new Uncertainty(half, standard > 0.0 && half > 0.0 ? half / standard : double.NaN, budget) { Standard = standard, Shares = shares };
        return Math.Abs((0.5 * (high + low)) - value) <= Lopsided * half ? uncertainty : uncertainty with { Low = low, High = high };
    }

    /// <summary>Gives the interval of a quotient of two amplitudes whose small one is a vector in noise; see <see cref="RiceInterval"/>.</summary>
    /// <param name="trials">Quotients of the trials; sorted in place.</param>
    /// <param name="reading">Quotient of the data.</param>
    public static (double Low, double High)? Quotient(double[] trials, double reading)
    {
        var (squares, count) = (0.0, 0);
        foreach (var value in trials)
        {
            if (double.IsFinite(value))
            {
                squares += value * value;
                count++;
            }
        }

        if (count * 2 < trials.Length || count < 2)
        {
            return null;
        }

        // E|q + n|² = |q|² + 2σ² for noise of σ in each part.
        var sigma = Math.Sqrt(Math.Max(0.0, (squares / count) - (reading * reading)) / 2.0);
        if (sigma > 0.0 && reading < RiceInterval.NormalFrom * sigma)
        {
            var (low, high) = RiceInterval.Of(reading / sigma);
            return (low * sigma, high * sigma);
        }

        return CoverageInterval.Of(trials) is { } interval ? (interval.Low, interval.High) : null;
    }
}
