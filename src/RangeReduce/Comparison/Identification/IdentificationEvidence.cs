namespace RangeReduce.Comparison.Identification;

/// <summary>Where along frequency the answer for one sweep is decided.</summary>
public sealed record IdentificationEvidence
{
    /// <summary>Gets the answer.</summary>
    public required SweepIdentification Identification { get; init; }

    /// <summary>Gets the frequencies in hertz.</summary>
    public required double[] FrequencyHz { get; init; }

    /// <summary>Gets each point's squared distance from the signature of the likeliest state over twice its noise variance; about 1 for noise alone with phase.</summary>
    public required double[] Misfit { get; init; }

    /// <summary>Gets each point's share of the log-likelihood by which the likeliest state leads the second; negative where the point speaks for the second. Empty with one state.</summary>
    public required double[] Lead { get; init; }

    /// <summary>Gets the lower end, in hertz, of the narrowest band that holds half of what decides: of <see cref="Lead"/>, or of <see cref="Misfit"/> where the answer is unknown.</summary>
    public required double DecidingLowHz { get; init; }

    /// <summary>Gets the upper end, in hertz, of that band.</summary>
    public required double DecidingHighHz { get; init; }

    /// <summary>Gets up to five frequencies, in hertz, that decide most, the strongest first, no two nearer than 1 % of the band.</summary>
    public required double[] DecidingHz { get; init; }

    internal static IdentificationEvidence Make(SweepIdentification identification, double[] frequencyHz, double[] nearest, double[]? second)
    {
        double[] lead = second is null ? [] : [.. second.Zip(nearest, (far, near) => far - near)];
        var deciding = identification.Answer == IdentificationAnswer.Unknown || lead.Length == 0 ? nearest : lead;
        var (first, last) = NarrowestHalf(deciding);
        return new IdentificationEvidence
        {
            Identification = identification,
            FrequencyHz = frequencyHz,
            Misfit = nearest,
            Lead = lead,
            DecidingLowHz = frequencyHz[first],
            DecidingHighHz = frequencyHz[last],
            DecidingHz = Strongest(frequencyHz, deciding),
        };
    }

    private static (int First, int Last) NarrowestHalf(double[] share)
    {
        var goal = 0.5 * share.Sum();
        var (best, width) = ((First: 0, Last: share.Length - 1), share.Length);
        for (var first = 0; first < share.Length; first++)
        {
            var sum = 0.0;
            for (var last = first; last < share.Length && last - first + 1 < width; last++)
            {
                sum += share[last];
                if (sum >= goal)
                {
                    (best, width) = ((first, last), last - first + 1);
                }
            }
        }

        return best;
    }

    private static double[] Strongest(double[] frequencyHz, double[] share)
    {
        var apart = 0.01 * (frequencyHz[^1] - frequencyHz[0]);
        var chosen = new List<double>();
        foreach (var n in Enumerable.Range(0, share.Length).OrderByDescending(n => share[n]))
        {
            if (share[n] > 0.0 && chosen.TrueForAll(hz => Math.Abs(hz - frequencyHz[n]) >= apart))
            {
                chosen.Add(frequencyHz[n]);
            }

            if (chosen.Count == 5)
            {
                break;
            }
        }

        return [.. chosen];
    }
}
