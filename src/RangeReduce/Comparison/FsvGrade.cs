namespace RangeReduce.Comparison;

/// <summary>The six grades of Feature Selective Validation (IEEE Std 1597.1), best first. They describe; they are no levels of acceptance.</summary>
public enum FsvGrade
{
    /// <summary>At most 0.1.</summary>
    Excellent = 1,

    /// <summary>Above 0.1, at most 0.2.</summary>
    VeryGood,

    /// <summary>Above 0.2, at most 0.4.</summary>
    Good,

    /// <summary>Above 0.4, at most 0.8.</summary>
    Fair,

    /// <summary>Above 0.8, at most 1.6.</summary>
    Poor,

    /// <summary>Above 1.6.</summary>
    VeryPoor,
}
