namespace RangeReduce.Reporting.Pdf;

/// <summary>A piece and its place.</summary>
/// <param name="Piece">The piece.</param>
/// <param name="Top">Its top in points from the upper edge of the page.</param>
internal readonly record struct PlacedPiece(FlowPiece Piece, float Top)
{
    /// <summary>Gets the lower end.</summary>
    public float Bottom => Top + Piece.Height;
}
