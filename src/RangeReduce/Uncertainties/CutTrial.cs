using System.Numerics;
using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Reduction;
using RangeReduce.Reduction.Cuts;

namespace RangeReduce.Uncertainties;

/// <summary>Disturbs one cut at one frequency and takes its figures again by the same kernels that took them from the data; the arrays are used over and over.</summary>
internal sealed class CutTrial
{
    private const double InverseRootTwo = 0.70710678118654752440;

    private readonly double[] _angleDeg;
    private readonly int _padded;
    private readonly StrayTable _stray;
    private readonly double[] _noise;
    private readonly double[] _firstRe;
    private readonly double[] _firstIm;
    private readonly double[] _secondRe;
    private readonly double[] _secondIm;
    private readonly bool _isLinear;
    private readonly bool _hasPhase;
    private readonly double _axisDeg;
    private readonly double _peakAmplitude;
    private readonly double _noiseReference;
    private readonly double _frontLobeDeg;
    private readonly double _backLobeDeg;
    private readonly bool _rightIsCo;

    // Disturbed components with phase, and levels in dB.
    private readonly double[] _rightRe;
    private readonly double[] _rightIm;
    private readonly double[] _leftRe;
    private readonly double[] _leftIm;
    private readonly double[] _total;
    private readonly double[] _right;
    private readonly double[] _left;
    private readonly double[] _quotient;

    /// <summary>Takes a cut with two components at one frequency.</summary>
    /// <param name="cut">The cut.</param>
    /// <param name="frequency">Index of the frequency.</param>
    /// <param name="axisDeg">Direction of the axis in degrees.</param>
    /// <param name="frontLobeDeg">Direction of the highest lobe within 90 degrees of the peak; NaN for none.</param>
    /// <param name="backLobeDeg">Direction of the highest lobe behind; NaN for none.</param>
    /// <param name="noiseReference">Amplitude that the noise floor is stated against: the peak of the strongest cut taken in the same way.</param>
    /// <param name="intended">Hand that the cross-polar ratio takes as co-polar; else the stronger one on the axis.</param>
    public CutTrial(ReducedCut cut, int frequency, double axisDeg, double frontLobeDeg, double backLobeDeg, double noiseReference, Hand? intended)
    {
        var (first, second) = (cut.Cut.First!, cut.Cut.Second!);
        _angleDeg = cut.Cut.AngleDeg;
        var n = _angleDeg.Length;
        var start = frequency * n;

        // Planes are padded to whole vectors; what lies in the padding is never looked at.
        _padded = (n + Vector<double>.Count - 1) / Vector<double>.Count * Vector<double>.Count;
        _firstRe = Padded(first.Re);
        _firstIm = Padded(first.Im);
        _secondRe = Padded(second.Re);
        _secondIm = Padded(second.Im);
        _stray = new(_padded);
        _noise = new double[4 * _padded];
        _isLinear = cut.Cut.Basis == PolarizationBasis.ThetaPhi;
        _hasPhase = cut.Cut.IsComplex;
        (_axisDeg, _frontLobeDeg, _backLobeDeg, _noiseReference) = (axisDeg, frontLobeDeg, backLobeDeg, noiseReference);
        (_rightRe, _rightIm, _leftRe, _leftIm) = (new double[_padded], new double[_padded], new double[_padded], new double[_padded]);
        (_total, _right, _left, _quotient) = (new double[_padded], new double[_padded], new double[_padded], new double[n]);
        for (var i = 0; i < n; i++)
        {
            var power = first.Power(start + i) + second.Power(start + i);
            _peakAmplitude = power > _peakAmplitude * _peakAmplitude ? Math.Sqrt(power) : _peakAmplitude;
        }

        Values = new double[(int)CutSlot.Count];
        _rightIsCo = intended is Hand.Right;
        if (intended is null or Hand.Linear && HasEllipse)
        {
            var random = new TrialRandom(0);
            Run(default, ref random);
            _rightIsCo = Values[(int)CutSlot.AxisRight] >= Values[(int)CutSlot.AxisLeft];
        }

        double[] Padded(double[]? plane)
        {
            var padded = new double[_padded];
            plane?.AsSpan(start, n).CopyTo(padded);
            return padded;
        }
    }

    /// <summary>Gets the figures of the last trial, by <see cref="CutSlot"/>; NaN where a figure could not be made.</summary>
    public double[] Values { get; }

    private bool HasEllipse => _hasPhase || !_isLinear;

    /// <summary>Does one trial.</summary>
    public void Run(in CutErrors errors, ref TrialRandom random)
    {
        Array.Fill(Values, double.NaN);
        Disturb(errors, ref random);
        TakeBeam(errors.AngleDeg);
        TakeDirection(_axisDeg + errors.AngleDeg, CutSlot.AxisRight);
        if (HasEllipse)
        {
            TakeAxialRatioWidth(errors.AngleDeg);
        }
    }

    private static double LevelOf(double re, double im) => 10.0 * Math.Log10((re * re) + (im * im));

    private void Disturb(in CutErrors errors, ref TrialRandom random)
    {
        var n = _angleDeg.Length;
        if (errors.Noise > 0.0)
        {
            var noise = errors.Noise * _noiseReference * InverseRootTwo;
            for (var i = 0; i < _noise.Length; i++)
            {
                _noise[i] = noise * random.TableNormal();
            }
        }
        else
        {
            Array.Clear(_noise);
        }

        var common = Decibels.ToAmplitude(errors.LevelDb);
        var firstGain = common * Decibels.ToAmplitude(0.5 * errors.BalanceDb);
        var secondGain = common * Decibels.ToAmplitude(-0.5 * errors.BalanceDb);
        var (balanceSin, balanceCos) = Math.SinCos(double.DegreesToRadians(errors.BalancePhaseDeg));
        var (turnRe, turnIm) = (firstGain * balanceCos, firstGain * balanceSin);
        var (strayCos, straySin) = _stray.Of(errors.StrayTurns);

        // A drift of a tenth of a decibel over a cut is a straight line to a part in ten thousand.
        var driftStep = (Decibels.ToAmplitude(errors.DriftDb) - 1.0) / n;
        var width = Vector<double>.Count;
        for (var i = 0; i < _padded; i += width)
        {
            var (fr, fi) = (new Vector<double>(_firstRe, i), new Vector<double>(_firstIm, i));
            var (sr, si) = (new Vector<double>(_secondRe, i), new Vector<double>(_secondIm, i));
            var (rayRe, rayIm) = (new Vector<double>(strayCos, i) * _peakAmplitude, new Vector<double>(straySin, i) * _peakAmplitude);
            var ar = fr + (sr * errors.FirstLeak.Re) - (si * errors.FirstLeak.Im) + (rayRe * errors.FirstStray.Re) - (rayIm * errors.FirstStray.Im);
            var ai = fi + (si * errors.FirstLeak.Re) + (sr * errors.FirstLeak.Im) + (rayIm * errors.FirstStray.Re) + (rayRe * errors.FirstStray.Im);
            var br = sr + (fr * errors.SecondLeak.Re) - (fi * errors.SecondLeak.Im) + (rayRe * errors.SecondStray.Re) - (rayIm * errors.SecondStray.Im);
            var bi = si + (fi * errors.SecondLeak.Re) + (fr * errors.SecondLeak.Im) + (rayIm * errors.SecondStray.Re) + (rayRe * errors.SecondStray.Im);
            var drift = Vector<double>.One + ((new Vector<double>(i) + Vector<double>.Indices) * driftStep);
            (ar, ai) = (((ar * turnRe) - (ai * turnIm)) * drift, ((ar * turnIm) + (ai * turnRe)) * drift);
            (br, bi) = (br * drift * secondGain, bi * drift * secondGain);
            ar += new Vector<double>(_noise, i);
            ai += new Vector<double>(_noise, _padded + i);
            br += new Vector<double>(_noise, (2 * _padded) + i);
            bi += new Vector<double>(_noise, (3 * _padded) + i);
            ((ar * ar) + (ai * ai) + (br * br) + (bi * bi)).CopyTo(_total, i);

            // R = (θ + jφ)/√2, L = (θ − jφ)/√2 where the ports are linear; else the ports are the hands.
            var (rr, ri, lr, li) = _isLinear
                ? ((ar - bi) * InverseRootTwo, (ai + br) * InverseRootTwo, (ar + bi) * InverseRootTwo, (ai - br) * InverseRootTwo)
                : (ar, ai, br, bi);
            rr.CopyTo(_rightRe, i);
            ri.CopyTo(_rightIm, i);
            lr.CopyTo(_leftRe, i);
            li.CopyTo(_leftIm, i);
            ((rr * rr) + (ri * ri)).CopyTo(_right, i);
            ((lr * lr) + (li * li)).CopyTo(_left, i);
        }

        Decibels.OfPowers(_total, _total);
        Decibels.OfPowers(_right, _right);
        Decibels.OfPowers(_left, _left);
    }

    private void TakeBeam(double angleErrorDeg)
    {
        if (_angleDeg.Length < BeamFigures.LeastAngles || !Beam.TryFind(_angleDeg, _total.AsSpan(0, _angleDeg.Length), out var beam))
        {
            return;
        }

        // The positioner's error moves every direction alike.
        Set(CutSlot.PeakDirection, beam.PeakDeg - angleErrorDeg);
        Set(CutSlot.TotalWidth, beam.WidthDeg);
        Set(CutSlot.FrontToBack, beam.PeakDb - beam.BackDb);
        Set(CutSlot.FrontLobe, Near(_frontLobeDeg) - beam.PeakDb);
        Set(CutSlot.BackLobe, Near(_backLobeDeg) - beam.PeakDb);
        if (HasEllipse)
        {
            Set(CutSlot.RightWidth, Beam.TryFind(_angleDeg, _right.AsSpan(0, _angleDeg.Length), out var right) ? right.WidthDeg : double.NaN);
            Set(CutSlot.LeftWidth, Beam.TryFind(_angleDeg, _left.AsSpan(0, _angleDeg.Length), out var left) ? left.WidthDeg : double.NaN);
        }

        TakeDirection(Math.Clamp(TurnedSpan.InTurn(_angleDeg, beam.PeakDeg), _angleDeg[0], _angleDeg[^1]), CutSlot.PeakRight);
    }

    /// <summary>Gives the highest level around a lobe: where noise moved its maximum by a few samples it is still the same lobe.</summary>
    private double Near(double lobeDeg)
    {
        if (double.IsNaN(lobeDeg))
        {
            return double.NaN;
        }

        const int Around = 3;
        var found = Array.BinarySearch(_angleDeg, lobeDeg);
        var middle = found >= 0 ? found : ~found;
        var highest = double.NegativeInfinity;
        for (var i = Math.Max(0, middle - Around); i <= Math.Min(_angleDeg.Length - 1, middle + Around); i++)
        {
            highest = Math.Max(highest, _total[i]);
        }

        return highest;
    }

    private void TakeDirection(double directionDeg, CutSlot firstSlot)
    {
        if (directionDeg < _angleDeg[0] || directionDeg > _angleDeg[^1])
        {
            return;
        }

        var found = Array.BinarySearch(_angleDeg, directionDeg);
        var segment = Math.Clamp(found >= 0 ? found : ~found - 1, 0, Math.Max(0, _angleDeg.Length - 2));
        var (rr, ri) = (At(_rightRe, segment, directionDeg), At(_rightIm, segment, directionDeg));
        var (lr, li) = (At(_leftRe, segment, directionDeg), At(_leftIm, segment, directionDeg));
        Set(firstSlot + (CutSlot.AxisTotal - CutSlot.AxisRight), 10.0 * Math.Log10((rr * rr) + (ri * ri) + (lr * lr) + (li * li)));
        if (_isLinear || _hasPhase)
        {
            // θ = (R + L)/√2, φ = −j (R − L)/√2
            Set(firstSlot + (CutSlot.AxisTheta - CutSlot.AxisRight), LevelOf((rr + lr) * InverseRootTwo, (ri + li) * InverseRootTwo));
            Set(firstSlot + (CutSlot.AxisPhi - CutSlot.AxisRight), LevelOf((ri - li) * InverseRootTwo, (lr - rr) * InverseRootTwo));
        }

        if (!HasEllipse)
        {
            return;
        }

        var (right, left) = ((rr * rr) + (ri * ri), (lr * lr) + (li * li));
        Set(firstSlot, 10.0 * Math.Log10(right));
        Set(firstSlot + (CutSlot.AxisLeft - CutSlot.AxisRight), 10.0 * Math.Log10(left));
        Set(firstSlot + (CutSlot.AxisCrossOverCo - CutSlot.AxisRight), Math.Sqrt(_rightIsCo ? left / right : right / left));
        Set(firstSlot + (CutSlot.AxisTilt - CutSlot.AxisRight), PolarizationEllipse.TiltDeg(rr, ri, lr, li));
    }

    private void TakeAxialRatioWidth(double angleErrorDeg)
    {
        var (co, cross) = _rightIsCo ? (_right, _left) : (_left, _right);
        for (var i = 0; i < _quotient.Length; i++)
        {
            // In decibels: the bound is turned into decibels instead of each quotient into an amplitude.
            _quotient[i] = cross[i] - co[i];
        }

        var (low, high, _) = AxialRatioBeamwidthFigure.Edges(_angleDeg, _quotient, _axisDeg + angleErrorDeg, Decibels.OfAmplitude(AxialRatioBeamwidthFigure.CrossOverCo(AxialRatioBeamwidthFigure.ThresholdDb)));
        Set(CutSlot.AxialRatioWidth, high - low);
    }

    private double At(double[] plane, int segment, double directionDeg) => plane.Length == 1 || _angleDeg[segment] == directionDeg
        ? plane[segment]
        : LocalCubic.Interpolate(_angleDeg, plane.AsSpan(0, _angleDeg.Length), segment, directionDeg);

    private void Set(CutSlot slot, double value) => Values[(int)slot] = value;
}
