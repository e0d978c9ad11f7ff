using System.Globalization;

namespace RangeReduce.Quantities;

/// <summary>The one table that holds everything the tool finds out: figures and traces, in the order in which they were added.</summary>
/// <remarks>Rows can be added and queried, never changed; adding gives a row its id. Not safe for writing from several threads.</remarks>
public sealed class FigureTable
{
    private readonly List<Figure> _figures = [];
    private readonly List<Trace> _traces = [];

    /// <summary>Gets the figures in the order in which they were added.</summary>
    public IReadOnlyList<Figure> Figures => _figures;

    /// <summary>Gets the traces in the order in which they were added.</summary>
    public IReadOnlyList<Trace> Traces => _traces;

    /// <summary>Adds a figure and gives it the next id.</summary>
    /// <returns>The figure as it stands in the table.</returns>
    public Figure Add(Figure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        var kept = figure with { Id = string.Create(CultureInfo.InvariantCulture, $"f{_figures.Count + 1}") };
        _figures.Add(kept);
        return kept;
    }

    /// <summary>Adds a trace and gives it the next id.</summary>
    /// <returns>The trace as it stands in the table.</returns>
    /// <exception cref="ArgumentException">The trace has not as many ordinates as abscissae.</exception>
    public Trace Add(Trace trace)
    {
        ArgumentNullException.ThrowIfNull(trace);
        if (trace.X.Length != trace.Y.Length)
        {
            throw new ArgumentException($"A trace of {trace.Quantity.Id} has {trace.X.Length} abscissae and {trace.Y.Length} ordinates.", nameof(trace));
        }

        var kept = trace with { Id = string.Create(CultureInfo.InvariantCulture, $"t{_traces.Count + 1}") };
        _traces.Add(kept);
        return kept;
    }

    /// <summary>Adds all figures and traces of another table, in its order, with new ids.</summary>
    public void AddAll(FigureTable other)
    {
        ArgumentNullException.ThrowIfNull(other);
        foreach (var figure in other.Figures)
        {
            Add(figure);
        }

        foreach (var trace in other.Traces)
        {
            Add(trace);
        }
    }

    /// <summary>Gives the figures of one quantity, in order.</summary>
    public IEnumerable<Figure> Of(Quantity quantity) => _figures.Where(figure => figure.Quantity == quantity);

    /// <summary>Gives the traces of one quantity, in order.</summary>
    public IEnumerable<Trace> TracesOf(Quantity quantity) => _traces.Where(trace => trace.Quantity == quantity);
}
