using System.Globalization;
using System.Text;
using RangeReduce.Comparison.Identification;

namespace RangeReduce.Tests.Comparison.Identification;

/// <summary>Counts answers against the truth.</summary>
internal sealed class ConfusionMatrix
{
    private readonly SortedDictionary<string, SortedDictionary<string, int>> _rows = new(StringComparer.Ordinal);

    internal void Add(string truth, SweepIdentification answer)
    {
        if (!_rows.TryGetValue(truth, out var row))
        {
            _rows[truth] = row = new SortedDictionary<string, int>(StringComparer.Ordinal);
        }

        var said = answer.State ?? answer.Answer.ToString();
        row[said] = row.GetValueOrDefault(said) + 1;
    }

    /// <summary>Gives the share of sweeps of one truth that got one answer.</summary>
    internal double Share(string truth, string said) => (double)_rows[truth].GetValueOrDefault(said) / _rows[truth].Values.Sum();

    /// <summary>Gives the share of sweeps of one truth that were put into a state which is not theirs.</summary>
    internal double Wrong(string truth) => 1.0 - Share(truth, truth) - Share(truth, "Unknown") - Share(truth, "Ambiguous") - Share(truth, "Refused");

    public override string ToString()
    {
        var text = new StringBuilder();
        foreach (var (truth, row) in _rows)
        {
            text.Append(CultureInfo.InvariantCulture, $"{truth}: {string.Join(", ", row.Select(cell => string.Create(CultureInfo.InvariantCulture, $"{cell.Key} {cell.Value}")))}\n");
        }

        return text.ToString();
    }
}
