using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Adds bookmarks, language and page mode to a finished PDF by an incremental update (ISO 32000-1, 7.5.6 and 12.3.3).</summary>
/// <remarks>The canvas that draws the pages cannot write them. The file must end in a classic cross-reference table, which that canvas writes.</remarks>
internal static partial class PdfOutline
{
    /// <summary>Appends the update.</summary>
    /// <param name="pdf">The file.</param>
    /// <param name="bookmarks">Entries in order, the first of level 1.</param>
    /// <param name="language">Language tag of the text.</param>
    /// <returns>The file with the update behind it.</returns>
    /// <exception cref="InvalidDataException">The file has no classic cross-reference table or no catalog.</exception>
    public static byte[] Append(byte[] pdf, IReadOnlyList<Bookmark> bookmarks, string language)
    {
        var text = Encoding.Latin1.GetString(pdf);
        var start = Number(Found(StartPattern().Match(text), "startxref"));
        var trailer = text[text.LastIndexOf("trailer", StringComparison.Ordinal)..];
        var (root, size) = (Number(Found(RootPattern().Match(trailer), "/Root")), Number(Found(SizePattern().Match(trailer), "/Size")));
        var catalog = Found(Regex.Match(text, $@"(?<=[\r\n]){root} 0 obj\s*<<(?<body>.*?)>>\s*endobj", RegexOptions.Singleline | RegexOptions.ExplicitCapture, TimeSpan.FromSeconds(5)), "catalog").Groups["body"].Value;

        var objects = new SortedDictionary<int, string>();
        var outlines = string.Empty;
        if (bookmarks.Count > 0)
        {
            AddItems(objects, bookmarks, size);
            outlines = string.Create(CultureInfo.InvariantCulture, $" /Outlines {size} 0 R /PageMode /UseOutlines");
        }

        objects[root] = $"<<{catalog.TrimEnd()}{outlines} /Lang ({language}) /ViewerPreferences << /DisplayDocTitle true >> >>";
        var info = InfoPattern().Match(trailer);
        return [.. pdf, .. Update(objects, pdf.Length, root, size + (bookmarks.Count > 0 ? bookmarks.Count + 1 : 0), start, info.Success ? info.Value : string.Empty)];
    }

    // Object number of the outline is first; item n has number first + 1 + n.
    private static void AddItems(SortedDictionary<int, string> objects, IReadOnlyList<Bookmark> bookmarks, int first)
    {
        int Id(int at) => first + 1 + at;
        var tops = Enumerable.Range(0, bookmarks.Count).Where(at => bookmarks[at].Level == 1).ToList();
        objects[first] = Dictionary($"/Type /Outlines /First {Id(tops[0])} 0 R /Last {Id(tops[^1])} 0 R /Count {tops.Count}");
        for (var at = 0; at < bookmarks.Count; at++)
        {
            var isTop = bookmarks[at].Level == 1;
            var parent = isTop ? -1 : tops.FindLast(top => top < at);
            var siblings = isTop ? tops : Children(bookmarks, parent);
            var place = siblings.IndexOf(at);
            var body = new StringBuilder($"/Title <{Utf16(bookmarks[at].Title)}> /Dest /{Name(bookmarks[at].Anchor)}");
            body.Append(CultureInfo.InvariantCulture, $" /Parent {(isTop ? first : Id(parent))} 0 R");
            body.Append(place > 0 ? string.Create(CultureInfo.InvariantCulture, $" /Prev {Id(siblings[place - 1])} 0 R") : string.Empty);
            body.Append(place + 1 < siblings.Count ? string.Create(CultureInfo.InvariantCulture, $" /Next {Id(siblings[place + 1])} 0 R") : string.Empty);
            if (isTop && Children(bookmarks, at) is { Count: > 0 } children)
            {
                // A negative count keeps the entry folded.
                body.Append(CultureInfo.InvariantCulture, $" /First {Id(children[0])} 0 R /Last {Id(children[^1])} 0 R /Count {-children.Count}");
            }

            objects[Id(at)] = Dictionary(body.ToString());
        }
    }

    private static List<int> Children(IReadOnlyList<Bookmark> bookmarks, int parent) =>
        [.. Enumerable.Range(parent + 1, bookmarks.Count - parent - 1).TakeWhile(at => bookmarks[at].Level > 1)];

    private static byte[] Update(SortedDictionary<int, string> objects, int offset, int root, int size, int previous, string info)
    {
        var body = new StringBuilder("\n");
        var table = new StringBuilder("xref\n");
        foreach (var (id, content) in objects)
        {
            table.Append(CultureInfo.InvariantCulture, $"{id} 1\n{offset + body.Length:D10} 00000 n \n");
            body.Append(CultureInfo.InvariantCulture, $"{id} 0 obj\n{content}\nendobj\n");
        }

        var start = offset + body.Length;
        body.Append(table);
        body.Append(CultureInfo.InvariantCulture, $"trailer\n<< /Size {size} /Root {root} 0 R {info} /Prev {previous} >>\nstartxref\n{start}\n%%EOF\n");
        return Encoding.Latin1.GetBytes(body.ToString());
    }

    private static string Dictionary(string content) => $"<< {content} >>";

    private static string Utf16(string title) => "FEFF" + Convert.ToHexString(Encoding.BigEndianUnicode.GetBytes(title));

    // Anchors are letters, digits and hyphens: as a name object they need no escape.
    private static string Name(string anchor) => AnchorPattern().IsMatch(anchor) ? anchor : throw new InvalidDataException($"The anchor {anchor} is not made of letters, digits and hyphens.");

    private static Match Found(Match match, string what) => match.Success ? match : throw new InvalidDataException($"The PDF has no {what} in classic form.");

    private static int Number(Match match) => int.Parse(match.ValueSpan, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"(?<=startxref\s+)\d+(?=\s+%%EOF\s*$)", RegexOptions.None, 5000)]
    private static partial Regex StartPattern();

    [GeneratedRegex(@"(?<=/Root )\d+", RegexOptions.None, 5000)]
    private static partial Regex RootPattern();

    [GeneratedRegex(@"(?<=/Size )\d+", RegexOptions.None, 5000)]
    private static partial Regex SizePattern();

    [GeneratedRegex(@"/Info \d+ 0 R", RegexOptions.None, 5000)]
    private static partial Regex InfoPattern();

    [GeneratedRegex(@"^[A-Za-z0-9-]+$", RegexOptions.None, 5000)]
    private static partial Regex AnchorPattern();
}
