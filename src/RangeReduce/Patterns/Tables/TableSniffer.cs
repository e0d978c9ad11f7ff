using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Tells a table from other files by its first bytes.</summary>
internal static class TableSniffer
{
    /// <summary>Gives whether there are rows of numbers, under headings that need not be understood.</summary>
    public static bool LooksLikeTable(ReadOnlySpan<byte> head)
    {
        try
        {
            using var stream = new MemoryStream(head.ToArray(), writable: false);
            var input = TableInput.Open(stream, string.Empty, []);
            var lines = HeadLine.Split(input.Head, isWhole: true);
            if (lines.Exists(IsTouchstone))
            {
                return false;
            }

            return TableHeadFinder.Find(input.Head, isWhole: true, new Dictionary<string, string>(StringComparer.Ordinal), out var bare) is not null || bare is not null;
        }
        catch (MeasurementDataException)
        {
            return false;
        }
    }

    /// <summary>Knows the option line and the version keyword of a Touchstone file (IBIS Open Forum, Touchstone 1.1 and 2.0).</summary>
    private static bool IsTouchstone(HeadLine line)
    {
        var text = line.Text.Trim();
        if (text.StartsWith("[Version]", StringComparison.OrdinalIgnoreCase))
        {
            return true;
        }

        var comment = text.IndexOf('!', StringComparison.Ordinal);
        var words = (comment > 0 ? text[..comment] : text).TrimStart('#').Split([' ', '\t'], StringSplitOptions.RemoveEmptyEntries);
        return text is ['#', ..] && words.Length > 0
            && Array.TrueForAll(words, word => word.ToUpperInvariant() is "HZ" or "KHZ" or "MHZ" or "GHZ" or "S" or "Y" or "Z" or "G" or "H" or "MA" or "DB" or "RI" or "R" || double.TryParse(word, System.Globalization.CultureInfo.InvariantCulture, out _))
            && Array.Exists(words, word => word.ToUpperInvariant() is "S" or "Y" or "Z" or "G" or "H" or "MA" or "DB" or "RI" or "R");
    }
}
