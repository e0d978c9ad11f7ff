namespace RangeReduce.Comparison;

/// <summary>How the points of a cut count.</summary>
public enum PatternWeight
{
    /// <summary>All alike, as fits one cut taken by itself.</summary>
    Equal,

    /// <summary>By the solid angle that they stand for, |sin theta|, as fits cuts through the pole of a sphere.</summary>
    SolidAngle,
}
