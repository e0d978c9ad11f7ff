using RangeReduce.Diagnostics;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace RangeReduce.Runs.Manifest;

/// <summary>Brings the several ways of writing a TOML table (headers, dotted keys, inline tables) to one flat list of sections.</summary>
internal static class ManifestTree
{
    private const int MostSyntaxErrors = 20;

    /// <summary>Parses the text; syntax errors go to the list, and then no section is given.</summary>
    public static List<ManifestSection> Parse(string text, string displayPath, List<MeasurementDataException> errors)
    {
        var document = SyntaxParser.Parse(text, displayPath, validate: true);
        var sections = new List<ManifestSection>();
        foreach (var message in document.Diagnostics.Where(message => message.Kind == DiagnosticMessageKind.Error).Take(MostSyntaxErrors))
        {
            errors.Add(new(PlaceOf(message.Span, displayPath), "manifest-syntax", "text that is not TOML", "a key, a table or a value by TOML 1.0", $"{message.Message.TrimEnd('.')}."));
        }

        if (errors.Count > 0)
        {
            return sections;
        }

        AddAll(document.KeyValues, [], isArrayItem: false, new(displayPath, 1, 1), sections, displayPath);
        foreach (var table in document.Tables)
        {
            var place = PlaceOf(table.Span, displayPath);
            var name = NamesOf(table.Name!);
            sections.Add(new(name[0], table is TableArraySyntax, place, []));
            AddAll(table.Items, name, table is TableArraySyntax, place, sections, displayPath);
        }

        return sections;
    }

    private static void AddAll(IEnumerable<KeyValueSyntax> items, string[] above, bool isArrayItem, SourcePlace tablePlace, List<ManifestSection> sections, string file)
    {
        foreach (var item in items)
        {
            string[] path = [.. above, .. NamesOf(item.Key!)];
            var place = PlaceOf(item.Key!.Span, file);
            if (item.Value is InlineTableSyntax inline && path.Length == 1)
            {
                sections.Add(new(path[0], IsArrayItem: false, place, []));
                AddAll(inline.Items.Select(part => part.KeyValue!), path, isArrayItem: false, place, sections, file);
            }
            else if (item.Value is ArraySyntax array && path.Length == 1 && array.Items.ChildrenCount > 0 && array.Items.All(part => part.Value is InlineTableSyntax))
            {
                foreach (var table in array.Items.Select(part => (InlineTableSyntax)part.Value!))
                {
                    var at = PlaceOf(table.Span, file);
                    sections.Add(new(path[0], IsArrayItem: true, at, []));
                    AddAll(table.Items.Select(part => part.KeyValue!), path, isArrayItem: true, at, sections, file);
                }
            }
            else
            {
                var section = path.Length == 1 ? string.Empty : path[0];
                if (sections.Count == 0 || !string.Equals(sections[^1].Name, section, StringComparison.Ordinal))
                {
                    sections.Add(new(section, isArrayItem, path.Length == 1 ? place : tablePlace, []));
                }

                sections[^1].Entries.Add(new(string.Join('.', path.Skip(section.Length == 0 ? 0 : 1)), place, item.Value!, PlaceOf(item.Value!.Span, file)));
            }
        }
    }

    private static string[] NamesOf(KeySyntax key) => [NameOf(key.Key!), .. key.DotKeys.Select(part => NameOf(part.Key!))];

    private static string NameOf(BareKeyOrStringValueSyntax key) => key switch
    {
        BareKeySyntax bare => bare.Key?.Text ?? string.Empty,
        StringValueSyntax quoted => quoted.Value ?? string.Empty,
        _ => key.ToString()!.Trim(),
    };

    private static SourcePlace PlaceOf(SourceSpan span, string file) => new(file, span.Start.Line + 1, span.Start.Column + 1);
}
