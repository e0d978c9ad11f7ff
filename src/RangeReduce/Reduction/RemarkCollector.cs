using RangeReduce.Diagnostics;

namespace RangeReduce.Reduction;

/// <summary>Collects remarks; the same remark is kept once.</summary>
public sealed class RemarkCollector
{
    private readonly List<Remark> _remarks = [];
    private readonly HashSet<Remark> _known = [];

    /// <summary>Gets the remarks in the order in which they came.</summary>
    public IReadOnlyList<Remark> Remarks => _remarks;

    /// <summary>Adds a remark unless the very same one is there.</summary>
    public void Add(Remark remark)
    {
        if (_known.Add(remark))
        {
            _remarks.Add(remark);
        }
    }

    /// <summary>Adds a remark about a state unless the very same one is there.</summary>
    public void Add(RemarkSeverity severity, string code, string text, string? state, SourcePlace? place = null) => Add(new(severity, code, text, place, state));
}
