using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;

namespace RangeReduce.Reduction;

/// <summary>A cut at one frequency: levels and ellipse along the angle, and values between samples.</summary>
public sealed class CutSlice
{
    private readonly ReducedCut _cut;
    private readonly int _start;
    private readonly Dictionary<FieldComponent, double[]> _levels = [];
    private readonly Dictionary<FieldComponent, double[]> _amplitudes = [];

    /// <summary>Takes a cut at one frequency.</summary>
    /// <param name="cut">The cut.</param>
    /// <param name="frequency">Index of the frequency.</param>
    public CutSlice(ReducedCut cut, int frequency)
    {
        ArgumentNullException.ThrowIfNull(cut);
        (_cut, FrequencyHz) = (cut, cut.Cut.FrequencyHz[frequency]);
        _start = frequency * cut.Cut.AngleDeg.Length;
    }

    /// <summary>Gets the frequency in hertz.</summary>
    public double FrequencyHz { get; }

    /// <summary>Gets the angles in degrees, strictly rising.</summary>
    public double[] AngleDeg => _cut.Cut.AngleDeg;

    /// <summary>Gives the level along the angle in dB; NaN where a sample is missing.</summary>
    /// <exception cref="ArgumentException">The component cannot be known from the data.</exception>
    public double[] LevelDb(FieldComponent component)
    {
        if (_levels.TryGetValue(component, out var known))
        {
            return known;
        }

        var level = new double[AngleDeg.Length];
        if (component == FieldComponent.Total)
        {
            var (first, second) = (_cut.Cut.First, _cut.Cut.Second);
            if (first is null || second is null)
            {
                throw new ArgumentException("The total needs two orthogonal components.", nameof(component));
            }

            for (var i = 0; i < level.Length; i++)
            {
                level[i] = Decibels.OfPower(first.Power(_start + i) + second.Power(_start + i));
            }
        }
        else
        {
            var channel = _cut.Channel(component) ?? throw new ArgumentException($"The {component} component cannot be known from the data.", nameof(component));
            for (var i = 0; i < level.Length; i++)
            {
                level[i] = Decibels.OfPower(channel.Power(_start + i));
            }
        }

        return _levels[component] = level;
    }

    /// <summary>Gives the axial ratio along the angle in dB; +∞ for a linear wave, NaN where a sample is missing.</summary>
    public double[] AxialRatioDb()
    {
        var (right, left) = (_cut.Right!, _cut.Left!);
        var ratio = new double[AngleDeg.Length];
        for (var i = 0; i < ratio.Length; i++)
        {
            ratio[i] = PolarizationEllipse.AxialRatioDb(Math.Sqrt(right.Power(_start + i)), Math.Sqrt(left.Power(_start + i)));
        }

        return ratio;
    }

    /// <summary>Gives the tilt along the angle in degrees; NaN where it has no meaning or a sample is missing.</summary>
    public double[] TiltDeg()
    {
        var (right, left) = (_cut.Right!, _cut.Left!);
        var ratio = AxialRatioDb();
        var tilt = new double[AngleDeg.Length];
        for (var i = 0; i < tilt.Length; i++)
        {
            tilt[i] = ratio[i] >= PolarizationEllipse.TiltFromDb
                ? PolarizationEllipse.TiltDeg(right.Re[_start + i], right.Im![_start + i], left.Re[_start + i], left.Im![_start + i])
                : double.NaN;
        }

        return tilt;
    }

    /// <summary>Gives the amplitude of a component in a direction, interpolated between samples.</summary>
    /// <param name="component">The component, or the total.</param>
    /// <param name="angleDeg">Direction in degrees.</param>
    /// <returns>The amplitude (square root of the power); NaN outside the cut and next to a missing sample.</returns>
    public double AmplitudeAt(FieldComponent component, double angleDeg)
    {
        if (!_amplitudes.TryGetValue(component, out var amplitude))
        {
            amplitude = Array.ConvertAll(LevelDb(component), Decibels.ToAmplitude);
            _amplitudes.Add(component, amplitude);
        }

        return Math.Max(0.0, ValueAt(amplitude, angleDeg));
    }

    /// <summary>Gives the tilt in a direction, from the components with phase, interpolated between samples.</summary>
    /// <returns>Degrees above −90 and up to 90; NaN outside the cut and next to a missing sample.</returns>
    public double TiltDegAt(double angleDeg)
    {
        var (right, left) = (_cut.Right!, _cut.Left!);
        return PolarizationEllipse.TiltDeg(At(right.Re), At(right.Im!), At(left.Re), At(left.Im!));

        double At(double[] plane) => ValueAt(plane.AsSpan(_start, AngleDeg.Length), angleDeg);
    }

    /// <summary>Gives a value in a direction, over the seam of a closed turn too; NaN outside the cut and next to a missing sample.</summary>
    private double ValueAt(ReadOnlySpan<double> y, double directionDeg)
    {
        var curve = new TurnedSpan(AngleDeg, y);
        var at = TurnedSpan.InTurn(AngleDeg, directionDeg);
        var found = Array.BinarySearch(AngleDeg, at);
        var next = found >= 0 ? found : ~found;
        foreach (var sample in (ReadOnlySpan<int>)[next, next - 1])
        {
            if (Math.Abs(curve.AngleDeg(sample) - at) < SameAngleDeg)
            {
                return curve.Y(sample);
            }
        }

        return curve.Between(next - 1, at);
    }

    // Angles are written with a few decimals; nobody moves a positioner by a millionth of a degree.
    private const double SameAngleDeg = 1e-6;
}
