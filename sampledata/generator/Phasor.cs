using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>Complex factors out of decibels and degrees.</summary>
internal static class Phasor
{
    /// <summary>Gives a factor of a level and a phase.</summary>
    public static Complex Of(double levelDb, double phaseDeg) => Complex.FromPolarCoordinates(Math.Pow(10.0, levelDb / 20.0), phaseDeg * Math.PI / 180.0);

    /// <summary>Gives the factor of a path.</summary>
    /// <param name="frequencyHz">Frequency.</param>
    /// <param name="lengthM">Electrical length of the path.</param>
    public static Complex Delay(double frequencyHz, double lengthM) => Complex.FromPolarCoordinates(1.0, -2.0 * Math.PI * frequencyHz * lengthM / 299792458.0);

    /// <summary>Gives 20 lg of the magnitude.</summary>
    public static double LevelDb(Complex value) => 20.0 * Math.Log10(Complex.Abs(value));

    /// <summary>Gives the phase, above -180 and up to 180 degrees.</summary>
    public static double PhaseDeg(Complex value) => value.Phase * 180.0 / Math.PI;
}
