using OxyPlot;

namespace RangeReduce.Reporting.Plots;

/// <summary>Gives each configuration state its colour and its marker, the same in all plots, tables and headings.</summary>
/// <param name="states">Names of the states in order.</param>
internal sealed class StateStyles(IReadOnlyList<string> states)
{
    private static readonly MarkerType[] Markers = [MarkerType.Circle, MarkerType.Square, MarkerType.Triangle, MarkerType.Diamond];

    /// <summary>Gives the place of a state in the order; 0 for an unknown one.</summary>
    public int IndexOf(string? state)
    {
        for (var at = 0; at < states.Count; at++)
        {
            if (string.Equals(states[at], state, StringComparison.Ordinal))
            {
                return at;
            }
        }

        return 0;
    }

    /// <summary>Gives the colour of a state.</summary>
    public OxyColor ColorOf(string? state) => ColorAt(IndexOf(state));

    /// <summary>Gives the marker of a state.</summary>
    public MarkerType MarkerOf(string? state) => MarkerAt(IndexOf(state));

    /// <summary>Gives the colour at a place in the order.</summary>
    public static OxyColor ColorAt(int at) => PlotPalette.States[at % PlotPalette.States.Count];

    /// <summary>Gives the marker at a place in the order; colours and markers have no common period below 28 states.</summary>
    public static MarkerType MarkerAt(int at) => Markers[at % Markers.Length];
}
