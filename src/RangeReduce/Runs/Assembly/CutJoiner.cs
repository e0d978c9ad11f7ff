using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns;

namespace RangeReduce.Runs.Assembly;

/// <summary>Joins pieces that are one cut: files of one frequency each, then files of one channel each. What is left over is a repeat.</summary>
internal static class CutJoiner
{
    /// <summary>Joins all pieces.</summary>
    /// <param name="pieces">Pieces in the order of their files.</param>
    /// <param name="remarks">Takes what was remarked.</param>
    /// <returns>The cuts to use, and those that repeat one of them.</returns>
    public static (List<CutPiece> Used, List<CutPiece> Repeats) Join(IEnumerable<CutPiece> pieces, List<Remark> remarks)
    {
        var (used, repeats) = (new List<CutPiece>(), new List<CutPiece>());
        foreach (var group in pieces.GroupBy(piece => piece.Key))
        {
            var first = used.Count;
            foreach (var cut in ByChannel(ByFrequency(group)))
            {
                // Readings of the gain standard differ in how it was turned, which no key says: none repeats another.
                var same = cut.State is null ? null : used.Skip(first).FirstOrDefault(known => known.SharesComponent(cut) && known.SharesFrequency(cut));
                if (same is null)
                {
                    used.Add(cut);
                    continue;
                }

                repeats.Add(cut);
                remarks.Add(new(RemarkSeverity.Doubt, "repeated-cut", $"The cut {NameOf(cut)} was already given by {same.Path}; it is kept as a repeat and the figures are made of the first.", new(cut.Path), cut.State));
            }

            RemarkOnHalves(used.Skip(first), remarks);
        }

        return (used, repeats);
    }

    /// <summary>Names a cut in words: its fixed angle.</summary>
    public static string NameOf(CutPiece piece)
    {
        var angle = piece.Cut.Axis == CutAxis.Theta ? "phi" : "theta";
        return double.IsNaN(piece.Cut.FixedDeg) ? $"of unknown {angle}" : string.Create(CultureInfo.InvariantCulture, $"at {angle} {piece.Cut.FixedDeg:0.###} deg");
    }

    private static List<CutPiece> ByFrequency(IEnumerable<CutPiece> pieces)
    {
        var stacks = new List<List<CutPiece>>();
        foreach (var piece in pieces)
        {
            var stack = stacks.Find(known => known[0].HasSameComponents(piece) && known[0].HasSameAngles(piece) && !known.Exists(piece.SharesFrequency));
            if (stack is null)
            {
                stacks.Add([piece]);
            }
            else
            {
                stack.Add(piece);
            }
        }

        return stacks.ConvertAll(Stacked);
    }

    private static List<CutPiece> ByChannel(List<CutPiece> pieces)
    {
        var joined = new List<CutPiece>();
        foreach (var piece in pieces)
        {
            var at = joined.FindIndex(known => !known.SharesComponent(piece) && known.HasSameFrequencies(piece) && known.HasSameAngles(piece));
            if (at < 0)
            {
                joined.Add(piece);
                continue;
            }

            var known = joined[at];
            var cut = known.Cut with { First = known.Cut.First ?? piece.Cut.First, Second = known.Cut.Second ?? piece.Cut.Second };
            joined[at] = known with { InputIds = [.. known.InputIds.Union(piece.InputIds, StringComparer.Ordinal)], Cut = cut };
        }

        return joined;
    }

    private static CutPiece Stacked(List<CutPiece> stack)
    {
        if (stack.Count == 1)
        {
            return stack[0];
        }

        var rows = stack.SelectMany(piece => piece.Cut.FrequencyHz.Select((hertz, row) => (Hertz: hertz, Row: row, Piece: piece))).OrderBy(row => row.Hertz).ToArray();
        var cut = stack[0].Cut with
        {
            FrequencyHz = [.. rows.Select(row => row.Hertz)],
            First = Gathered(piece => piece.Cut.First),
            Second = Gathered(piece => piece.Cut.Second),
        };
        return stack[0] with { InputIds = [.. stack.SelectMany(piece => piece.InputIds).Distinct(StringComparer.Ordinal)], Cut = cut };

        PatternChannel? Gathered(Func<CutPiece, PatternChannel?> channel)
        {
            var angles = stack[0].Cut.AngleDeg.Length;
            return channel(stack[0]) is not { } sample ? null : new(Rows(each => each.Re), sample.HasPhase ? Rows(each => each.Im!) : null);

            double[] Rows(Func<PatternChannel, double[]> values) => [.. rows.SelectMany(row => values(channel(row.Piece)!).Skip(row.Row * angles).Take(angles))];
        }
    }

    private static void RemarkOnHalves(IEnumerable<CutPiece> cuts, List<Remark> remarks)
    {
        var halves = cuts.Where(cut => cut.Cut.First is null || cut.Cut.Second is null).ToArray();
        foreach (var half in halves)
        {
            var (there, missing) = (half.Cut.Basis, half.Cut.First is null) switch
            {
                (PolarizationBasis.ThetaPhi, true) => ("phi", "theta"),
                (PolarizationBasis.ThetaPhi, false) => ("theta", "phi"),
                (_, true) => ("left", "right"),
                _ => ("right", "left"),
            };
            var other = Array.Find(halves, each => !each.SharesComponent(half));
            var why = other is null ? string.Empty : $" That of {other.Path} has other frequencies or angles and could not be joined to it.";
            remarks.Add(new(RemarkSeverity.Doubt, "missing-channel", $"The cut {NameOf(half)} holds only the {there} component; without {missing} there is no axial ratio, hand, tilt or total.{why}", new(half.Path), half.State));
        }
    }
}
