using System.Numerics;

namespace RangeReduce.SampleData;

/// <summary>One line of NEC-2's table of radiation patterns.</summary>
/// <param name="ThetaDeg">Theta; negative on the far half of a cut, where the field is in the continuous frame of the cut.</param>
/// <param name="PhiDeg">Phi of the cut.</param>
/// <param name="GainThetaDb">Printed partial gain of the theta component in dBi ("vertical").</param>
/// <param name="GainPhiDb">Printed partial gain of the phi component in dBi ("horizontal").</param>
/// <param name="GainTotalDb">Printed gain in dBi.</param>
/// <param name="AxialRatio">Printed axial ratio, minor over major.</param>
/// <param name="TiltDeg">Printed tilt of the major axis.</param>
/// <param name="Sense">Printed sense: RIGHT, LEFT, LINEAR or nothing.</param>
/// <param name="ETheta">Theta component of the far field times distance, in volts, for 1 V at the feed.</param>
/// <param name="EPhi">Phi component.</param>
internal sealed record NecDirection(
    double ThetaDeg, double PhiDeg, double GainThetaDb, double GainPhiDb, double GainTotalDb, double AxialRatio, double TiltDeg, string Sense, Complex ETheta, Complex EPhi);
