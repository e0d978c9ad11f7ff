using System.Globalization;
using RangeReduce.Diagnostics;

namespace RangeReduce.Comparison;

/// <summary>Finds the factor on frequency that lays a simulated curve on the measured one.</summary>
/// <remarks>Model measured(f) = simulated(f / s). On a logarithmic axis a scale is a shift: a coarse lag by correlation of mean-free curves and by
/// least difference, then refinement of s by least root mean square difference. Common practice; whether decibels or linear values are fitted is
/// the caller's choice and belongs beside the result.</remarks>
public static class FrequencyScaleFit
{
    private const int LeastCount = 16;
    private const int RivalCount = 4;

    /// <summary>Fits the factor where that is possible.</summary>
    /// <param name="simulatedHz">Frequencies of the simulated curve in hertz, positive, strictly rising.</param>
    /// <param name="simulated">Its values, as many.</param>
    /// <param name="measuredHz">Frequencies of the measured curve in hertz, positive, strictly rising.</param>
    /// <param name="measured">Its values, as many, in the unit of the simulated ones.</param>
    /// <param name="scale">The outcome; null where there is none.</param>
    /// <param name="reason">Why there is none, as a sentence; empty where there is one.</param>
    /// <param name="options">How to look; null for the defaults.</param>
    /// <returns>Whether there is an outcome.</returns>
    /// <exception cref="ArgumentException">A curve has not as many values as frequencies.</exception>
    public static bool TryFit(
        double[] simulatedHz,
        double[] simulated,
        double[] measuredHz,
        double[] measured,
        out FrequencyScale? scale,
        out string reason,
        FrequencyScaleOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(simulatedHz);
        ArgumentNullException.ThrowIfNull(simulated);
        ArgumentNullException.ThrowIfNull(measuredHz);
        ArgumentNullException.ThrowIfNull(measured);
        options ??= new FrequencyScaleOptions();
        scale = null;
        reason = SampledCurve.Fault("simulated", simulatedHz, simulated) ?? SampledCurve.Fault("measured", measuredHz, measured) ?? Unfit(simulatedHz, simulated, measuredHz, measured) ?? string.Empty;
        if (reason.Length > 0)
        {
            return false;
        }

        var misfit = new ScaleMisfit(simulatedHz, simulated, measuredHz, measured, options);
        var step = misfit.LogStep;
        var lags = CoarseLags(misfit);
        var minima = lags.Count == 0 ? [] : Refine(misfit, Starts(lags, step), step, options);
        if (minima.Length == 0 || !double.IsFinite(minima[0].Rms))
        {
            reason = string.Create(CultureInfo.InvariantCulture, $"The curves share less than {100.0 * options.LeastCover:F0} % of the measured points at every factor that was allowed.");
            return false;
        }

        scale = Describe(misfit, minima, step);
        return true;
    }

    private static string? Unfit(double[] simulatedHz, double[] simulated, double[] measuredHz, double[] measured)
    {
        if (simulatedHz[0] <= 0.0 || measuredHz[0] <= 0.0)
        {
            return "A frequency scale needs positive frequencies.";
        }

        if (Math.Min(simulatedHz.Length, measuredHz.Length) < LeastCount)
        {
            return $"A curve has fewer than {LeastCount} points.";
        }

        return simulated.Max() > simulated.Min() && measured.Max() > measured.Min() ? null : "A curve is constant and has no feature to lay on the other.";
    }

    private static List<CoarseLag> CoarseLags(ScaleMisfit misfit)
    {
        var lags = Enumerable.Range(-misfit.Reach, (2 * misfit.Reach) + 1).Select(n => (Lag: n * misfit.LogStep, Shifted: misfit.Shifted(n)));
        return [.. lags.Where(lag => double.IsFinite(lag.Shifted.Rms)).Select(lag => new CoarseLag(lag.Lag, lag.Shifted.Rms, lag.Shifted.Correlation))];
    }

    /// <summary>Takes the lag of the best correlation and the deepest local minima of the difference; noise makes many shallow ones.</summary>
    private static IEnumerable<double> Starts(List<CoarseLag> lags, double step)
    {
        var best = lags.MaxBy(lag => lag.Correlation)!.Lag;
        var minima = lags.Where((lag, n) => (n == 0 || lags[n - 1].Rms >= lag.Rms) && (n == lags.Count - 1 || lags[n + 1].Rms > lag.Rms));
        return minima.OrderBy(lag => lag.Rms).Select(lag => lag.Lag).Where(lag => Math.Abs(lag - best) > 2.0 * step).Take(RivalCount).Prepend(best);
    }

    /// <summary>Searches two steps to either side of each start and refines the minima that may still win.</summary>
    private static ScaleMinimum[] Refine(ScaleMisfit misfit, IEnumerable<double> starts, double step, FrequencyScaleOptions options)
    {
        var limit = Math.Log(1.0 + options.LargestDeparture);
        var scans = starts.Select(lag => Scan(misfit, Math.Max(lag - (2.0 * step), -limit), Math.Min(lag + (2.0 * step), limit))).ToArray();
        var least = scans.Min(scan => scan.Rms);
        return [.. scans.Select(scan => scan.Rms > 2.0 * least ? scan.Minimum : Polish(misfit, scan)).OrderBy(minimum => minimum.Rms)];
    }

    private static CoarseMinimum Scan(ScaleMisfit misfit, double low, double high)
    {
        const int Parts = 16;
        var places = Enumerable.Range(0, Parts + 1).Select(n => low + ((high - low) * n / Parts)).ToArray();
        var rms = Array.ConvertAll(places, place => misfit.Rms(Math.Exp(place)));
        var least = Enumerable.Range(0, places.Length).Where(n => double.IsFinite(rms[n])).DefaultIfEmpty(0).MinBy(n => rms[n]);
        var atEnd = least is 0 or Parts || !double.IsFinite(rms[least - 1]) || !double.IsFinite(rms[least + 1]);
        var value = double.IsFinite(rms[least]) ? rms[least] : double.PositiveInfinity;
        return new CoarseMinimum(places[least], value, atEnd, atEnd ? places[least] : places[least - 1], atEnd ? places[least] : places[least + 1]);
    }

    private static ScaleMinimum Polish(ScaleMisfit misfit, CoarseMinimum scan)
    {
        if (scan.AtEnd)
        {
            return scan.Minimum;
        }

        var factor = Math.Exp(GoldenSection(place => misfit.Rms(Math.Exp(place)), scan.Low, scan.High));
        return new ScaleMinimum(factor, misfit.Rms(factor), AtEnd: false);
    }

    private static double GoldenSection(Func<double, double> function, double low, double high)
    {
        var ratio = (Math.Sqrt(5.0) - 1.0) / 2.0;
        var (left, right) = (high - (ratio * (high - low)), low + (ratio * (high - low)));
        var (atLeft, atRight) = (function(left), function(right));
        while (high - low > 1e-10)
        {
            if (atLeft < atRight)
            {
                (high, right, atRight) = (right, left, atLeft);
                left = high - (ratio * (high - low));
                atLeft = function(left);
            }
            else
            {
                (low, left, atLeft) = (left, right, atRight);
                right = low + (ratio * (high - low));
                atRight = function(right);
            }
        }

        return 0.5 * (low + high);
    }

    private static FrequencyScale Describe(ScaleMisfit misfit, ScaleMinimum[] minima, double step)
    {
        var best = minima[0];
        var remarks = new List<Remark>();
        if (best.AtEnd)
        {
            remarks.Add(new Remark(RemarkSeverity.Doubt, "frequency-scale-at-end", string.Create(CultureInfo.InvariantCulture, $"The best frequency scale, {best.Factor:F5}, lies at the end of the range that was searched.")));
        }

        var rival = minima.FirstOrDefault(minimum => Math.Abs(Math.Log(minimum.Factor / best.Factor)) > step && minimum.Rms < 1.1 * best.Rms);
        if (rival is not null)
        {
            remarks.Add(new Remark(RemarkSeverity.Doubt, "frequency-scale-two-minima", string.Create(CultureInfo.InvariantCulture, $"The frequency scales {best.Factor:F5} and {rival.Factor:F5} fit nearly alike.")));
        }

        var before = misfit.Rms(1.0, leastCover: 0.0);
        if (before <= best.Rms && Math.Abs(best.Factor - 1.0) > 1e-9)
        {
            remarks.Add(new Remark(RemarkSeverity.Doubt, "frequency-scale-no-gain", "No frequency scale lays the curves closer than they lie already."));
        }

        var (half, effective) = best.AtEnd ? (double.NaN, double.NaN) : ScaleInterval.HalfWidth(misfit, best.Factor);
        return new FrequencyScale
        {
            Factor = best.Factor,
            Low = best.Factor - half,
            High = best.Factor + half,
            RmsBefore = before,
            RmsAfter = best.Rms,
            Count = misfit.Residuals(best.Factor).Count,
            EffectiveCount = effective,
            Remarks = remarks,
        };
    }

    private sealed record CoarseLag(double Lag, double Rms, double Correlation);

    private sealed record CoarseMinimum(double Place, double Rms, bool AtEnd, double Low, double High)
    {
        internal ScaleMinimum Minimum => new(Math.Exp(Place), Rms, AtEnd);
    }

    private sealed record ScaleMinimum(double Factor, double Rms, bool AtEnd);
}
