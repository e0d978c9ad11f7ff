namespace RangeReduce.Uncertainties;

/// <summary>What a trial of a cut at one frequency gives: one number a slot.</summary>
internal enum CutSlot
{
    PeakDirection,
    TotalWidth,
    RightWidth,
    LeftWidth,
    FrontLobe,
    BackLobe,
    FrontToBack,
    AxialRatioWidth,
    AxisRight,
    AxisLeft,
    AxisTheta,
    AxisPhi,
    AxisTotal,
    AxisCrossOverCo,
    AxisTilt,
    PeakRight,
    PeakLeft,
    PeakTheta,
    PeakPhi,
    PeakTotal,
    PeakCrossOverCo,
    PeakTilt,
    Count,
}
