namespace RangeReduce.Quantities;

/// <summary>What there is to know about one quantity: the source of headings, axis titles, glossary and CSV header.</summary>
/// <param name="Id">Stable id, as in the results file.</param>
/// <param name="Name">Name in words, without capital.</param>
/// <param name="Symbol">Letter symbol; empty where none is usual.</param>
/// <param name="Unit">Unit of <see cref="Figure.Value"/>: <c>dB</c>, <c>dBi</c>, <c>Hz</c>, <c>deg</c>, <c>ohm</c>, <c>%</c>, <c>1</c> or empty for a hand.</param>
/// <param name="Definition">Definition in one sentence.</param>
/// <param name="Source">Where the definition comes from.</param>
public sealed record Quantity(string Id, string Name, string Symbol, string Unit, string Definition, string Source)
{
    /// <summary>Gets the unit used for printing, such as MHz for a quantity kept in Hz.</summary>
    public string PrintUnit { get; init; } = Unit;

    /// <summary>Gets the factor from <see cref="Unit"/> to <see cref="PrintUnit"/>: printed = value * factor.</summary>
    public double PrintFactor { get; init; } = 1.0;

    /// <summary>Gets the digits after the decimal point where no uncertainty decides them.</summary>
    public int Decimals { get; init; } = 2;

    /// <summary>Gets whether more is better.</summary>
    public Preference Preference { get; init; }

    /// <summary>Two quantities are the same when their ids are.</summary>
    public bool Equals(Quantity? other) => other is not null && string.Equals(Id, other.Id, StringComparison.Ordinal);

    /// <inheritdoc/>
    public override int GetHashCode() => string.GetHashCode(Id, StringComparison.Ordinal);

    /// <inheritdoc/>
    public override string ToString() => Id;
}
