namespace RangeReduce.Reporting.Pdf;

/// <summary>Breaks a sequence of pieces into pages: nothing is broken, heads stay with what they head, table heads are repeated.</summary>
internal static class PageFlow
{
    /// <summary>Places the pieces.</summary>
    /// <param name="pieces">The pieces in order.</param>
    /// <param name="page">The page.</param>
    /// <returns>The pages, each with its pieces from top to bottom; at least one.</returns>
    public static IReadOnlyList<IReadOnlyList<PlacedPiece>> Arrange(IReadOnlyList<FlowPiece> pieces, PageGeometry page)
    {
        var pages = new List<IReadOnlyList<PlacedPiece>>();
        var current = new List<PlacedPiece>();
        var y = PageGeometry.Top;
        for (var at = 0; at < pieces.Count; at++)
        {
            var piece = pieces[at];
            var fits = y + Kept(pieces, at) <= page.Bottom + 0.01f;
            if (current.Count > 0 && (piece.StartsPage || (!fits && !IsKept(pieces, at))))
            {
                pages.Add(current);
                (current, y) = ([], PageGeometry.Top);
            }

            if (current.Count == 0 && piece.Head is { } head)
            {
                current.Add(new(head, y));
                y += head.Height;
            }

            y += current.Count == 0 ? 0f : piece.SpaceBefore;
            current.Add(new(piece, y));
            y += piece.Height;
        }

        if (current.Count > 0 || pages.Count == 0)
        {
            pages.Add(current);
        }

        return pages;
    }

    // A piece that its predecessor is tied to has been made room for already.
    private static bool IsKept(IReadOnlyList<FlowPiece> pieces, int at) => at > 0 && pieces[at - 1].KeepWithNext;

    // Height of a piece and of all that must stand on the same page with it.
    private static float Kept(IReadOnlyList<FlowPiece> pieces, int at)
    {
        var height = 0f;
        do
        {
            height += pieces[at].SpaceBefore + pieces[at].Height;
        }
        while (pieces[at].KeepWithNext && ++at < pieces.Count);
        return height;
    }
}
