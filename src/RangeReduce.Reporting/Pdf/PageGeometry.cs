namespace RangeReduce.Reporting.Pdf;

/// <summary>Measures of a page in points (1/72 in).</summary>
/// <param name="Width">Width of the paper.</param>
/// <param name="Height">Height of the paper.</param>
internal sealed record PageGeometry(float Width, float Height)
{
    /// <summary>Margin left and right.</summary>
    public const float Side = 50f;

    /// <summary>Top of the text on a page.</summary>
    public const float Top = 62f;

    /// <summary>Distance of the end of the text from the lower edge.</summary>
    public const float Foot = 56f;

    /// <summary>Gets the width of the text.</summary>
    public float TextWidth => Width - (2f * Side);

    /// <summary>Gets the lower end of the text.</summary>
    public float Bottom => Height - Foot;

    /// <summary>Gives the measures of a paper.</summary>
    public static PageGeometry Of(PaperSize paper) => paper == PaperSize.Letter ? new(612f, 792f) : new(595.28f, 841.89f);
}
