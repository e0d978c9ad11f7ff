namespace RangeReduce.Reporting.Model;

/// <summary>How the cells of a column stand under each other.</summary>
public enum ColumnAlignment
{
    /// <summary>Flush left.</summary>
    Left,

    /// <summary>On the decimal point; words start at its last digit.</summary>
    DecimalPoint,
}
