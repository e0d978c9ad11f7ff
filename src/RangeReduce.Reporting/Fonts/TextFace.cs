namespace RangeReduce.Reporting.Fonts;

/// <summary>A face of the report's type family.</summary>
internal enum TextFace
{
    /// <summary>Upright text.</summary>
    Regular,

    /// <summary>Headings and stressed words.</summary>
    Bold,

    /// <summary>Letters of equal width.</summary>
    Mono,
}
