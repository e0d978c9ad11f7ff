namespace RangeReduce.Runs.Manifest;

/// <summary>A number with its unit, brought to the base unit of its kind.</summary>
/// <param name="Value">Number in the base unit.</param>
/// <param name="Dimension">What kind of quantity it is.</param>
public readonly record struct UnitValue(double Value, UnitDimension Dimension)
{
    /// <summary>Gets the symbol of the base unit: <c>Hz</c>, <c>m</c>, <c>deg</c>, <c>s</c>, <c>ohm</c>, <c>K</c>, <c>dB</c>, <c>dBi</c>, <c>dBm</c>, <c>%</c>, or empty for a number.</summary>
    public string Unit => UnitText.BaseUnitOf(Dimension);
}
