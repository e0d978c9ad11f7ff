using RangeReduce.Patterns;

namespace RangeReduce.Runs.Description;

/// <summary>One cut of a file.</summary>
/// <param name="Axis">The angle that moves.</param>
/// <param name="FixedDeg">The fixed angle in degrees; null where the file does not say.</param>
/// <param name="AngleCount">Number of angles.</param>
/// <param name="LowDeg">Lowest angle in degrees.</param>
/// <param name="HighDeg">Highest angle in degrees.</param>
/// <param name="FrequencyCount">Number of frequencies.</param>
/// <param name="LowHz">Lowest frequency in hertz; null where the file does not say.</param>
/// <param name="HighHz">Highest frequency in hertz; null where the file does not say.</param>
/// <param name="Reference">What 0 dB means.</param>
/// <param name="Channels">The channels.</param>
/// <param name="FirstLine">First line of the samples.</param>
/// <param name="LastLine">Last line of the samples.</param>
public sealed record CutDescription(
    CutAxis Axis, double? FixedDeg, int AngleCount, double LowDeg, double HighDeg, int FrequencyCount, double? LowHz, double? HighHz,
    LevelReference Reference, IReadOnlyList<ChannelDescription> Channels, int FirstLine, int LastLine);
