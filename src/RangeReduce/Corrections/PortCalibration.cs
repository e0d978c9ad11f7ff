using System.Globalization;
using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Runs;

namespace RangeReduce.Corrections;

/// <summary>What has to be added to the levels of the two ports of a probe to make them partial gain.</summary>
internal sealed class PortCalibration
{
    // Two ports of one probe differ by a few dB; a linear standard across a port shows 20 dB less and more (common practice).
    private const double LeakageShare = 0.1;

    private readonly GainStandard _standard;
    private readonly PolarizationBasis _basis;
    private readonly (double[] FrequencyHz, double[] LevelDb)? _first;
    private readonly (double[] FrequencyHz, double[] LevelDb)? _second;

    private PortCalibration(GainStandard standard, PolarizationBasis basis, StateCut[] readings)
    {
        (_standard, _basis) = (standard, basis);
        _first = PortLevel(readings, cut => cut.First, cut => cut.Second);
        _second = PortLevel(readings, cut => cut.Second, cut => cut.First);
        HasOnePosition = basis == PolarizationBasis.RightLeft && readings.Length == 1;
        Inputs = [.. readings.SelectMany(reading => reading.InputIds).Distinct(StringComparer.Ordinal)];
        Words = basis == PolarizationBasis.ThetaPhi
            ? string.Create(CultureInfo.InvariantCulture, $"linear ports: each by the strongest of the {readings.Length} readings with the standard along it, no 3 dB")
            : string.Create(CultureInfo.InvariantCulture, $"circular ports: power mean of {readings.Length} positions of the standard, less 3.01 dB for a linear standard on a circular port");
    }

    /// <summary>Gets the ids of the input files with the readings.</summary>
    public IReadOnlyList<string> Inputs { get; }

    /// <summary>Gets how the ports were calibrated, in words.</summary>
    public string Words { get; }

    /// <summary>Gets whether circular ports were read with the standard in one position only, so that their own axial ratio stays in the gain.</summary>
    public bool HasOnePosition { get; }

    /// <summary>Gathers the readings through a probe of the basis; null where there are none.</summary>
    public static PortCalibration? Of(GainStandard standard, PolarizationBasis basis)
    {
        var readings = standard.Readings.Where(reading => reading.Cut.Basis == basis).ToArray();
        return readings.Length == 0 ? null : new(standard, basis, readings);
    }

    /// <summary>Tells whether a port that the cut uses was not read with the standard.</summary>
    public bool LacksPortOf(PatternCut cut) => (cut.First is not null && _first is null) || (cut.Second is not null && _second is null);

    /// <summary>Calibrates a cut.</summary>
    /// <param name="cut">A cut with receiver levels.</param>
    /// <param name="lost">Number of frequencies at which there is no gain; their samples become missing.</param>
    public PatternCut Apply(PatternCut cut, out int lost)
    {
        var count = cut.FrequencyHz.Length;
        var (first, second) = (new double[count], new double[count]);
        lost = 0;
        for (var i = 0; i < count; i++)
        {
            var gainDbi = LinearTable.InterpolateOverLogarithm(_standard.FrequencyHz, _standard.GainDbi, cut.FrequencyHz[i]);
            var partial = _basis == PolarizationBasis.RightLeft ? gainDbi - Decibels.HalfPower : gainDbi;
            first[i] = cut.First is null ? 1.0 : Decibels.ToAmplitude(partial - LevelAt(_first!.Value, cut.FrequencyHz[i]));
            second[i] = cut.Second is null ? 1.0 : Decibels.ToAmplitude(partial - LevelAt(_second!.Value, cut.FrequencyHz[i]));
            lost += double.IsNaN(first[i] + second[i]) ? 1 : 0;
        }

        return cut with
        {
            First = cut.First?.Scaled(first),
            Second = cut.Second?.Scaled(second),
            Reference = LevelReference.Isotropic,
            IsRealized = true,
        };
    }

    private static double LevelAt((double[] FrequencyHz, double[] LevelDb) port, double frequencyHz) =>
        LinearTable.InterpolateOverLogarithm(port.FrequencyHz, port.LevelDb, frequencyHz);

    /// <summary>Gives the level of the standard on one port over the frequencies of the readings.</summary>
    /// <remarks>A linear port is read only by a standard that stands along it. What the standard shows far below that on the other port is leakage.</remarks>
    private (double[] FrequencyHz, double[] LevelDb)? PortLevel(StateCut[] readings, Func<PatternCut, PatternChannel?> port, Func<PatternCut, PatternChannel?> otherPort)
    {
        var taken = readings
            .Where(reading => port(reading.Cut) is { } own && (_basis == PolarizationBasis.RightLeft || otherPort(reading.Cut) is not { } other || LargestPower(own) > LeakageShare * LargestPower(other)))
            .ToArray();
        if (taken.Length == 0)
        {
            return null;
        }

        // A frequency counts only where every position was read: a mean over one position would be off by the axial ratio of the port.
        var frequencies = taken.Select(reading => reading.Cut.FrequencyHz).Aggregate((common, next) => [.. common.Intersect(next).Order()]);
        var levels = new double[frequencies.Length];
        for (var i = 0; i < frequencies.Length; i++)
        {
            var powers = Array.ConvertAll(taken, reading => PeakPower(reading.Cut, port(reading.Cut)!, Array.BinarySearch(reading.Cut.FrequencyHz, frequencies[i])));
            levels[i] = powers.Any(double.IsNaN) ? double.NaN : Decibels.OfPower(_basis == PolarizationBasis.ThetaPhi ? powers.Max() : powers.Average());
        }

        return (frequencies, levels);
    }

    private static double LargestPower(PatternChannel channel)
    {
        var largest = 0.0;
        for (var i = 0; i < channel.Re.Length; i++)
        {
            var power = channel.Power(i);
            largest = power > largest ? power : largest;
        }

        return largest;
    }

    /// <summary>Gives the highest power of a reading; NaN where there is none, or where it lies beside a missing sample and may not be the highest.</summary>
    private static double PeakPower(PatternCut cut, PatternChannel channel, int frequency)
    {
        var (peak, at, count) = (0.0, -1, cut.AngleDeg.Length);
        for (var angle = 0; angle < count; angle++)
        {
            var power = channel.Power((frequency * count) + angle);
            (peak, at) = power > peak ? (power, angle) : (peak, at);
        }

        return at < 0 || IsMissing(at - 1) || IsMissing(at + 1) ? double.NaN : peak;

        bool IsMissing(int angle) => angle >= 0 && angle < count && double.IsNaN(channel.Power((frequency * count) + angle));
    }
}
