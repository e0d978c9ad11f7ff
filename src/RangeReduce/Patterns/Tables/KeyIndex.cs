namespace RangeReduce.Patterns.Tables;

/// <summary>The distinct values of one key in the order of their first appearance.</summary>
internal sealed class KeyIndex
{
    private readonly Dictionary<double, int> _known = [];
    private int _last;

    /// <summary>Gets the distinct values.</summary>
    public List<double> Values { get; } = [];

    /// <summary>Finds or adds a value; a table mostly stays, steps on or starts again, so these are tried first.</summary>
    public int Find(double value)
    {
        if (_last < Values.Count && Values[_last] == value)
        {
            return _last;
        }

        if (_last + 1 < Values.Count && Values[_last + 1] == value)
        {
            return ++_last;
        }

        if (!_known.TryGetValue(value, out _last))
        {
            _last = Values.Count;
            Values.Add(value);
            _known.Add(value, _last);
        }

        return _last;
    }
}
