namespace RangeReduce.Reduction;

/// <summary>Two frequency grids are the same when all their frequencies are.</summary>
internal sealed class FrequencyGridComparer : IEqualityComparer<double[]>
{
    /// <summary>The one instance.</summary>
    public static readonly FrequencyGridComparer Instance = new();

    /// <inheritdoc/>
    public bool Equals(double[]? x, double[]? y) => x.AsSpan().SequenceEqual(y);

    /// <inheritdoc/>
    public int GetHashCode(double[] obj) => HashCode.Combine(obj.Length, obj.Length == 0 ? 0.0 : obj[0]);
}
