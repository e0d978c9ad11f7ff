using System.Buffers;

namespace RangeReduce.Patterns.Tables;

/// <summary>Sets of characters that are searched for.</summary>
internal static class TextSigns
{
    /// <summary>What a number may be written with.</summary>
    public static readonly SearchValues<char> Number = SearchValues.Create("+-.,0123456789eE ");

    /// <summary>What separates fields and means nothing by itself.</summary>
    public static readonly SearchValues<byte> Emptiness = SearchValues.Create(" \t;,|\""u8);
}
