using RangeReduce.Quantities;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>Cells of one table that hold figures; collects why some of them hold no number.</summary>
internal sealed class FigureCell
{
    private readonly List<string> _reasons = [];
    private bool _hasGap;
    private bool _hasSimulated;

    /// <summary>Gives the notes below the table.</summary>
    public IReadOnlyList<RichText> Notes
    {
        get
        {
            var notes = _reasons.Select((reason, at) => RichText.Quiet($"{Mark(at)}{UnitText.NoBreakSpace} {reason}")).ToList();
            if (_hasSimulated)
            {
                notes.Add(RichText.Quiet("sim.: from the simulation, as nothing was measured."));
            }

            if (_hasGap)
            {
                notes.Add(RichText.Quiet($"{NumberText.Missing}: no such figure could be made from the data; where something is amiss, the remarks say what."));
            }

            return notes;
        }
    }

    /// <summary>Prints a figure without unit; null is a gap.</summary>
    public RichText Of(Figure? figure)
    {
        if (figure is null)
        {
            _hasGap = true;
            return NumberText.Missing;
        }

        _hasSimulated |= figure.Source == DataSource.Simulated;
        return Marked(FigureText.Number(figure) + (figure.Source == DataSource.Simulated ? " sim." : string.Empty), figure);
    }

    /// <summary>Prints a figure without unit in a row that states the source.</summary>
    public RichText OfKnownSource(Figure? figure)
    {
        _hasGap |= figure is null;
        return figure is null ? NumberText.Missing : Marked(FigureText.Number(figure), figure);
    }

    private RichText Marked(string text, Figure figure)
    {
        var reason = figure.Hand is null && !double.IsFinite(figure.Value) ? figure.Why : figure.Open switch
        {
            "low" => "Open below: the data end before the lower edge.",
            "high" => "Open above: the data end before the upper edge.",
            "both" => "Open at both ends: the data end before the edges.",
            _ => null,
        };
        if (reason is null)
        {
            return text;
        }

        if (!_reasons.Contains(reason, StringComparer.Ordinal))
        {
            _reasons.Add(reason);
        }

        return RichText.FromString(text).Then(RichText.Quiet($"{UnitText.NoBreakSpace}{Mark(_reasons.IndexOf(reason))}"));
    }

    private static string Mark(int at) => at < 26 ? $"{(char)('a' + at)})" : $"{NumberText.Fixed(at + 1, 0)})";
}
