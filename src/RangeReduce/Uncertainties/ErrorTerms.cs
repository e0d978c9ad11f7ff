using RangeReduce.Runs;

namespace RangeReduce.Uncertainties;

/// <summary>The terms of the budget as numbers that trials can draw from; a term that is not stated is null and moves nothing.</summary>
/// <remarks>
/// How each value is meant: <c>gain-standard</c> is an expanded uncertainty with k = 2 as a certificate gives it; <c>repeatability</c> a standard deviation;
/// levels (<c>reflectivity</c>, <c>noise-floor</c>, <c>probe-cross-polar</c>, <c>reflection-directivity</c>) are decibels below the peak (below the port for sweeps) of a phasor of unknown phase;
/// <c>mismatch</c> the limit of a U-shaped error; all others are limits of a rectangular one (JCGM 100, 4.3.7).
/// </remarks>
public sealed record ErrorTerms
{
    /// <summary>Key of the gain standard's certificate.</summary>
    public const string GainStandardKey = "gain-standard";

    /// <summary>Key of the receiver's linearity.</summary>
    public const string LinearityKey = "receiver-linearity";

    /// <summary>Key of the mismatch between cables and antennas.</summary>
    public const string MismatchKey = "mismatch";

    /// <summary>Key of the stray level of the range.</summary>
    public const string ReflectivityKey = "reflectivity";

    /// <summary>Key of the noise floor.</summary>
    public const string NoiseFloorKey = "noise-floor";

    /// <summary>Key of the drift over a cut.</summary>
    public const string DriftKey = "drift";

    /// <summary>Key of the amplitude balance of the probe ports.</summary>
    public const string BalanceKey = "probe-balance";

    /// <summary>Key of the phase balance of the probe ports.</summary>
    public const string BalancePhaseKey = "probe-balance-phase";

    /// <summary>Key of the leakage between the probe ports.</summary>
    public const string CrossPolarKey = "probe-cross-polar";

    /// <summary>Key of the pointing.</summary>
    public const string AlignmentKey = "alignment";

    /// <summary>Key of the distance between the antennas.</summary>
    public const string DistanceKey = "distance";

    /// <summary>Key of the spread of repeats.</summary>
    public const string RepeatabilityKey = "repeatability";

    /// <summary>Key of the residual directivity of the analyser.</summary>
    public const string DirectivityKey = "reflection-directivity";

    /// <summary>Gets the standard uncertainty of the gain standard in dB (normal).</summary>
    public double? GainStandardDb { get; init; }

    /// <summary>Gets the limit of the receiver's linearity in dB (rectangular).</summary>
    public double? LinearityDb { get; init; }

    /// <summary>Gets the limit of the mismatch error in dB (U-shaped).</summary>
    public double? MismatchDb { get; init; }

    /// <summary>Gets the amplitude of stray rays against the peak.</summary>
    public double? Reflectivity { get; init; }

    /// <summary>Gets the amplitude (root mean square of the complex noise) of the noise against the peak.</summary>
    public double? Noise { get; init; }

    /// <summary>Gets the limit of the drift over a cut in dB (rectangular).</summary>
    public double? DriftDb { get; init; }

    /// <summary>Gets the limit of the amplitude balance in dB (rectangular).</summary>
    public double? BalanceDb { get; init; }

    /// <summary>Gets the limit of the phase balance in degrees (rectangular).</summary>
    public double? BalancePhaseDeg { get; init; }

    /// <summary>Gets the amplitude of the leakage of one probe port into the other.</summary>
    public double? CrossPolar { get; init; }

    /// <summary>Gets the limit of the pointing error in degrees (rectangular).</summary>
    public double? AlignmentDeg { get; init; }

    /// <summary>Gets the limit of the level error by distance in dB (rectangular).</summary>
    public double? DistanceDb { get; init; }

    /// <summary>Gets the standard deviation of repeats in dB (normal).</summary>
    public double? RepeatabilityDb { get; init; }

    /// <summary>Gets the amplitude of the residual directivity of the analyser.</summary>
    public double? Directivity { get; init; }

    /// <summary>Gets the keys that were stated.</summary>
    public IReadOnlySet<string> Given { get; init; } = new HashSet<string>(StringComparer.Ordinal);

    /// <summary>Takes the terms out of the manifest.</summary>
    public static ErrorTerms Of(MeasurementRun run)
    {
        ArgumentNullException.ThrowIfNull(run);
        var values = run.UncertaintyTerms.GroupBy(term => term.Name, StringComparer.Ordinal).ToDictionary(group => group.Key, group => group.First(), StringComparer.Ordinal);
        return new()
        {
            GainStandardDb = Value(GainStandardKey) / 2.0,
            LinearityDb = Value(LinearityKey),
            MismatchDb = Value(MismatchKey),
            Reflectivity = Amplitude(ReflectivityKey),
            Noise = Amplitude(NoiseFloorKey),
            DriftDb = Value(DriftKey),
            BalanceDb = Value(BalanceKey),
            BalancePhaseDeg = Value(BalancePhaseKey),
            CrossPolar = Amplitude(CrossPolarKey),
            AlignmentDeg = Value(AlignmentKey),
            DistanceDb = DistanceLimitDb(),
            RepeatabilityDb = Value(RepeatabilityKey),
            Directivity = Amplitude(DirectivityKey),
            Given = values.Keys.ToHashSet(StringComparer.Ordinal),
        };

        double? Value(string key) => values.TryGetValue(key, out var term) ? Math.Abs(term.Value) : null;

        // A level may be written with or without its sign: -40 dB and 40 dB below mean the same.
        double? Amplitude(string key) => Value(key) is { } level ? Math.Pow(10.0, -level / 20.0) : null;

        // A distance wrong by x at range R changes the level by 20 lg (1 + x/R).
        double? DistanceLimitDb() => !values.TryGetValue(DistanceKey, out var term) ? null
            : term.Unit is "dB" ? Math.Abs(term.Value)
            : run.RangeLengthM is { } range ? 20.0 * Math.Log10(1.0 + (Math.Abs(term.Value) / range))
            : null;
    }
}
