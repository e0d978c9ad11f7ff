namespace RangeReduce.Networks.Touchstone;

/// <summary>Which elements of a symmetric matrix a version 2 file gives.</summary>
internal enum MatrixFormat
{
    /// <summary>All.</summary>
    Full,

    /// <summary>Row i from the first column to the diagonal.</summary>
    Lower,

    /// <summary>Row i from the diagonal to the last column.</summary>
    Upper,
}
